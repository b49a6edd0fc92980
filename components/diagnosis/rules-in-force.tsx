"use client";

import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { RuleLift } from "./rule-lift";
import { RuleSays } from "./rule-says";

/** What must not be forgotten stays on each later screen until it is cleared. */
export function RulesInForce() {
  const { view, go } = useHere();
  if (view.rulesInForce.length === 0) return null;
  return (
    <section aria-label="In force" className="mb-5 grid gap-3">
      {view.rulesInForce.map((rule) => (
        <div key={rule.key}>
          <RuleSays rule={rule} />
          <RuleLift rule={rule} />
        </div>
      ))}
      <Button wide onClick={() => go("hand-over")}>
        Call for help: the hand-over page
      </Button>
    </section>
  );
}

/** On the screens between steps: named, folded, and not to be lifted in passing. */
export function RulesInForceFolded() {
  const { view } = useHere();
  if (view.rulesInForce.length === 0) return null;
  return (
    <section aria-label="In force" className="mb-5 grid gap-2">
      {view.rulesInForce.map((rule) => (
        <RuleSays key={rule.key} rule={rule} folded />
      ))}
    </section>
  );
}
