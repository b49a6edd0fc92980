import { gammaBelow } from "../statistics/gamma";
import { logGamma } from "../statistics/log-gamma";
import type { FaultTimes } from "./fault-times";
import { powerLaw } from "./power-law";

/**
 * Exact two-sided limits of the hours between faults at the end of the record, under power-law growth; Infinity where nothing bounds them.
 * Source: Crow 1975 and MIL-HDBK-189, 1981, whose printed coefficients these reproduce.
 */
export function mtbfNowLimits(record: FaultTimes, confidence: number): [number, number] | null {
  const fit = powerLaw(record);
  if (!fit) return null;
  const [low, high] = growthCoefficients(record.times.length, record.ended, confidence);
  return [low * fit.mtbfNow, high * fit.mtbfNow];
}

/** What the likeliest hours between faults are multiplied with. */
export function growthCoefficients(n: number, ended: FaultTimes["ended"], confidence: number): [number, number] {
  const tail = (1 - confidence) / 2;
  if (ended === "failure") {
    const below = (q: number) => productBelow(q, n);
    return [(4 * n * n) / rootOf((q) => below(q) - (1 - tail), n), (4 * n * n) / rootOf((q) => below(q) - tail, n)];
  }
  const zUpper = rootOf((z) => tail - besselShare(n, z), n);
  if (n < 2) return [(4 * n * n) / zUpper ** 2, Infinity];
  const zLower = rootOf((z) => 1 - tail - besselShare(n - 1, z), n);
  return [(4 * n * n) / zUpper ** 2, (4 * n * n) / zLower ** 2];
}

/** The first n terms of the series of the Bessel function I1 at z, as a share of all: P(count <= n given the sum of logarithms). Falls as z grows. */
function besselShare(n: number, z: number): number {
  const square = (z / 2) ** 2;
  // From the largest term, near z/2, both ways: measured against it nothing overflows.
  const peak = Math.max(1, Math.round(z / 2));
  let first = 0;
  let all = 0;
  const add = (j: number, term: number) => {
    all += term;
    if (j <= n) first += term;
  };
  for (let j = peak, term = 1; term > 1e-18; j++, term *= square / (j * (j - 1))) add(j, term);
  for (let j = peak - 1, term = (peak * (peak - 1)) / square; j >= 1; term *= (j * (j - 1)) / square, j--) add(j, term);
  return first / all;
}

/** P(X Y <= q) of two chi-squares on 2n - 2 and 2n degrees: a sum over the logarithm of Y, whose smooth ends make it exact to many figures. */
function productBelow(q: number, n: number): number {
  const steps = 160;
  const spread = 14 / Math.sqrt(n) + 6;
  const step = (2 * spread) / steps;
  let sum = 0;
  for (let i = 0; i <= steps; i++) {
    const log = Math.log(n) - spread + i * step;
    const y = Math.exp(log);
    sum += Math.exp(n * log - y - logGamma(n)) * gammaBelow(q / (4 * y), n - 1);
  }
  return sum * step;
}

/** Where a rising function of a number above 0 crosses nothing: false position on the logarithm, the idle end halved (Illinois). */
function rootOf(rising: (x: number) => number, scale: number): number {
  let low = Math.log(1e-6);
  let high = Math.log(Math.max(1, scale));
  while (rising(Math.exp(high)) < 0) high += 1;
  let below = rising(Math.exp(low));
  let above = rising(Math.exp(high));
  for (let turn = 0; turn < 200 && high - low > 1e-14; turn++) {
    const at = turn % 3 === 2 ? (low + high) / 2 : (low * above - high * below) / (above - below);
    const value = rising(Math.exp(at));
    if (Math.abs(value) < 1e-15) return Math.exp(at);
    if (value < 0) {
      low = at;
      below = value;
      if (turn % 3 !== 2) above /= 2;
    } else {
      high = at;
      above = value;
      if (turn % 3 !== 2) below /= 2;
    }
  }
  return Math.exp((low + high) / 2);
}

/**
 * The e-Handbook's shorter form of the same limits, by the normal distribution, for a record that is time-ended.
 * `z`: the normal quantile at 1 - tail; `mtbf`: with the unbiased beta. Source: NIST/SEMATECH e-Handbook 8.4.5.2.
 */
export function approximateMtbfNowLimits(r: number, mtbf: number, z: number): [number, number] {
  const low = (mtbf * r * (r - 1)) / (r + z ** 2 / 4 + Math.sqrt((r * z ** 2) / 2 + z ** 4 / 16)) ** 2;
  const high = (mtbf * r * (r - 1)) / (r - z * Math.sqrt(r / 2)) ** 2;
  return [low, high];
}
