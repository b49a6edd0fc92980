import type { StepShown } from "@/lib/core/diagnosis/view";
import { RemedyResults } from "./remedy-results";
import { StepHead } from "./step-head";
import { StepTimers } from "./step-timers";

/** A repair is also a test: the fault goes or stays. */
export function RemedyStep({ step }: { step: StepShown }) {
  return (
    <>
      <StepHead step={step} />
      {step.temporary && <p className="mt-3 text-sm text-ink-2">This gets you home. The cause stays open until it is put right.</p>}
      <StepTimers step={step} />
      <RemedyResults remedy={step} />
    </>
  );
}
