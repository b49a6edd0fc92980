import type { RuleShown } from "@/lib/core/diagnosis/view";
import { YesNo } from "./yes-no";
import { RuleSays } from "./rule-says";

/** One stop rule: the question, why it matters, yes or no. */
export function RuleCard({
  rule,
  answer,
  onAnswer,
}: {
  rule: RuleShown;
  answer: "yes" | "no" | null;
  onAnswer: (answer: "yes" | "no") => void;
}) {
  return (
    <section aria-labelledby={`rule-${rule.key}`} className="rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
      <h2 id={`rule-${rule.key}`} className="text-lg">
        {rule.ask ?? rule.title}
      </h2>
      <p className="mt-1 mb-3 text-sm text-ink-2">{rule.because}</p>
      <YesNo label={rule.ask ?? rule.title} value={answer} onAnswer={onAnswer} />
      <div aria-live="assertive">{answer === "yes" && <RuleSays rule={rule} />}</div>
    </section>
  );
}
