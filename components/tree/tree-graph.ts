import { causeRow, probabilityOf } from "@/lib/core/diagnosis/cause-row";
import { soundRow } from "@/lib/core/diagnosis/sound-row";
import { BASE_RATES } from "@/lib/core/tree/strength";
import type { Cause, Check, FaultTree, Remedy, Symptom } from "@/lib/core/tree/schema";

/** One symptom's part of the tree as a picture draws it: nodes of four kinds and weighted links. Derived, never stored. */
export type TreeGraph = {
  symptom: Symptom;
  checks: Check[];
  causes: Cause[];
  remedies: Remedy[];
  /** From a finding to a cause it speaks for; `ratio`: how many times likelier with the cause than in a sound engine. */
  tells: { check: string; finding: string; cause: string; ratio: number }[];
  cures: { cause: string; remedy: string; strength: number }[];
  /** Causes of this symptom that are not drawn. */
  folded: number;
};

/** A finding has to be this many times likelier with the cause than without it to be drawn. */
const TELLING = 4;

/** The likeliest `limit` causes of a symptom, what tells them apart and what cures them. */
export function graphOf(tree: FaultTree, symptomKey: string, limit: number): TreeGraph | null {
  const symptom = tree.symptoms.find((s) => s.key === symptomKey);
  if (!symptom) return null;
  const linked = tree.causes
    .filter((c) => c.shows[symptomKey] !== undefined)
    .sort((a, b) => weightOf(b, symptomKey) - weightOf(a, symptomKey));
  const causes = linked.slice(0, limit);
  const tells = causes.flatMap((cause) =>
    Object.entries(cause.gives).flatMap(([checkKey, links]) => {
      const check = tree.checks.find((c) => c.key === checkKey);
      if (!check) return [];
      const sound = soundRow(check);
      const row = causeRow(check, links, sound);
      return check.findings
        .map((f, i) => ({ check: checkKey, finding: f.key, cause: cause.key, ratio: (row[i] ?? 0) / (sound[i] ?? 1) }))
        .filter((link) => link.ratio >= TELLING);
    }),
  );
  const cures = causes.flatMap((cause) =>
    Object.entries(cause.curedBy).map(([remedy, strength]) => ({ cause: cause.key, remedy, strength: probabilityOf(strength) })),
  );
  return {
    symptom,
    causes,
    checks: tree.checks.filter((c) => tells.some((t) => t.check === c.key)),
    remedies: tree.remedies.filter((r) => cures.some((c) => c.remedy === r.key)),
    tells,
    cures,
    folded: linked.length - causes.length,
  };
}

const weightOf = (cause: Cause, symptom: string) =>
  (typeof cause.base === "number" ? cause.base : BASE_RATES[cause.base]) * probabilityOf(cause.shows[symptom]!);
