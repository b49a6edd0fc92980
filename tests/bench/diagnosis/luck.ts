import { dice, placeOf } from "../../support/dice";

/**
 * What fate holds for one run, drawn before anything is done, so that every way
 * of going on meets the same: common random numbers.
 */
export type Luck = {
  /** The hypothesis that is true. */
  readonly truth: number;
  /** One roll a check: where in its row the answer falls. */
  readonly checks: Float64Array;
  readonly remedies: Float64Array;
  /** One roll a check for each way that people spoil an answer. */
  readonly wrong: Float64Array;
  readonly refused: Float64Array;
};

/** @param weights of the hypotheses, in truth; they need not sum to 1. */
export function drawLuck(seed: number, weights: ArrayLike<number>, checks: number, remedies: number): Luck {
  const { roll } = dice(seed);
  const rolls = (count: number): Float64Array => Float64Array.from({ length: count }, roll);
  return {
    truth: placeOf(weights, roll()),
    checks: rolls(checks),
    remedies: rolls(remedies),
    wrong: rolls(checks),
    refused: rolls(checks),
  };
}
