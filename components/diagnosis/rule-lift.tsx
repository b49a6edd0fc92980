"use client";

import { useGuard } from "@/lib/client/screen/use-guard";
import { Button } from "@/components/ui/button";
import type { RuleShown } from "@/lib/core/diagnosis/view";
import { useHere } from "./here";

/** A rule in force that can be lifted by hand: what one has to be able to say for it. */
export function RuleLift({ rule }: { rule: RuleShown }) {
  const { record, setUndo } = useHere();
  const guard = useGuard();
  if (!rule.clearedWhen) return null;
  // The next rule moves up under the finger, and a slip must be seen: hence the guard and the way back.
  const lift = async () => {
    const event = await record("rule-answered", { rule: rule.key, answer: "cleared" });
    setUndo({ event: event.id, says: `Lifted: ${rule.title}`, withdraws: null });
  };
  return (
    <Button wide className="mt-2" onClick={() => guard("lift a rule", () => void lift())}>
      {rule.clearedWhen}
    </Button>
  );
}
