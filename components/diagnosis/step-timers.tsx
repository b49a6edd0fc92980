import type { StepShown } from "@/lib/core/diagnosis/view";
import { CrankTimer } from "./crank-timer";
import { Countdown } from "./countdown";
import { Stopwatch } from "./stopwatch";

/** From hot to hand-warm, as the cost table has it. */
const COOL_MINUTES = 60;

/** The clocks that a step needs: cranking bursts and their rests, a cooling-down, a time to be taken. */
export function StepTimers({ step }: { step: StepShown }) {
  return (
    <div className="mt-4 grid gap-3 empty:hidden">
      {step.cranks !== null && <CrankTimer />}
      {step.engine === "cold" && (
        <Countdown
          title="If it has been running: let it cool"
          seconds={COOL_MINUTES * 60}
          start="Start the clock"
          done="It should be cool enough. Feel it with the back of the hand first."
        />
      )}
      {step.reading?.quantity === "time" && step.cranks === null && <Stopwatch />}
    </div>
  );
}
