import type { Evidence } from "./evidence";
import { addSpoken } from "./finding-weight";
import { leftOfPairs } from "./left-of-pairs";
import type { Model } from "./model";
import { findingTable } from "./pair-finding";
import { betterTable } from "./pair-remedy";
import { symptomTable } from "./pair-symptom";
import { PairWeights } from "./pair-weights";
import { toldOf, type RemedyTold, type Told } from "./told";

/** What is believed: one number a cause, the unknown last, unless said otherwise. */
export type Belief = {
  /**
   * Shares that sum to 1. An engine with two faults counts half for each; once
   * one of two was put right, it counts for the one that is left.
   */
  readonly shares: Float64Array;
  /** This cause and no other. */
  readonly alone: Float64Array;
  /** This cause, alone or beside another; once one of two was put right, this cause is left. */
  readonly marginals: Float64Array;
  /** That there are two, or were until one of them was put right. */
  readonly two: number;
  /** Both causes of each pair, in the order of pairAt(): there now, or until one of them was put right. Empty where no pairs are reckoned with. */
  readonly pairs: Float64Array;
  /** Once one of two was put right: that it was this cause. */
  readonly putRight?: Float64Array;
};

/**
 * How strongly each hypothesis is believed after all that is known.
 *
 * One cause or two are taken to be at fault, and findings to be independent once
 * they are known; SPEC.md says where that misleads. Works in logarithms, since a
 * long session multiplies enough small numbers to reach zero. What is known is
 * taken in the order of its keys, so the order of telling cannot change a single
 * bit. Rules [P1]-[P4], [B4], [E1]-[E4], [K2], [M2]-[M4].
 */
export function believe(model: Model, evidence: Evidence): Belief {
  const told = toldOf(model, evidence);
  const pairs = model.pairs && new PairWeights(model.pairs);
  const room = new Float64Array(model.pairs?.count ?? 0);
  const log = Float64Array.from(model.logPrior);
  addSymptoms(model, told, log, pairs, room);
  addFindings(told, log, pairs);
  addRemedies(told, log, pairs);
  let most = -Infinity;
  for (let index = 0; index < log.length; index++) most = Math.max(most, log[index]!);
  // Only "cured" can rule everything out, in a tree where nothing applies; then nothing is learnt.
  if (most === -Infinity) return evenly(log.length, room);
  const alone = log;
  for (let index = 0; index < log.length; index++) alone[index] = Math.exp(log[index]! - most);
  pairs?.weights(most, room);
  return told.curedOne ? leftOfPairs(model, told, alone, room) : withPairs(alone, room);
}

function addSymptoms(model: Model, told: Told, log: Float64Array, pairs: PairWeights | null, room: Float64Array): void {
  for (const { symptom, before, left } of told.symptoms) {
    const { present, absent } = model.logSymptoms.get(symptom)!;
    if (before !== null) addTo(log, before ? present : absent, model.unknownAt);
    if (left !== null && left !== before) addTo(log, left ? present : absent, model.unknownAt);
    if (left !== null || !pairs) continue;
    if (before) pairs.add(symptomTable(model.symptoms.get(symptom)!));
    else pairs.addEach(absent);
  }
  if (told.symptoms.length > 0 && model.unknownAt > 0) {
    // What is told of what is left weighs on one cause: its mean is that over single causes.
    const both = told.curedOne ? null : pairs;
    const before = both ? model.logPriorOfCauses : logSum(model.logPrior, model.unknownAt, null, room);
    log[model.unknownAt] = log[model.unknownAt]! + logSum(log, model.unknownAt, both, room) - before;
  }
}

/** ln of the sum over all causes and pairs: over the prior's, their mean likelihood, so that the unknown keeps its share whatever is reported. Rule [K2]. */
function logSum(log: Float64Array, causes: number, pairs: PairWeights | null, room: Float64Array): number {
  let most = -Infinity;
  for (let index = 0; index < causes; index++) most = Math.max(most, log[index]!);
  let sum = 0;
  for (let index = 0; index < causes; index++) sum += Math.exp(log[index]! - most);
  if (pairs) sum += pairs.weights(most, room);
  return Math.log(sum) + most;
}

function addFindings({ before, left }: Told, log: Float64Array, pairs: PairWeights | null): void {
  for (const one of before.findings) {
    addSpoken(one, log);
    pairs?.add(findingTable(one.check, one.finding, one.again));
  }
  for (const one of left.findings) addSpoken(one, log);
}

function addRemedies({ before, left, curedOne }: Told, log: Float64Array, pairs: PairWeights | null): void {
  for (const { remedy, result } of before.remedies) {
    addTo(log, remedy.logResults[result], log.length);
    if (result === "better") pairs?.add(betterTable(remedy));
    else pairs?.addEach(remedy.logResults[result]);
  }
  const after: readonly RemedyTold[] = curedOne ? [{ remedy: curedOne, result: "better" }, ...left.remedies] : [];
  for (const { remedy, result } of after) addTo(log, remedy.logResults[result], log.length);
}

function addTo(log: Float64Array, row: Float64Array, count: number): void {
  for (let index = 0; index < count; index++) log[index] = log[index]! + row[index]!;
}

function evenly(size: number, pairs: Float64Array): Belief {
  const shares = new Float64Array(size).fill(1 / size);
  return { shares, alone: shares, marginals: shares, two: 0, pairs: pairs.fill(0) };
}

/** Weights of single causes and of pairs as shares; both are scaled in place. */
function withPairs(alone: Float64Array, pairs: Float64Array): Belief {
  const causes = alone.length - 1;
  const beside = new Float64Array(alone.length);
  let sum = 0;
  for (let a = 0, at = 0; a < causes; a++) {
    let ofA = 0;
    for (let b = a + 1; b < causes && pairs.length > 0; b++, at++) {
      const weight = pairs[at]!;
      ofA += weight;
      beside[b] = beside[b]! + weight;
    }
    beside[a] = beside[a]! + ofA;
    sum += ofA;
  }
  let total = sum;
  for (let a = 0; a < alone.length; a++) total += alone[a]!;
  for (let at = 0; at < pairs.length; at++) pairs[at] = pairs[at]! / total;
  const shares = new Float64Array(alone.length);
  const marginals = new Float64Array(alone.length);
  for (let a = 0; a < alone.length; a++) {
    alone[a] = alone[a]! / total;
    shares[a] = alone[a]! + beside[a]! / 2 / total;
    marginals[a] = alone[a]! + beside[a]! / total;
  }
  return { shares, alone, marginals, two: sum / total, pairs };
}
