import type { StepShown } from "@/lib/core/diagnosis/view";
import { StepDrawing } from "@/components/drawing/step-drawing";
import { CautionPanel } from "@/components/ui/caution-panel";
import { ScreenHeading } from "./screen-heading";
import { StepFacts } from "./step-facts";
import { StepList } from "./step-list";

/** Why, what, with what, what can hurt, how it looks, then how: in this order, so that a caution is read before the hand moves. */
export function StepHead({ step }: { step: StepShown }) {
  return (
    <>
      {step.why && <p className="mb-3.5 border-l-4 border-fill pl-2.5 text-sm text-ink-2">{step.why}</p>}
      <ScreenHeading of={step.key}>{step.title}</ScreenHeading>
      <StepFacts step={step} />
      {step.cautions.length > 0 && (
        <div className="mb-3.5 grid gap-2">
          {step.cautions.map((caution) => (
            <CautionPanel key={caution.key} signal={caution.signal}>
              {caution.says}
            </CautionPanel>
          ))}
        </div>
      )}
      {step.drawing && <StepDrawing drawing={step.drawing} />}
      <StepList steps={step.steps} />
    </>
  );
}
