import { StepDrawing } from "@/components/drawing/step-drawing";
import { CautionPanel } from "@/components/ui/caution-panel";
import type { Check, Remedy } from "@/lib/core/tree/schema";
import { ENGINE_STATES, WHO } from "./in-words";
import { Facts } from "./node-facts";
import type { TreePart } from "./tree-part";

type Props = { id: string; step: Check | Remedy; part: TreePart };

/** What a check and a remedy have in common: cautions, then the steps as the skipper gets them. */
export function StepFacts({ id, step, part }: Props) {
  const safety = part.safety[id] ?? { first: [], last: [], cautions: [] };
  const lines = [
    ...safety.first.map((text) => ({ text, safety: true })),
    ...step.steps.map((text) => ({ text, safety: false })),
    ...safety.last.map((text) => ({ text, safety: true })),
  ];
  return (
    <>
      <p className="mt-2 text-sm text-ink-2">
        {step.minutes} min · {WHO[step.who]} · engine {ENGINE_STATES[step.engine]} · access {step.access}
      </p>
      {safety.cautions.length > 0 && (
        <div className="mt-3 grid gap-2">
          {safety.cautions.map((caution) => (
            <CautionPanel key={caution.key} signal={caution.signal}>
              {caution.says}
            </CautionPanel>
          ))}
        </div>
      )}
      <Facts title="Tools" items={step.tools} />
      {step.drawing && (
        <div className="mt-4">
          <StepDrawing drawing={step.drawing} />
        </div>
      )}
      <section className="mt-4">
        <h3 className="text-sm font-normal text-ink-2">Steps</h3>
        <ol className="list-decimal pl-6">
          {lines.map(({ text, safety: written }, i) => (
            <li key={i} className={written ? "py-1 text-ink-2" : "py-1"}>
              {text}
              {written && <span className="visually-hidden"> (written from its safety flags)</span>}
            </li>
          ))}
        </ol>
        {safety.first.length + safety.last.length > 0 && (
          <p className="mt-1 text-sm text-ink-2">
            The paler steps are written from its safety flags, as for an engine of which nothing is known.
          </p>
        )}
      </section>
    </>
  );
}
