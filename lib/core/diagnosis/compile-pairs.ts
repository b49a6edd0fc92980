import { shareOfEngines } from "../tree/applies";
import type { AppliesTo, Cause, FaultTree } from "../tree/schema";
import type { PairsModel, Setting } from "./model";
import { pairAt, pairCount } from "./pairs";

/** A pair of which one brings on the other comes so many times as often as chance alone would have it. */
const BROUGHT_ON = 5;

/**
 * The pairs of causes before anything is told: together a given share, each in
 * proportion to the product of its members' weights, more where one brings on
 * the other, none where no engine has what both apply to. Rule [B4].
 *
 * @param together prior share of all pairs.
 * @returns null where there are no two causes that can meet.
 */
export function compilePairs(
  tree: FaultTree,
  causes: readonly Cause[],
  weights: Float64Array,
  setting: Setting,
  together: number,
): PairsModel | null {
  const factors = new Map<number, number>();
  const times = (a: number, b: number, factor: number): void => {
    const at = pairAt(a, b, causes.length);
    factors.set(at, (factors.get(at) ?? 1) * factor);
  };
  const places = new Map(causes.map(({ key }, index) => [key, index]));
  causes.forEach((cause, a) => {
    for (const root of Object.keys(cause.broughtOnBy)) {
      const b = places.get(root);
      // Two that bring on each other are no likelier for being said twice.
      if (b !== undefined && b !== a && !(causes[b]?.broughtOnBy[cause.key] !== undefined && b < a)) times(a, b, BROUGHT_ON);
    }
  });
  for (const [a, b, factor] of meetings(tree, causes, setting)) times(a, b, factor);
  return pairsModel(weights, factors, together);
}

/** How much oftener than by chance two causes meet on one engine, where both hang on the same features and those are not known. */
function meetings(tree: FaultTree, causes: readonly Cause[], { profile, situation }: Setting): [number, number, number][] {
  const shareOf = (appliesTo: AppliesTo | undefined): number => shareOfEngines(appliesTo, profile, situation, tree.features);
  const open = causes.flatMap((cause, index) => {
    const share = shareOf(cause.appliesTo);
    return share < 1 ? [{ index, share, features: cause.appliesTo?.features ?? {} }] : [];
  });
  return open.flatMap((one, place) =>
    open.slice(place + 1).flatMap((other): [number, number, number][] => {
      const common = Object.keys(one.features).filter((key) => other.features[key] !== undefined);
      if (common.length === 0) return [];
      const features: Record<string, string[]> = { ...one.features, ...other.features };
      for (const key of common) features[key] = one.features[key]!.filter((option) => other.features[key]!.includes(option));
      return [[one.index, other.index, shareOf({ features }) / (one.share * other.share)]];
    }),
  );
}

/**
 * As compilePairs, from bare numbers.
 *
 * @param factors what stands on the product of the weights, by place of the pair; absent: 1.
 */
export function pairsModel(weights: Float64Array, factors: ReadonlyMap<number, number>, together: number): PairsModel | null {
  const count = weights.length;
  let total = 0;
  for (let a = 0, at = 0; a < count; a++)
    for (let b = a + 1; b < count; b++, at++) total += weights[a]! * weights[b]! * (factors.get(at) ?? 1);
  if (!(total > 0)) return null;
  const half = Math.log(together / total) / 2;
  const places = [...factors.keys()].sort((a, b) => a - b);
  return {
    count: pairCount(count),
    prior: {
      each: weights.map((weight) => Math.log(weight) + half),
      at: Int32Array.from(places),
      more: Float64Array.from(places, (at) => Math.log(factors.get(at)!)),
    },
  };
}
