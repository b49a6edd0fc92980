import { restating } from "./finding-weight";
import type { CheckModel, Model } from "./model";

/** A check as the planner sees it now: what it would show, and what each finding would then weigh. */
export type Outcomes = {
  /** predict[finding][hypothesis] = P(finding). */
  readonly predict: readonly Float64Array[];
  /** weigh[finding][hypothesis] = what belief multiplies by; the same rows, unless a finding restates a symptom. */
  readonly weigh: readonly Float64Array[];
  /** Sum of P ln P a hypothesis, where predict and weigh are the same; else null. */
  readonly negEntropy: Float64Array | null;
};

/** A sound engine's row says nothing of an engine with the symptom: most then show it again. Rule [N6]. */
const SHOWS_AGAIN = 0.95;

/** The outcomes of a check, once symptoms that it restates have been reported. Rules [E4], [N6]. */
export function outcomesOf(model: Model, check: CheckModel, reported: ReadonlySet<string>): Outcomes {
  const again = restating(check, reported);
  if (again.length === 0) return { predict: check.rows, weigh: check.rows, negEntropy: check.negEntropy };
  const sum = (findings: readonly number[], index: number): number =>
    findings.reduce((all, finding) => all + (check.rows[finding]?.[index] ?? 0), 0);
  const linked = model.causes.map((cause) => cause.gives[check.key] !== undefined);
  const predict = check.rows.map((row, finding) =>
    row.map((share, index) => {
      if (linked[index]) return share;
      const restates = sum(again, index);
      return again.includes(finding) ? (SHOWS_AGAIN * share) / restates : ((1 - SHOWS_AGAIN) * share) / (1 - restates);
    }),
  );
  const weigh = check.rows.map((row, finding) => (again.includes(finding) ? row.map((share, index) => share / sum(again, index)) : row));
  return { predict, weigh, negEntropy: null };
}

/** How much the check is expected to tell, in nats. */
export function informationOf(outcomes: Outcomes, shares: Float64Array): number {
  return outcomes.negEntropy ? quickInformation(outcomes.predict, outcomes.negEntropy, shares) : slowInformation(outcomes, shares);
}

function quickInformation(rows: readonly Float64Array[], negEntropy: Float64Array, shares: Float64Array): number {
  let sum = 0;
  for (let index = 0; index < shares.length; index++) sum += shares[index]! * negEntropy[index]!;
  for (const row of rows) {
    let chance = 0;
    for (let index = 0; index < shares.length; index++) chance += shares[index]! * row[index]!;
    if (chance > 0) sum -= chance * Math.log(chance);
  }
  return Math.max(0, sum);
}

function slowInformation({ predict, weigh }: Outcomes, shares: Float64Array): number {
  let left = 0;
  predict.forEach((row, finding) => {
    let chance = 0;
    for (let index = 0; index < shares.length; index++) chance += shares[index]! * row[index]!;
    const then = shares.map((share, index) => share * (weigh[finding]?.[index] ?? 0));
    left += chance * entropyOf(then);
  });
  return Math.max(0, entropyOf(shares) - left);
}

/** Entropy in nats of weights that need not sum to 1. */
export function entropyOf(weights: Float64Array): number {
  let total = 0;
  let sum = 0;
  for (const weight of weights) {
    total += weight;
    if (weight > 0) sum += weight * Math.log(weight);
  }
  return total > 0 ? Math.log(total) - sum / total : 0;
}
