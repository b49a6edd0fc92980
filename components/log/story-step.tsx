import type { StoryStep } from "@/lib/core/contract/diagnosis";
import { BelievedThen } from "./believed-then";
import { Moment } from "./moment";

type Props = {
  fleetId: string;
  step: StoryStep;
  /** What it changed in belief is worth showing. */ showsBelief: boolean;
  /** Another answer took its place later. */ changedLater: boolean;
};

/** One step as it was: why it was asked, what was said, what was believed then. */
export function StoryStepView({ fleetId, step, showsBelief, changedLater }: Props) {
  const outOfTurn = step.askedWhy === null && step.changes === null && (step.kind === "answered" || step.kind === "remedy-tried");
  return (
    <li className="grid break-inside-avoid gap-x-6 gap-y-3 border-l-4 border-shoal pl-4 lg:grid-cols-[minmax(0,1fr)_25rem] print:border-rule">
      <div>
        <p className="text-sm text-ink-2">
          <Moment at={step.at} />, {step.by}
        </p>
        <h3>{step.title}</h3>
        {step.askedWhy && (
          <p className="text-sm text-ink-2">
            {step.kind === "rule-answered" ? "Because" : "Asked, because"}: {step.askedWhy}
          </p>
        )}
        {outOfTurn && <p className="text-sm text-ink-2">Said without being asked.</p>}
        {step.changes && <p className="text-sm text-ink-2">Changed: was {step.changes.was}.</p>}
        {step.says && <p className={changedLater ? "mt-1 line-through" : "mt-1 font-semibold"}>{step.says}</p>}
        {changedLater && <p className="text-sm text-ink-2">Changed later: it does not count.</p>}
        {step.note && <p className="mt-1 whitespace-pre-line">“{step.note}”</p>}
        {step.photos.length > 0 && (
          <ul className="mt-2 flex flex-wrap gap-2">
            {step.photos.map((id, i) => (
              <li key={id}>
                <a href={`/api/v1/fleets/${fleetId}/files/${id}`}>
                  {/* eslint-disable-next-line @next/next/no-img-element -- behind the fleet's wall: the image service may not fetch it */}
                  <img
                    src={`/api/v1/fleets/${fleetId}/files/${id}`}
                    alt={`Photo ${i + 1} taken at: ${step.title}`}
                    loading="lazy"
                    className="h-40 w-auto rounded-lg border border-rule"
                  />
                </a>
              </li>
            ))}
          </ul>
        )}
      </div>
      {showsBelief && <BelievedThen believed={step.believed} others={step.others} unknown={step.unknown} />}
    </li>
  );
}
