/**
 * Shares as whole counts out of 100, by largest remainder: they always add up
 * to 100, and a larger share never has a smaller count. Rule [X1].
 *
 * @param shares sum to 1.
 */
export function ofHundred(shares: readonly number[]): number[] {
  const exact = shares.map((share) => share * 100);
  // A hair of rounding must not cost a whole count.
  const counts = exact.map((one) => Math.floor(one + 1e-9));
  const missing = Math.max(0, 100 - counts.reduce((sum, count) => sum + count, 0));
  const byRemainder = exact
    .map((one, index) => ({ index, rest: one - (counts[index] ?? 0) }))
    .sort((a, b) => b.rest - a.rest || a.index - b.index);
  for (const { index } of byRemainder.slice(0, missing)) counts[index] = (counts[index] ?? 0) + 1;
  return counts;
}
