"use client";

import { useEffect, useState } from "react";
import { useHere } from "./here";

/** A picture from the phone's own store, or from the server where another phone took it. */
export function Photo({ id, number }: { id: string; number: number }) {
  const { ready } = useHere();
  const [source, setSource] = useState<string | null>(null);
  const [rejected, setRejected] = useState<string | null>(null);
  useEffect(() => {
    let made: string | null = null;
    let current = true;
    void ready.store.photo(id).then((kept) => {
      if (!current) return;
      setRejected(kept?.rejected ?? null);
      made = kept ? URL.createObjectURL(kept.blob) : null;
      setSource(made ?? `/api/v1/fleets/${ready.person.fleetId}/files/${id}`);
    });
    return () => {
      current = false;
      if (made) URL.revokeObjectURL(made);
    };
  }, [ready, id]);
  if (!source) return <span className="block size-24 rounded-lg border border-rule bg-sheet" />;
  return (
    <figure className="max-w-40">
      {/* A picture of this phone has no address that an optimiser could fetch. */}
      {/* eslint-disable-next-line @next/next/no-img-element */}
      <img src={source} alt={`Photo ${number}`} className="size-24 rounded-lg border border-rule object-cover" />
      {rejected !== null && <figcaption className="text-sm text-lead">On this phone only: {rejected}</figcaption>}
    </figure>
  );
}
