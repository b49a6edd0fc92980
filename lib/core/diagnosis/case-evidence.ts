import type { Answer } from "../contract/event";
import type { FaultTree, KnownCase, Who } from "../tree/schema";
import type { Evidence } from "./evidence";
import type { Setting } from "./model";
import { readAnswer } from "./read-answer";

/** How much of a known case is told: what was known at the start, all but the look that settled it, or all. */
export type Told = "start" | "but-confirming" | "all";

export const settingFor = (known: KnownCase, person: Who): Setting => ({
  profile: { features: known.features, figures: known.figures, healthy: {} },
  situation: known.situation,
  person,
});

/** The answer of a case to a check, as it would be typed; null where the case does not say. */
export function answerOf(known: KnownCase, check: string): Answer | null {
  const told = known.findings.find((finding) => finding.check === check);
  if (!told) return null;
  if (told.value !== undefined && told.unit !== undefined) return { value: told.value, unit: told.unit };
  return told.finding === undefined ? null : { finding: told.finding };
}

/** What a known case tells, as evidence. Rule [V1]. */
export function evidenceFor(tree: FaultTree, known: KnownCase, told: Told): Evidence {
  const { profile } = settingFor(known, "mechanic");
  const findings = known.findings
    .filter((finding) => (told === "start" ? finding.when === "start" : told === "all" || finding.confirms !== true))
    .map(({ check: key }) => {
      const check = tree.checks.find((one) => one.key === key);
      const answer = answerOf(known, key);
      return { check: key, finding: check && answer ? readAnswer(check, answer, profile, tree.features) : null };
    });
  const remedies = (known.tried ?? [])
    .filter(({ when }) => told !== "start" || when === "start")
    .map(({ remedy, result }) => ({ remedy, result }));
  return { symptoms: known.symptoms.map((symptom) => ({ symptom, present: true })), findings, remedies };
}
