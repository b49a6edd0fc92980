"use client";

import { useState } from "react";
import { provedAs } from "@/lib/client/kept-with";
import type { RemedyResult } from "@/lib/core/contract/event";
import { useGuard, useSettling } from "@/lib/client/screen/use-guard";
import { TextField } from "@/components/ui/text-field";
import { AnswerButton } from "./answer-button";
import { NoteAndPhotos } from "./note-and-photos";
import { useKeptNote, useKeptWords } from "./use-kept-note";

export type Tried = { result: RemedyResult; proof: string | null; note: string; photos: readonly string[]; says: string };

const RESULTS: readonly { result: RemedyResult; title: string }[] = [
  { result: "cured", title: "Cured" },
  { result: "better", title: "Better, not cured" },
  { result: "no-change", title: "No change" },
  { result: "could-not", title: "Could not do it" },
];

type Props = {
  of: string;
  proof: string | null;
  /** Pictures that go with it already. */ photosBefore: number;
  onResult: (tried: Tried) => Promise<void>;
};

/** Did it cure it, and how was that proved? A cure is only believed once it has been tried under load. */
export function RemedyResultForm({ of, proof, photosBefore, onResult }: Props) {
  const { note, photos, onNote, onPhotos, drop } = useKeptNote(of);
  const [{ cured, words }, type, dropTyped] = useKeptWords(of, { cured: false, words: "" });
  const [given, setGiven] = useState(false);
  const own = words.trim();
  const guard = useGuard();
  const settling = useSettling();
  const give = (result: RemedyResult, says: string, how: string | null, also = "") =>
    guard(`${of} ${says}`, () => {
      if (given || settling) return;
      setGiven(true);
      void onResult({ result, says, proof: how, note: [note.trim(), also].filter(Boolean).join(" "), photos }).then(() => {
        drop();
        dropTyped();
      });
    });
  return (
    <div>
      <h2 className="mt-5 mb-2 text-lg font-semibold tracking-normal">Did it cure it?</h2>
      <div className="grid gap-2">
        {RESULTS.map(({ result, title }) => (
          <AnswerButton
            key={result}
            waits={settling}
            chosen={result === "cured" && cured}
            onTap={() => (result === "cured" ? guard(`${of} cured`, () => type({ cured: true })) : give(result, title, null))}
          >
            {title}
          </AnswerButton>
        ))}
      </div>
      <div aria-live="polite">
        {cured && (
          <section aria-label="How was that proved?" className="mt-4 rounded-xl border-[1.5px] border-sound bg-sound-wash p-3.5">
            <h2 className="text-lg">How was that proved?</h2>
            {proof && <p className="mt-1 mb-2">{proof}</p>}
            <div className="grid gap-2">
              {proof && <AnswerButton onTap={() => give("cured", "Cured, proved", provedAs(proof, own))}>Done, and it held</AnswerButton>}
              <TextField
                id={`proof-${of}`}
                label="Proved another way, or what it showed"
                optional
                value={words}
                maxLength={500}
                onChange={(event) => type({ words: event.target.value })}
              />
              {own.length > 2 && <AnswerButton onTap={() => give("cured", "Cured, proved", own)}>Proved as written</AnswerButton>}
              <AnswerButton quiet onTap={() => give("cured", "Cured, not proved yet", null, own)}>
                Not proved yet
              </AnswerButton>
            </div>
          </section>
        )}
      </div>
      <NoteAndPhotos of={of} before={photosBefore} note={note} onNote={onNote} photos={photos} onPhotos={onPhotos} />
    </div>
  );
}
