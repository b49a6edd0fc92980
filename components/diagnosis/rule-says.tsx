import { StepDrawing } from "@/components/drawing/step-drawing";
import type { RuleShown } from "@/lib/core/diagnosis/view";

/** What to do while a rule is in force, first thing first, and the one exception to it. It can be folded, but its name stays. */
export function RuleSays({ rule, folded = false }: { rule: RuleShown; folded?: boolean }) {
  return (
    <details open={!folded} className="mt-3 rounded-lg border-[1.5px] border-lead bg-lead-wash px-3 py-1">
      <summary className="flex min-h-12 items-center font-semibold text-lead">{rule.title}</summary>
      <ol className="mt-1 list-decimal pl-6 marker:font-bold">
        {rule.says.map((line) => (
          <li key={line} className="my-1">
            {line}
          </li>
        ))}
      </ol>
      {rule.drawing && <StepDrawing drawing={rule.drawing} />}
      {rule.runOn && (
        <p className="mt-2 text-sm">
          <b>The one exception:</b> if it is running, and stopping now endangers people or boat, run on at the lowest useful power to
          safety, call, then stop.
        </p>
      )}
    </details>
  );
}
