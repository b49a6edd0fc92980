import { betaAbove, betaBelow } from "./beta";
import { poissonAtLeast, poissonAtMost } from "./poisson";

/**
 * What is known of a rate: a gamma distribution, events in `exposure` as if `events` had been seen.
 * Its mean is events / exposure; both above 0.
 */
export type GammaRate = { readonly events: number; readonly exposure: number };

/**
 * P(N >= n) in so much time, the rate itself uncertain (gamma-Poisson, which is the negative binomial).
 * Exact, by the beta integral.
 */
export function gammaPoissonAtLeast(n: number, rate: GammaRate, time: number): number {
  if (n <= 0) return 1;
  if (time <= 0) return 0;
  // Beyond this the gamma is a point to twelve figures and the beta integral loses some.
  if (rate.events > 1e9) return poissonAtLeast(n, (rate.events / rate.exposure) * time);
  return betaBelow(time / (time + rate.exposure), n, rate.events);
}

/** P(N <= n) in so much time, the rate itself uncertain. */
export function gammaPoissonAtMost(n: number, rate: GammaRate, time: number): number {
  if (n < 0) return 0;
  if (time <= 0) return 1;
  if (rate.events > 1e9) return poissonAtMost(n, (rate.events / rate.exposure) * time);
  return betaAbove(time / (time + rate.exposure), n + 1, rate.events);
}
