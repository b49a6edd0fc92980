import { gammaAbove, gammaQuantile } from "./gamma";

/** P(Z > x) of a standard normal variable: half the tail of a chi-square with one degree of freedom at x squared. */
export function normalAbove(x: number): number {
  const tail = gammaAbove((x * x) / 2, 0.5) / 2;
  return x >= 0 ? tail : 1 - tail;
}

/** P(Z <= x) of a standard normal variable. */
export const normalBelow = (x: number): number => normalAbove(-x);

/** The value that a standard normal variable stays below with probability `p`. */
export function normalQuantile(p: number): number {
  if (p < 0.5) return -normalQuantile(1 - p);
  return Math.sqrt(2 * gammaQuantile(2 * p - 1, 0.5));
}
