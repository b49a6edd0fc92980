import { addFinding, restating, speaksLouder, type Heard } from "./finding-weight";
import { negEntropyOf } from "./compile-check";
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

/**
 * The outcomes of a check, once symptoms that it restates have been reported
 * and something else may already have seen the same. Rules [E3], [E4], [N6], [N9].
 *
 * @param seen the finding that counts so far of the checks that see the same thing.
 */
export function outcomesOf(model: Model, check: CheckModel, reported: ReadonlySet<string>, seen?: Heard): Outcomes {
  const plain = reportedOutcomes(model, check, reported);
  return seen ? { ...plain, weigh: insteadOf(seen, check, plain.weigh, reported), negEntropy: null } : plain;
}

/** Rows of checks that restate a symptom, made once for each set of findings that do. */
const kept = new WeakMap<CheckModel, Map<string, Outcomes>>();

function reportedOutcomes(model: Model, check: CheckModel, reported: ReadonlySet<string>): Outcomes {
  const again = restating(check, reported);
  if (again.length === 0) return { predict: check.rows, weigh: check.rows, negEntropy: check.negEntropy };
  const ofCheck = kept.get(check) ?? new Map<string, Outcomes>();
  kept.set(check, ofCheck);
  const key = again.join();
  const outcomes = ofCheck.get(key) ?? restated(model, check, again);
  ofCheck.set(key, outcomes);
  return outcomes;
}

function restated(model: Model, check: CheckModel, again: readonly number[]): Outcomes {
  const sums = new Float64Array(check.rows[0]?.length ?? 0);
  for (const finding of again) check.rows[finding]!.forEach((share, index) => (sums[index] = sums[index]! + share));
  const linked = model.causes.map((cause) => cause.gives[check.key] !== undefined);
  const predict = check.rows.map((row, finding) => {
    const says = again.includes(finding);
    return row.map((share, index) => {
      if (linked[index]) return share;
      return says ? (SHOWS_AGAIN * share) / sums[index]! : ((1 - SHOWS_AGAIN) * share) / (1 - sums[index]!);
    });
  });
  const weigh = check.rows.map((row, finding) => (again.includes(finding) ? row.map((share, index) => share / sums[index]!) : row));
  return { predict, weigh, negEntropy: null };
}

/** A louder finding takes the place of what was seen; a quieter one changes nothing. */
function insteadOf(seen: Heard, check: CheckModel, weigh: readonly Float64Array[], reported: ReadonlySet<string>): readonly Float64Array[] {
  const before = new Float64Array(weigh[0]?.length ?? 0);
  addFinding(seen, reported, before);
  return weigh.map((row, finding) =>
    speaksLouder({ check, finding }, seen)
      ? row.map((share, index) => share / Math.exp(before[index] ?? 0))
      : new Float64Array(row.length).fill(1),
  );
}

/**
 * What a second look at the same thing may show, given what the first has
 * shown: in proportion to what each finding would change, so that asking is not
 * expected to move belief either way. Rule [N9].
 */
export function secondLook({ predict, weigh }: Outcomes, shares: Float64Array): Outcomes {
  const chances = predict.map((row) => row.reduce((sum, one, index) => sum + one * (shares[index] ?? 0), 0));
  const sums = shares.map((_, index) => weigh.reduce((sum, row, finding) => sum + (row[index] ?? 0) * (chances[finding] ?? 0), 0));
  const rows = weigh.map((row, finding) => row.map((one, index) => (one * (chances[finding] ?? 0)) / (sums[index] ?? 1)));
  return { predict: rows, weigh: rows, negEntropy: negEntropyOf(rows) };
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
  let told = entropyOf(shares);
  for (let finding = 0; finding < predict.length; finding++) {
    const [shown, weighs] = [predict[finding]!, weigh[finding]!];
    let chance = 0;
    let total = 0;
    let logs = 0;
    for (let index = 0; index < shares.length; index++) {
      const then = shares[index]! * weighs[index]!;
      chance += shares[index]! * shown[index]!;
      total += then;
      if (then > 0) logs += then * Math.log(then);
    }
    if (total > 0) told -= chance * (Math.log(total) - logs / total);
  }
  return Math.max(0, told);
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
