"use client";

import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { RuleSays } from "./rule-says";

/** What must not be forgotten stays on each later screen until it is cleared. */
export function RulesInForce() {
  const { view, record, go } = useHere();
  if (view.rulesInForce.length === 0) return null;
  return (
    <section aria-label="In force" className="mb-5 grid gap-3">
      {view.rulesInForce.map((rule) => (
        <div key={rule.key}>
          <RuleSays rule={rule} />
          {rule.clearedWhen && (
            <Button wide className="mt-2" onClick={() => void record("rule-answered", { rule: rule.key, answer: "cleared" })}>
              {rule.clearedWhen}
            </Button>
          )}
        </div>
      ))}
      <Button wide onClick={() => go("hand-over")}>
        Call for help: the hand-over page
      </Button>
    </section>
  );
}
