import { gammaPoissonAtMost, type GammaRate } from "../statistics/gamma-poisson";

/** P(0), P(1), P(2) ... of how many of a part are used; what is cut off at the end is under a millionth. */
export type Demand = readonly number[];

const CUT = 1e-7;
/** Nobody carries more of one part; the rest of the chance stands there. */
const MOST = 400;

/** So many for certain. */
export const certainly = (count: number): Demand => [...new Array<number>(count).fill(0), 1];

/** A fault's own count in so much time, its rate uncertain, each using `each` of the part (rule P3). */
export function faultDemand(rate: GammaRate, time: number, each = 1): Demand {
  const demand: number[] = [];
  let below = 0;
  for (let n = 0; n * each <= MOST && 1 - below > CUT; n++) {
    const atMost = gammaPoissonAtMost(n, rate, time);
    demand[n * each] = Math.max(0, atMost - below);
    below = atMost;
  }
  const last = demand.length - 1;
  return Array.from(demand, (p, i) => (p ?? 0) + (i === last ? 1 - below : 0));
}

/** Two needs for one part that have nothing to do with each other. */
export function together(a: Demand, b: Demand): Demand {
  const length = Math.min(MOST + 1, a.length + b.length - 1);
  const sum = new Array<number>(length).fill(0);
  for (const [i, p] of a.entries()) {
    if (p === 0) continue;
    for (const [j, q] of b.entries()) {
      const at = Math.min(length - 1, i + j);
      sum[at] = (sum[at] ?? 0) + p * q;
    }
  }
  return sum;
}

/** The fewest that are enough with probability `confidence`. */
export function enough(demand: Demand, confidence: number): number {
  let sum = 0;
  for (const [n, p] of demand.entries()) {
    sum += p;
    // A sum of rounded numbers may stop just short of what it is.
    if (sum >= confidence - 1e-12) return n;
  }
  return demand.length - 1;
}

/** The chance that so many are enough. */
export const chanceEnough = (demand: Demand, count: number): number => demand.slice(0, count + 1).reduce((sum, p) => sum + p, 0);

export const meanOf = (demand: Demand): number => demand.reduce((sum, p, n) => sum + n * p, 0);
