"use client";

import type { StepShown } from "@/lib/core/diagnosis/view";
import { AnswerForm } from "./answer-form";
import { useHere } from "./here";
import { MissingFigure } from "./missing-figure";
import { StepHead } from "./step-head";
import { StepTimers } from "./step-timers";

/** Something to look at, read, try or ask, and what was found. */
export function CheckStep({ step }: { step: StepShown }) {
  const { record, setUndo } = useHere();
  return (
    <>
      <StepHead step={step} />
      <StepTimers step={step} />
      <MissingFigure checkKey={step.key} />
      <AnswerForm
        of={step.key}
        ask={step.ask}
        answers={step.answers}
        reading={step.reading}
        ifFitted={step.ifFitted}
        onAnswer={async ({ answer, says, withdraws, note, photos }) => {
          const event = await record("answered", { check: step.key, answer, ...(note ? { note } : {}), photos: [...photos] });
          setUndo({ event: event.id, says: `${step.title}: ${says}`, withdraws });
        }}
      />
    </>
  );
}
