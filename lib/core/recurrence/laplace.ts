import { normalAbove } from "../statistics/normal";
import { sumOfUniformsAtLeast } from "../statistics/sum-of-uniforms";
import { gapsOf, informative, type FaultTimes } from "./fault-times";

/**
 * Laplace's test of a constant rate. `u`: in standard deviations, above 0 when faults crowd
 * towards the end. `worsening`: the chance of so high a value at a constant rate, by the normal distribution;
 * `exact`: the same by the sum of uniforms, which small samples need.
 * Source: Cox & Lewis, The Statistical Analysis of Series of Events, 1966; NIST/SEMATECH e-Handbook 8.2.3.4.
 */
export type Laplace = { u: number; worsening: number; exact: number };

/** null where nothing carries evidence. */
export function laplace(record: FaultTimes): Laplace | null {
  const { times, end } = informative(record);
  const n = times.length;
  if (n === 0 || end <= 0) return null;
  const sum = times.reduce((total, time) => total + time / end, 0);
  const u = (sum - n / 2) / Math.sqrt(n / 12);
  return { u, worsening: normalAbove(u), exact: sumOfUniformsAtLeast(sum, n) };
}

/** Several records under one question: each at a constant rate of its own. */
export function pooledLaplace(records: readonly FaultTimes[]): number | null {
  let excess = 0;
  let variance = 0;
  for (const { times, end } of records.map(informative)) {
    excess += times.reduce((total, time) => total + time, 0) - (times.length * end) / 2;
    variance += (times.length * end * end) / 12;
  }
  return variance > 0 ? excess / Math.sqrt(variance) : null;
}

/** Laplace's value over the gaps' coefficient of variation: guards against faults that come in clusters (Lewis & Robinson, 1974). */
export function lewisRobinson(record: FaultTimes): number | null {
  const gaps = gapsOf(record.times);
  const u = laplace(record)?.u;
  if (u === undefined || gaps.length < 3) return null;
  const mean = gaps.reduce((sum, gap) => sum + gap, 0) / gaps.length;
  const variance = gaps.reduce((sum, gap) => sum + (gap - mean) ** 2, 0) / (gaps.length - 1);
  return variance > 0 ? (u * mean) / Math.sqrt(variance) : null;
}
