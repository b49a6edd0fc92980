import type { DiagnosisEvent } from "../contract/event";
import type { FaultTree, KnownCase } from "../tree/schema";
import { fold } from "./fold";

/**
 * A logged diagnosis as a known case: what was told, and the cause that a
 * proved cure left no doubt about. Rule [V4].
 *
 * Null where the log proves nothing: not ended as cured, without a proof, with
 * a cause in the person's own words, or of two faults of which the outcome
 * names one, so that nobody can say which finding was whose. "Can't tell" and "not fitted" are no
 * findings. What was known at the start is not in the log, and is not guessed.
 */
export function caseOfLog(log: readonly DiagnosisEvent[], titles: Pick<FaultTree, "causes" | "symptoms">): KnownCase | null {
  const state = fold(log);
  const { begun, ended, partCure } = state;
  if (begun === null || ended === null || partCure !== null) return null;
  const { outcome, cause, proof } = ended.payload;
  if (outcome !== "cured" || cause === undefined || proof === undefined || proof === "") return null;
  const symptoms = state.symptoms.filter(({ present }) => present).map(({ symptom }) => symptom);
  const titleOf = (list: readonly { key: string; title: string }[], key: string): string =>
    list.find((one) => one.key === key)?.title ?? key;
  return {
    key: `logged-${begun.diagnosisId}`,
    title: [symptoms.map((key) => titleOf(titles.symptoms, key)).join(", "), titleOf(titles.causes, cause)]
      .filter((part) => part !== "")
      .join("; ")
      .slice(0, 200),
    features: state.profile.features,
    figures: state.profile.figures,
    situation: state.situation,
    symptoms,
    findings: [...state.answers.values()].flatMap(({ payload: { check, answer } }): KnownCase["findings"] => {
      if ("finding" in answer) return [{ check, finding: answer.finding, when: "after" }];
      return "value" in answer ? [{ check, value: answer.value, unit: answer.unit, when: "after" }] : [];
    }),
    tried: [...state.remedies.values()].flatMap(({ payload: { remedy, result } }) =>
      result === "no-change" || result === "better" ? [{ remedy, result, when: "after" as const }] : [],
    ),
    causes: [cause],
    alsoAccept: [],
    source: `Logged and proved, ${ended.madeAt.slice(0, 10)}`,
  };
}
