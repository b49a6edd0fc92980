import gammainc from "@stdlib/math-base-special-gammainc";
import gammaincinv from "@stdlib/math-base-special-gammaincinv";

/**
 * P(G <= x) of a gamma variable of rate 1: the waiting time for `shape` events that come once a unit of time.
 *
 * @param shape above 0; 0 stands for a variable that is always 0
 */
export function gammaBelow(x: number, shape: number): number {
  if (shape === 0) return x >= 0 ? 1 : 0;
  return x <= 0 ? 0 : gammainc(x, shape, true, false);
}

/** P(G > x), without the loss of figures of 1 - gammaBelow far out. */
export function gammaAbove(x: number, shape: number): number {
  if (shape === 0) return x >= 0 ? 0 : 1;
  return x <= 0 ? 1 : gammainc(x, shape, true, true);
}

/** The x that a gamma variable of rate 1 stays below with probability `p`, 0 to 1. */
export function gammaQuantile(p: number, shape: number): number {
  if (p <= 0 || shape === 0) return 0;
  if (p >= 1) return Infinity;
  return gammaincinv(p, shape, false);
}
