/** Nothing is said of a trend before so many faults (rule G1). */
export const FEWEST_FAULTS = 4;
/** After so many nothing is looked at anew. */
const LAST_LOOK = 300;

/** The share of a record's allowance that is spent by the n-th fault (rule G4): seven sixteenths at the fourth, three quarters by the sixth, all never. */
export const spentBy = (faults: number): number => (faults < FEWEST_FAULTS ? 0 : 1 - ((FEWEST_FAULTS - 1) / faults) ** 2);

/** The share spent at the n-th look alone. */
export const spentAt = (faults: number): number => spentBy(faults) - spentBy(faults - 1);

/** The share of the fleet's allowance that its k-th record under watch gets, k from 1; all of them together never more than 1 (rule G5). */
export const shareOfRecord = (k: number): number => 1 / (k * (k + 1));

/**
 * The wear that `faults` faults show without any need of a rate: sum of i ln(t[i+1] / t[i]), small when the gaps shorten. At a
 * constant rate each term is exponential with mean 1 and independent of the others: the sum is half of the MIL-HDBK-189 value of the record that ends
 * at that fault. Gaps under `least` count as so much: a meter read to the hour would prove too much (rule G3).
 *
 * @returns the sum after the 2nd, 3rd ... fault
 */
export function wearSums(times: readonly number[], least: number): number[] {
  const sums: number[] = [];
  let sum = 0;
  for (let i = 1; i < times.length; i++) {
    const before = Math.max(times[i - 1] ?? 0, least);
    sum += i * Math.log(Math.max(times[i] ?? 0, before + least) / before);
    sums.push(sum);
  }
  return sums;
}

/**
 * The sums at or below which a record is getting worse, by the number of faults: chosen so that a constant rate falls to
 * one of them at the n-th fault for the first time with just the chance that is spent there. Exact: the sums of exponentials are the moments of a Poisson
 * stream, so "no sum so far too small" is a count that stays behind, and is followed fault by fault (rule G4).
 *
 * @param level what the whole life of the record may spend
 * @returns index n: the bound at the n-th fault; before the fourth -Infinity
 */
export function wearBounds(level: number, faults: number): number[] {
  const bounds = new Array<number>(FEWEST_FAULTS).fill(-Infinity);
  // Chances that so many of the stream have come by the last bound and none too early.
  let standing = [1];
  let last = 0;
  for (let n = FEWEST_FAULTS; n <= Math.min(faults, LAST_LOOK); n++) {
    const terms = n - 1;
    const spend = level * spentAt(n);
    const sums = runningSums(standing);
    const all = sums.at(-1) ?? 0;
    const from = last;
    const crossed = (bound: number) => all - staysBehind(sums, bound - from, terms);
    let low = last;
    let high = terms;
    for (let turn = 0; turn < 60 && high - low > 1e-12 * high; turn++) {
      const middle = (low + high) / 2;
      if (crossed(middle) > spend) high = middle;
      else low = middle;
    }
    standing = carried(standing, low - last, terms);
    last = low;
    bounds.push(low);
  }
  return bounds;
}

/** The chance that so much more of the stream leaves the count under `terms`; `sums`: the chances of at most so many by now. */
function staysBehind(sums: readonly number[], more: number, terms: number): number {
  let chance = 0;
  let term = Math.exp(-more);
  for (let k = 0; k < terms; k++) {
    chance += term * (sums[Math.min(terms - 1 - k, sums.length - 1)] ?? 0);
    term *= more / (k + 1);
  }
  return chance;
}

function runningSums(values: readonly number[]): number[] {
  let sum = 0;
  return values.map((value) => (sum += value));
}

/** The counts after so much more of the stream, those under `terms`. */
function carried(standing: readonly number[], more: number, terms: number): number[] {
  const next = new Array<number>(terms).fill(0);
  for (const [j, p] of standing.entries()) {
    let term = Math.exp(-more);
    for (let k = 0; j + k < terms; k++) {
      next[j + k] = (next[j + k] ?? 0) + p * term;
      term *= more / (k + 1);
    }
  }
  return next;
}
