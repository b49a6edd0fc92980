import { betaAbove, betaBelow, betaQuantile } from "../statistics/beta";
import { chiSquareQuantile } from "../statistics/chi-square";
import type { FaultTimes } from "./fault-times";

/**
 * Two-sided limits of the hours between faults at a constant rate. With no fault yet the lower one takes the whole tail and nothing
 * bounds it above (Infinity). Source: NIST/SEMATECH e-Handbook 8.4.5.1; Epstein & Sobel 1953.
 *
 * @param faults how many were seen
 * @param time hours watched
 */
export function mtbfLimits(faults: number, time: number, ended: FaultTimes["ended"], confidence: number): [number, number] {
  if (faults === 0) return [time / -Math.log(1 - confidence), Infinity];
  const tail = (1 - confidence) / 2;
  const degrees = ended === "time" ? 2 * faults + 2 : 2 * faults;
  return [(2 * time) / chiSquareQuantile(1 - tail, degrees), (2 * time) / chiSquareQuantile(tail, 2 * faults)];
}

export type Watched = { readonly faults: number; readonly time: number };

/** P(so many of all faults, or more, in the first) if both had one rate: exact, given their sum (Przyborowski & Wilenski 1940). */
export function oftenerByChance(first: Watched, second: Watched): number {
  if (first.faults === 0) return 1;
  return betaBelow(first.time / (first.time + second.time), first.faults, second.faults + 1);
}

/** P(so few or fewer in the first) if both had one rate. */
export function seldomerByChance(first: Watched, second: Watched): number {
  if (second.faults === 0) return 1;
  return betaAbove(first.time / (first.time + second.time), first.faults + 1, second.faults);
}

/** Exact limits of the ratio of the first rate to the second (Clopper-Pearson on the share). */
export function rateRatioLimits(first: Watched, second: Watched, confidence: number): [number, number] {
  const tail = (1 - confidence) / 2;
  const low = first.faults === 0 ? 0 : betaQuantile(tail, first.faults, second.faults + 1);
  const high = second.faults === 0 ? 1 : betaQuantile(1 - tail, first.faults + 1, second.faults);
  const ratio = (share: number) => (share >= 1 ? Infinity : (share / (1 - share)) * (second.time / first.time));
  return [ratio(low), ratio(high)];
}
