import type { StepShown } from "@/lib/core/diagnosis/view";
import { CheckAnswers } from "./check-answers";
import { StepHead } from "./step-head";
import { StepTimers } from "./step-timers";

/** Something to look at, read, try or ask, and what was found. */
export function CheckStep({ step }: { step: StepShown }) {
  return (
    <>
      <StepHead step={step} />
      <StepTimers step={step} />
      <CheckAnswers asked={step} />
    </>
  );
}
