import type { Belief } from "./believe";
import { UNKNOWN } from "./compile";
import { addSpoken } from "./finding-weight";
import type { Model } from "./model";
import type { Told } from "./told";

/**
 * What is left once a remedy has put right one of two: each pair comes apart
 * into "a is put right, b is left" and the other way round, and what was told
 * since speaks of the one that is left. What is left may as well be something
 * that is not in the tree. Rule [M4].
 *
 * @param alone weights of the single causes and, last, the unknown, with all that was told.
 * @param pairs weights of all pairs, to the same unit, with what was told before.
 */
export function leftOfPairs(model: Model, told: Told, alone: Float64Array, pairs: Float64Array): Belief {
  const causes = model.unknownAt;
  const { gone, shows, stays, unknownStays } = eachOf(model, told);
  const left = Float64Array.from(alone);
  const both = new Float64Array(pairs.length);
  const putRight = new Float64Array(causes);
  let unknown = 0;
  let two = 0;
  for (let a = 0, at = 0; a < causes; a++)
    for (let b = a + 1; b < causes && pairs.length > 0; b++, at++) {
      const weight = pairs[at]!;
      const leavesA = weight * gone[b]! * stays[a]!;
      const leavesB = weight * gone[a]! * stays[b]!;
      left[a] = left[a]! + leavesA;
      left[b] = left[b]! + leavesB;
      both[at] = leavesA + leavesB;
      putRight[a] = putRight[a]! + leavesB;
      putRight[b] = putRight[b]! + leavesA;
      two += both[at]!;
      unknown += weight * (gone[b]! * shows[a]! + gone[a]! * shows[b]!);
    }
  const unknownLeft = (UNKNOWN / (1 - UNKNOWN)) * unknown * unknownStays;
  left[causes] = left[causes]! + unknownLeft;
  two += unknownLeft;
  let total = 0;
  for (const one of left) total += one;
  const share = (weight: number): number => weight / total;
  const shares = left.map(share);
  return { shares, alone: alone.map(share), marginals: shares, two: two / total, pairs: both.map(share), putRight: putRight.map(share) };
}

/** For each cause the chance of what was told, if it was put right, and if it is what is left: `shows` of symptoms alone, `stays` of everything. */
function eachOf(model: Model, { symptoms, left, curedOne }: Told) {
  const causes = model.unknownAt;
  const gone = new Float64Array(causes);
  const shows = new Float64Array(causes);
  for (const { symptom, before, left: now } of symptoms) {
    if (now === null) continue;
    const { present, absent } = model.logSymptoms.get(symptom)!;
    for (let index = 0; index < causes; index++) {
      // What was reported and is gone went with the cause that was put right.
      if (before && !now) gone[index] = gone[index]! + present[index]!;
      shows[index] = shows[index]! + (now ? present : absent)[index]!;
    }
  }
  const stays = new Float64Array(causes + 1);
  stays.set(shows);
  for (const one of left.findings) addSpoken(one, stays);
  for (const { remedy, result } of left.remedies)
    for (let index = 0; index <= causes; index++) stays[index] = stays[index]! + remedy.logResults[result][index]!;
  const cure = curedOne?.cure ?? new Float64Array(causes + 1);
  return {
    gone: gone.map((log, index) => Math.exp(log) * cure[index]!),
    shows: shows.map(Math.exp),
    stays: stays.map((log, index) => Math.exp(log) * (index < causes ? 1 - cure[index]! : 1)),
    unknownStays: Math.exp(stays[causes]!),
  };
}
