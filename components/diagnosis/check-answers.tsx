"use client";

import type { CheckAsked } from "@/lib/client/check-shown";
import { keptWith } from "@/lib/client/kept-with";
import { saidTogether } from "@/lib/client/said-together";
import type { EventOf } from "@/lib/core/contract/event";
import { AnswerForm } from "./answer-form";
import { useHere } from "./here";
import { MissingFigure } from "./missing-figure";

type Props = { asked: CheckAsked; /** The answer that a new one takes the place of. */ before?: EventOf<"answered"> | undefined };

/** The answers of a check, asked for or not. Where it was answered before, the note and the pictures stay with it. */
export function CheckAnswers({ asked, before }: Props) {
  const { record, setUndo, address, go, goOnFrom } = useHere();
  return (
    <>
      <MissingFigure checkKey={asked.key} />
      <AnswerForm
        asked={asked}
        photosBefore={before?.payload.photos.length ?? 0}
        onAnswer={async ({ answer, says, withdraws, note, photos }) => {
          const payload = { check: asked.key, answer, ...keptWith(before?.payload, { note, photos }) };
          const event = await record("answered", payload, before?.id);
          setUndo({ event: event.id, says: saidTogether(asked.title, says), withdraws });
          // Whoever came from the list of answers goes back to it.
          if (address.at === "change") go("said", undefined, "replace");
          else goOnFrom(event.id);
        }}
      />
    </>
  );
}
