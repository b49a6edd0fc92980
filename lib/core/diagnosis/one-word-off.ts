import type { FindingLink, Strength } from "../tree/finding-link";
import { BASE_RATES, STRENGTHS, type BaseRate } from "../tree/strength";
import { factorOf, probabilityOf } from "./cause-row";

const WORDS = Object.entries(STRENGTHS).sort((a, b) => b[1] - a[1]) as [keyof typeof STRENGTHS, number][];
/** The trade's signs as factors on a sound engine's odds, and none. */
const FACTORS = ["x60", "x20", "x5", "x1", "x1/3", "x1/10", "x1/50"] as const;
const RATES = Object.entries(BASE_RATES).sort((a, b) => b[1] - a[1]) as [BaseRate, number][];

/** The words next to a value on its scale: at most one above and one below it. */
function beside<T>(scale: readonly (readonly [T, number])[], value: number): readonly T[] {
  const near = (one: number): boolean => Math.abs(one - value) < 1e-9;
  const above = scale.findLast(([, one]) => one > value && !near(one));
  const below = scale.find(([, one]) => one < value && !near(one));
  return [above, below].flatMap((one) => (one ? [one[0]] : []));
}

/** A strength, one word stronger and one weaker; a number has the nearest words. */
export const strengthsBeside = (strength: Strength): readonly Strength[] => beside(WORDS, probabilityOf(strength));

/** A link to a finding, one step stronger and one weaker. */
export function linksBeside(link: FindingLink): readonly FindingLink[] {
  const factor = factorOf(link);
  if (factor === null) return strengthsBeside(link as Strength);
  return beside(
    FACTORS.map((one) => [one, factorOf(one)!] as const),
    factor,
  );
}

/** How common a cause is, one word more and one less. */
export const ratesBeside = (base: BaseRate | number): readonly BaseRate[] =>
  beside(RATES, typeof base === "number" ? base : BASE_RATES[base]);
