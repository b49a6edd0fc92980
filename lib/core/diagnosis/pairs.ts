/** How many pairs so many causes make. */
export const pairCount = (causes: number): number => (causes * (causes - 1)) / 2;

/** Where the pairs of cause `a` with those after it begin; pair (a, b), a < b, stands at this plus b. */
export const pairRowStart = (a: number, causes: number): number => a * causes - (a * (a + 3)) / 2 - 1;

/**
 * The place of a pair among all pairs of so many causes: (0,1), (0,2), ... (1,2), ...
 *
 * @param a,b two different causes by index, in any order.
 */
export const pairAt = (a: number, b: number, causes: number): number => (a < b ? pairRowStart(a, causes) + b : pairRowStart(b, causes) + a);

export type Pair = { readonly a: number; readonly b: number; readonly share: number };

/**
 * The pairs with at least this share, likeliest first; ties by place.
 *
 * @param shares one for each pair of the causes, in the order of pairAt().
 */
export function likeliestPairs(shares: Float64Array, causes: number, least: number, most = Infinity): readonly Pair[] {
  const found: Pair[] = [];
  let at = 0;
  for (let a = 0; a < causes; a++)
    for (let b = a + 1; b < causes; b++, at++) {
      const share = shares[at] ?? 0;
      if (share > 0 && share >= least) found.push({ a, b, share });
    }
  found.sort((one, other) => other.share - one.share);
  return found.slice(0, most);
}
