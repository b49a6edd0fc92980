"use client";

import { useState } from "react";
import type { CheckAsked } from "@/lib/client/check-shown";
import type { Answer } from "@/lib/core/contract/event";
import { useGuard, useSettling } from "@/lib/client/screen/use-guard";
import { AnswerButton } from "./answer-button";
import { NoteAndPhotos } from "./note-and-photos";
import { ReadingAnswer, type Typed } from "./reading-answer";
import { useKeptNote, useKeptWords } from "./use-kept-note";

const CANNOT = "Can\u2019t tell";

export type Given = { answer: Answer; says: string; withdraws: string | null; note: string; photos: readonly string[] };

type Props = {
  asked: CheckAsked;
  /** Pictures that go with it already. */ photosBefore: number;
  onAnswer: (given: Given) => Promise<void>;
};

/** The question and its answers. Each tap is kept at once; there is no send button to forget. */
export function AnswerForm({ asked, photosBefore, onAnswer }: Props) {
  const { key: of, ask, answers, reading, ifFitted } = asked;
  const { note, photos, onNote, onPhotos, drop } = useKeptNote(of);
  const [typed, type, dropTyped] = useKeptWords<Typed>(of, { typed: "", unit: "" });
  const [given, setGiven] = useState<string | null>(null);
  const guard = useGuard();
  const settling = useSettling();
  const withBands = reading !== null && reading.bands.length > 0;
  const give = (answer: Answer, says: string, withdraws: string | null = null) =>
    guard(`${of} ${says}`, () => {
      if (given !== null || settling) return;
      setGiven(says);
      void onAnswer({ answer, says, withdraws, note: note.trim(), photos }).then(() => {
        drop();
        dropTyped();
      });
    });
  return (
    <div role="group" aria-labelledby={`ask-${of}`}>
      <h2 id={`ask-${of}`} className="mt-5 mb-2 text-lg font-semibold tracking-normal">
        {ask}
      </h2>
      {withBands && (
        <ReadingAnswer
          of={of}
          scale={reading}
          kept={[typed, type]}
          given={given !== null}
          onRead={(value, unit, says) => give({ value, unit }, says)}
        />
      )}
      {withBands && <p className="mt-4 mb-2 text-sm text-ink-2">No figure to be had? Say it in words.</p>}
      <div className="grid gap-2">
        {answers.map((answer) => (
          <AnswerButton
            key={answer.finding}
            waits={settling}
            chosen={given === answer.title}
            onTap={() => give({ finding: answer.finding }, answer.title, answer.withdraws)}
          >
            {answer.title}
          </AnswerButton>
        ))}
        {ifFitted && (
          <AnswerButton quiet waits={settling} chosen={given === "Not fitted"} onTap={() => give({ notFitted: true }, "Not fitted")}>
            Not fitted on this engine
          </AnswerButton>
        )}
        <AnswerButton quiet waits={settling} chosen={given === CANNOT} onTap={() => give({ cannotTell: true }, CANNOT)}>
          Can&rsquo;t tell, or can&rsquo;t get to it
        </AnswerButton>
      </div>
      <NoteAndPhotos of={of} before={photosBefore} note={note} onNote={onNote} photos={photos} onPhotos={onPhotos} />
      <p role="status" className="mt-2 min-h-6 text-sm text-ink-2">
        {given === null ? "" : "Kept. The next step is being worked out."}
      </p>
    </div>
  );
}
