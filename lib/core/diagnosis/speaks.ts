import { believe } from "./believe";
import type { Evidence } from "./evidence";
import type { Model } from "./model";
import { RESULTS_SAID } from "./words";
import type { EvidenceShown } from "./view";

/** Evidence that moves the odds by less than a tenth is not worth a line. */
const WORTH_SAYING = 1.1;

type Piece = { readonly title: string; readonly says: string; readonly without: Evidence };

export type Speaks = { readonly for: readonly EvidenceShown[]; readonly against: readonly EvidenceShown[] };

/**
 * What speaks for and against each cause, alone or beside another: by how much its odds would
 * change if this one piece had not been told, all else as it is. Rule [X2].
 *
 * @param marginals as believed with all of the evidence.
 * @returns a function from the index of a cause; strongest first.
 */
export function speaksOf(model: Model, evidence: Evidence, marginals: Float64Array): (hypothesis: number) => Speaks {
  const pieces = piecesOf(model, evidence).map((piece) => ({ ...piece, marginals: believe(model, piece.without).marginals }));
  return (hypothesis) => {
    const moved = pieces.map(({ title, says, marginals: without }) => ({
      title,
      says,
      factor: odds(marginals[hypothesis] ?? 0) / odds(without[hypothesis] ?? 0),
    }));
    return {
      for: moved.filter(({ factor }) => factor > WORTH_SAYING).sort((a, b) => b.factor - a.factor),
      against: moved.filter(({ factor }) => factor < 1 / WORTH_SAYING).sort((a, b) => a.factor - b.factor),
    };
  };
}

/** Kept off 0 and 1, so that a factor is always a number. */
const odds = (share: number): number => {
  const kept = Math.min(1 - 1e-12, Math.max(1e-12, share));
  return kept / (1 - kept);
};

function piecesOf(model: Model, evidence: Evidence): readonly Piece[] {
  const without = <T>(items: readonly T[], item: T): readonly T[] => items.filter((other) => other !== item);
  const symptoms = evidence.symptoms.map((one) => ({
    title: model.tree.symptoms.find((symptom) => symptom.key === one.symptom)?.title ?? one.symptom,
    says: one.present ? "reported" : "not so",
    without: { ...evidence, symptoms: without(evidence.symptoms, one) },
  }));
  const findings = evidence.findings.flatMap((one) => {
    const check = model.checks[model.checkAt.get(one.check) ?? -1]?.check;
    const says = check?.findings.find((finding) => finding.key === one.finding)?.title;
    return check && says !== undefined
      ? [{ title: check.title, says, without: { ...evidence, findings: without(evidence.findings, one) } }]
      : [];
  });
  const remedies = evidence.remedies.flatMap((one) => {
    const remedy = model.remedies[model.remedyAt.get(one.remedy) ?? -1]?.remedy;
    const { curedOne, ...rest } = evidence;
    const others = { ...(one.remedy === curedOne ? rest : evidence), remedies: without(evidence.remedies, one) };
    return remedy ? [{ title: remedy.title, says: RESULTS_SAID[one.result], without: others }] : [];
  });
  return [...symptoms, ...findings, ...remedies];
}
