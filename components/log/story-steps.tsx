import type { StoryStep } from "@/lib/core/contract/diagnosis";
import { Moment } from "./moment";
import { storyGroups } from "./story-groups";
import { StoryStepView } from "./story-step";

/** A diagnosis step by step; belief is drawn only where a step moved it. */
export function StorySteps({ fleetId, steps }: { fleetId: string; steps: readonly StoryStep[] }) {
  const beliefOf = ({ believed, others, unknown }: StoryStep) => JSON.stringify([believed, others, unknown]);
  const moved = new Set(steps.filter((step, i) => i === 0 || beliefOf(step) !== beliefOf(steps[i - 1] as StoryStep)).map((s) => s.event));
  const changed = new Set(steps.flatMap(({ changes }) => changes?.event ?? []));
  return (
    <ol className="grid gap-6">
      {storyGroups(steps).map((group) =>
        group.kind === "step" ? (
          <StoryStepView
            key={group.step.event}
            fleetId={fleetId}
            step={group.step}
            showsBelief={moved.has(group.step.event)}
            changedLater={changed.has(group.step.event)}
          />
        ) : (
          <NoDanger key={group.steps[0]?.event} steps={group.steps} />
        ),
      )}
    </ol>
  );
}

function NoDanger({ steps }: { steps: readonly StoryStep[] }) {
  const first = steps[0];
  if (!first) return null;
  return (
    <li className="border-l-4 border-shoal pl-4 print:border-rule">
      <p className="text-sm text-ink-2">
        <Moment at={first.at} />, {first.by}
      </p>
      <h3>Anything dangerous?</h3>
      <p className="mt-1">
        <b className="font-semibold">No</b>, to each of these:{" "}
        {steps.map(({ title }) => title.charAt(0).toLowerCase() + title.slice(1)).join("; ")}.
      </p>
    </li>
  );
}
