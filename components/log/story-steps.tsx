import type { StoryStep } from "@/lib/core/contract/diagnosis";
import { StoryStepView } from "./story-step";

/** A diagnosis step by step; belief is drawn only where a step moved it. */
export function StorySteps({ fleetId, steps }: { fleetId: string; steps: readonly StoryStep[] }) {
  const beliefs = steps.map(({ believed, others, unknown }) => JSON.stringify([believed, others, unknown]));
  return (
    <ol className="grid gap-6">
      {steps.map((step, i) => (
        <StoryStepView key={step.event} fleetId={fleetId} step={step} showsBelief={i === 0 || beliefs[i] !== beliefs[i - 1]} />
      ))}
    </ol>
  );
}
