import type { StepShown } from "@/lib/core/diagnosis/view";
import { CrankTimer } from "./crank-timer";
import { Countdown } from "./countdown";
import { useHere } from "./here";
import { Stopwatch } from "./stopwatch";

/** From hot to hand-warm, as the cost table has it. */
const COOL_MINUTES = 60;

/** The clocks that a step needs: cranking bursts and their rests, a cooling-down, a time to be taken. */
export function StepTimers({ step }: { step: StepShown }) {
  const { summary } = useHere();
  return (
    <div className="mt-4 grid gap-3 empty:hidden">
      {step.cranks !== null && <CrankTimer asks={step.cranks} />}
      {step.engine === "cold" && (
        <Countdown
          of={`cool.${summary.id}`}
          title="If it has been running: let it cool"
          seconds={COOL_MINUTES * 60}
          start="Start the clock"
          done="If it has not run since, it should be cool enough. Feel it with the back of the hand first."
        />
      )}
      {step.reading?.quantity === "time" && step.cranks === null && <Stopwatch />}
    </div>
  );
}
