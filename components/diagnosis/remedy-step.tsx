"use client";

import type { StepShown } from "@/lib/core/diagnosis/view";
import { useHere } from "./here";
import { RemedyResultForm } from "./remedy-result-form";
import { StepHead } from "./step-head";
import { StepTimers } from "./step-timers";

/** A repair is also a test: the fault goes or stays. */
export function RemedyStep({ step }: { step: StepShown }) {
  const { record, setUndo, go } = useHere();
  return (
    <>
      <StepHead step={step} />
      {step.temporary && <p className="mt-3 text-sm text-ink-2">This gets you home. The cause stays open until it is put right.</p>}
      <StepTimers step={step} />
      <RemedyResultForm
        of={step.key}
        proof={step.proof}
        onResult={async ({ result, proof, note, photos, says }) => {
          const event = await record("remedy-tried", {
            remedy: step.key,
            result,
            ...(proof ? { proof } : {}),
            ...(note ? { note } : {}),
            photos: [...photos],
          });
          setUndo({ event: event.id, says: `${step.title}: ${says}`, withdraws: null });
          if (result === "cured") go("outcome");
        }}
      />
    </>
  );
}
