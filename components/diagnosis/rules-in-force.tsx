"use client";

import { useGuard } from "@/lib/client/screen/use-guard";
import { Button } from "@/components/ui/button";
import type { RuleShown } from "@/lib/core/diagnosis/view";
import { useHere } from "./here";
import { RuleSays } from "./rule-says";

/** What must not be forgotten stays on each later screen until it is cleared. */
export function RulesInForce() {
  const { view, record, go, setUndo } = useHere();
  const guard = useGuard();
  if (view.rulesInForce.length === 0) return null;
  // The next rule moves up under the finger, and a slip must be seen: hence the guard and the way back.
  const lift = async (rule: RuleShown) => {
    const event = await record("rule-answered", { rule: rule.key, answer: "cleared" });
    setUndo({ event: event.id, says: `Lifted: ${rule.title}`, withdraws: null });
  };
  return (
    <section aria-label="In force" className="mb-5 grid gap-3">
      {view.rulesInForce.map((rule) => (
        <div key={rule.key}>
          <RuleSays rule={rule} />
          {rule.clearedWhen && (
            <Button wide className="mt-2" onClick={() => guard("lift a rule", () => void lift(rule))}>
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
