import type { EngineProfile } from "@/lib/core/contract/engine";
import type { StepShown } from "@/lib/core/diagnosis/view";
import type { Check, FaultTree } from "@/lib/core/tree/schema";
import { bandsOf } from "@/lib/core/units/bands";

/** What is asked of whoever does a check. */
export type CheckAsked = Pick<StepShown, "key" | "title" | "ask" | "answers" | "reading" | "ifFitted">;

/** What any check asks, for one that was looked at out of turn or is changed afterwards. */
export function checkShown(tree: FaultTree, check: Check, profile: EngineProfile): CheckAsked {
  const title = (key: string) => check.findings.find((finding) => finding.key === key)?.title ?? key;
  const bands = check.reading ? bandsOf(check.reading, profile, tree.features) : null;
  return {
    key: check.key,
    title: check.title,
    ask: check.ask,
    ifFitted: false,
    answers: check.findings.map((finding) => ({ finding: finding.key, title: finding.title, withdraws: null })),
    reading:
      check.reading && bands
        ? {
            quantity: check.reading.quantity,
            unit: check.reading.unit,
            from: check.reading.from,
            to: check.reading.to,
            bands: bands.map((band) => ({ ...band, title: title(band.finding) })),
          }
        : null,
  };
}
