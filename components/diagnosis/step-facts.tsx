import type { StepShown } from "@/lib/core/diagnosis/view";
import type { EngineState, Who } from "@/lib/core/tree/schema";

const ENGINE: Record<EngineState, string | null> = {
  any: null,
  cold: "cold",
  stopped: "stopped",
  cranking: "cranking",
  idling: "running, out of gear",
  "under-load": "running in gear, under load",
};
const WHO: Record<Who, string | null> = {
  "skipper-at-sea": null,
  "skipper-in-port": null,
  mechanic: "for a mechanic",
  workshop: "for a workshop",
};

/** Minutes, tools, engine state, parts: what one has to have before going below. */
export function StepFacts({ step }: { step: StepShown }) {
  const engine = ENGINE[step.engine];
  const who = WHO[step.who];
  return (
    <ul className="mt-2.5 mb-3.5 flex flex-wrap gap-x-3.5 gap-y-1 text-sm text-ink-2">
      <li>
        <b className="dial text-ink">{step.minutes}</b> min
      </li>
      {step.tools.length > 0 && <li className="font-semibold text-ink">{step.tools.join(", ")}</li>}
      {engine && (
        <li>
          Engine <b className="text-ink">{engine}</b>
        </li>
      )}
      {who && <li className="font-semibold text-ink">{who}</li>}
      {step.ifFitted && <li>if fitted</li>}
      {step.parts.map((part) => (
        <li key={part.key}>
          Part: <b className="text-ink">{part.quantity > 1 ? `${part.quantity} x ${part.title}` : part.title}</b>
        </li>
      ))}
    </ul>
  );
}
