import { chiSquareQuantile } from "../statistics/chi-square";
import { informative, type FaultTimes } from "./fault-times";

/**
 * Power-law growth (Crow-AMSAA): faults by time t are lambda t^beta; beta above 1 is worsening.
 * Source: MIL-HDBK-189, 1981, app. C; Crow 1974; NIST/SEMATECH e-Handbook 8.4.5.2.
 */
export type PowerLaw = {
  /** Likeliest values. */
  beta: number;
  lambda: number;
  /** Corrected for bias; null where there are too few faults. */
  betaUnbiased: number | null;
  /** Hours between faults at the end of the record, by the likeliest values and by the unbiased beta. */
  mtbfNow: number;
  mtbfNowUnbiased: number | null;
};

/** null where fewer than two faults carry evidence, or all stand at the end. */
export function powerLaw(record: FaultTimes): PowerLaw | null {
  const { times, end } = informative(record);
  const n = record.times.length;
  const logs = logSum(times, end);
  if (times.length < 2 || !(logs > 0)) return null;
  const beta = n / logs;
  const betaUnbiased = (times.length - 1) / logs;
  const mtbf = (b: number) => end / (n * b);
  return { beta, lambda: n / end ** beta, betaUnbiased, mtbfNow: mtbf(beta), mtbfNowUnbiased: mtbf(betaUnbiased) };
}

/** Limits of beta at a two-sided confidence: exact, by chi-square. */
export function betaLimits(record: FaultTimes, confidence: number): [number, number] | null {
  const fit = powerLaw(record);
  if (!fit) return null;
  const degrees = 2 * informative(record).times.length;
  const scale = fit.beta / (2 * record.times.length);
  const tail = (1 - confidence) / 2;
  return [scale * chiSquareQuantile(tail, degrees), scale * chiSquareQuantile(1 - tail, degrees)];
}

/** Critical values of the Cramer-von Mises distance at 10 %, by the number of faults (400 000 draws; MIL-HDBK-189 prints them to .01). */
const CRITICAL: readonly [faults: number, value: number][] = [
  [2, 0.161],
  [3, 0.154],
  [4, 0.153],
  [5, 0.16],
  [6, 0.163],
  [8, 0.165],
  [10, 0.168],
  [15, 0.17],
  [20, 0.171],
  [30, 0.172],
  [60, 0.174],
];

/** How far the faults lie from the power law (Cramer-von Mises), and whether it fits at 10 %. null under three faults that carry evidence. */
export function fitOfPowerLaw(record: FaultTimes): { distance: number; fits: boolean } | null {
  const beta = powerLaw(record)?.betaUnbiased;
  const { times, end } = informative(record);
  const m = times.length;
  if (!beta || m < 3) return null;
  const distance = times.reduce((sum, time, i) => sum + ((time / end) ** beta - (2 * i + 1) / (2 * m)) ** 2, 1 / (12 * m));
  const critical = CRITICAL.findLast(([faults]) => faults <= m)?.[1] ?? 0.174;
  return { distance, fits: distance <= critical };
}

const logSum = (times: readonly number[], end: number) => times.reduce((sum, time) => sum + Math.log(end / time), 0);
