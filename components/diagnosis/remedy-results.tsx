"use client";

import { keptWith } from "@/lib/client/kept-with";
import { saidTogether } from "@/lib/client/said-together";
import type { EventOf } from "@/lib/core/contract/event";
import { useHere } from "./here";
import { RemedyResultForm } from "./remedy-result-form";

type Props = {
  remedy: { key: string; title: string; proof: string | null };
  /** The result that a new one takes the place of. */ before?: EventOf<"remedy-tried"> | undefined;
};

/** What a repair did, asked for or not. Where it was said before, the note and the pictures stay with it. */
export function RemedyResults({ remedy, before }: Props) {
  const { record, setUndo, address, go, goOnFrom } = useHere();
  return (
    <RemedyResultForm
      of={remedy.key}
      proof={remedy.proof}
      photosBefore={before?.payload.photos.length ?? 0}
      onResult={async ({ result, proof, note, photos, says }) => {
        const payload = { remedy: remedy.key, result, ...(proof ? { proof } : {}), ...keptWith(before?.payload, { note, photos }) };
        const event = await record("remedy-tried", payload, before?.id);
        setUndo({ event: event.id, says: saidTogether(remedy.title, says), withdraws: null });
        if (address.at === "change") return go("said", undefined, "replace");
        goOnFrom(event.id);
        if (result === "cured") go("outcome");
      }}
    />
  );
}
