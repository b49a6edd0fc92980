import { gapsOf } from "./fault-times";

/**
 * Counts the pairs of gaps of which the later is the longer: the small-sample test that asks nothing of the shape of the gaps.
 * `improving` and `worsening` are exact chances of so many, or so few, with the gaps in any order (Mahonian numbers).
 * Source: NIST/SEMATECH e-Handbook 8.2.3.4 (reverse arrangement test); Kendall 1938.
 */
export type ReverseArrangements = { reversals: number; pairs: number; improving: number; worsening: number };

/** null under two gaps. `times` rise and are counted from the beginning of the record, which begins the first gap. */
export function reverseArrangements(times: readonly number[]): ReverseArrangements | null {
  const gaps = gapsOf(times);
  const n = gaps.length;
  if (n < 2) return null;
  let reversals = 0;
  for (let i = 0; i < n; i++) for (let j = i + 1; j < n; j++) if ((gaps[j] ?? 0) > (gaps[i] ?? 0)) reversals++;
  const shares = sharesOfOrders(n);
  const between = (from: number, to: number) =>
    Math.min(
      1,
      shares.slice(from, to + 1).reduce((sum, share) => sum + share, 0),
    );
  const pairs = (n * (n - 1)) / 2;
  return { reversals, pairs, improving: between(reversals, pairs), worsening: between(0, reversals) };
}

/** Of all orders of n gaps, the share with 0, 1, 2 ... reversals. The i-th gap adds 0 to i - 1 of them, each as likely. */
function sharesOfOrders(n: number): number[] {
  let shares = [1];
  for (let i = 2; i <= n; i++) {
    const next = new Array<number>(shares.length + i - 1).fill(0);
    for (const [at, share] of shares.entries()) for (let more = 0; more < i; more++) next[at + more] = (next[at + more] ?? 0) + share / i;
    shares = next;
  }
  return shares;
}
