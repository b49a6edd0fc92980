import { alike, pairTable, type PairTable } from "./pair-table";

/** How often an engine with both causes shows a symptom: unless neither does. Rule [S4]. */
export const shownByEither = (a: number, b: number): number => 1 - (1 - a) * (1 - b);

/** Kept as long as the row of shares is. */
const kept = new WeakMap<Float64Array, PairTable>();

/**
 * ln of what a reported symptom weighs for every pair.
 *
 * @param shares how often each cause shows it, and a place for the unknown.
 */
export function symptomTable(shares: Float64Array): PairTable {
  const ready = kept.get(shares);
  if (ready) return ready;
  const table = pairTable(alike(shares, shares.length - 1), (a, b) => Math.log(shownByEither(shares[a]!, shares[b]!)));
  kept.set(shares, table);
  return table;
}
