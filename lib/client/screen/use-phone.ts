"use client";

import { useEffect, useState } from "react";
import type { Phone } from "@/lib/core/contract/phone";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { PhoneStore } from "../store/phone-store";
import { useObservable } from "./use-observable";

/** What the phone has of the fleet: undefined while it is read, null before the first visit with a signal. */
export function usePhone(store: PhoneStore): Phone | null | undefined {
  const changes = useObservable(store.factsChanges);
  const [phone, setPhone] = useState<Phone | null | undefined>(undefined);
  useEffect(() => {
    let current = true;
    void store.phone().then((kept) => current && setPhone(kept?.phone ?? null));
    return () => {
      current = false;
    };
  }, [store, changes]);
  return phone;
}

/** A tree by its version: undefined while it is read, null where the phone does not have it. */
export function useTree(store: PhoneStore, versionId: string | null): FaultTree | null | undefined {
  const changes = useObservable(store.factsChanges);
  const [found, setFound] = useState<{ versionId: string; tree: FaultTree | null } | null>(null);
  useEffect(() => {
    if (!versionId) return;
    let current = true;
    void store
      .tree(versionId)
      .then(
        (tree) =>
          current && setFound((before) => (before?.versionId === versionId && before.tree ? before : { versionId, tree: tree ?? null })),
      );
    return () => {
      current = false;
    };
  }, [store, versionId, changes]);
  return versionId && found?.versionId === versionId ? found.tree : undefined;
}
