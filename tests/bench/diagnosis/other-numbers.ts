import { factorOf, probabilityOf } from "@/lib/core/diagnosis/cause-row";
import type { FindingLink, Strength } from "@/lib/core/tree/finding-link";
import type { FaultTree } from "@/lib/core/tree/schema";
import { BASE_RATES, STRENGTHS } from "@/lib/core/tree/strength";
import type { Dice } from "../../support/dice";

const WORDS = Object.values(STRENGTHS).sort((a, b) => a - b);
/** Evidence as it is graded, weakest first; a factor goes one step up or down. */
const FACTORS = [1 / 50, 1 / 10, 1 / 3, 1, 5, 20, 60];
const BASES_OFF_BY = 2;

/** The same tree with other numbers in it: every word one off, up or down as it falls; every base rate twice or half. */
export function otherNumbers(tree: FaultTree, dice: Dice): FaultTree {
  const up = (): boolean => dice.roll() < 0.5;
  const strength = (of: Strength): Strength => oneOff(WORDS, probabilityOf(of), up());
  const link = (of: FindingLink): FindingLink => {
    const factor = factorOf(of);
    if (factor === null) return strength(of as Strength);
    const other = oneOff(FACTORS, factor, up());
    return other >= 1 ? `x${other}` : `x1/${Math.round(1 / other)}`;
  };
  return {
    ...tree,
    causes: tree.causes.map((cause) => ({
      ...cause,
      base: (typeof cause.base === "number" ? cause.base : BASE_RATES[cause.base]) * (up() ? BASES_OFF_BY : 1 / BASES_OFF_BY),
      shows: mapped(cause.shows, strength),
      gives: mapped(cause.gives, (findings) => mapped(findings, link)),
      curedBy: mapped(cause.curedBy, strength),
    })),
  };
}

const mapped = <T>(of: Readonly<Record<string, T>>, change: (one: T) => T): Record<string, T> =>
  Object.fromEntries(Object.entries(of).map(([key, one]) => [key, change(one)]));

/** The next step of a scale above or below; at its end, the other way. */
function oneOff(scale: readonly number[], value: number, up: boolean): number {
  const nearest = scale.reduce(
    (best, one, at) => (Math.abs(Math.log(one / value)) < Math.abs(Math.log(scale[best]! / value)) ? at : best),
    0,
  );
  return scale[nearest + (up ? 1 : -1)] ?? scale[nearest + (up ? -1 : 1)]!;
}
