import { gammaAbove, gammaBelow, gammaQuantile } from "./gamma";

/** P(N >= n) of a count with so high a mean. Exact: the n-th event has come if its gamma waiting time is over. */
export const poissonAtLeast = (n: number, mean: number): number => (n <= 0 ? 1 : gammaBelow(mean, n));

/** P(N <= n) of a count with so high a mean. */
export const poissonAtMost = (n: number, mean: number): number => (n < 0 ? 0 : gammaAbove(mean, n + 1));

/** Limits of a mean from one count: the exact two-sided interval at confidence `confidence` (Garwood). */
export function poissonMeanLimits(n: number, confidence: number): [number, number] {
  const tail = (1 - confidence) / 2;
  return [n === 0 ? 0 : gammaQuantile(tail, n), gammaQuantile(1 - tail, n + 1)];
}
