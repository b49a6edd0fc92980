type Run = { length: number; end: number };

/**
 * The longest run of readings that never falls; of equal ones the one with the later readings (rule H4). `keepFirst`: the
 * first is part of it, whatever follows. An engine may have many thousand readings: n log n steps.
 */
export function longestRise<R extends { readonly reading: number }>(stretch: readonly R[], keepFirst: boolean): R[] {
  const values = [...new Set(stretch.map(({ reading }) => reading))].sort((a, b) => a - b);
  const rankOf = new Map(values.map((value, i) => [value, i + 1]));
  // A Fenwick tree over the ranks: the best run that ends at or below one.
  const best = new Array<Run | undefined>(values.length + 1);
  const before: (number | null)[] = [];
  const startsFirst: boolean[] = [];
  let whole: Run | undefined;
  for (const [end, { reading }] of stretch.entries()) {
    const rank = rankOf.get(reading) ?? 0;
    let joined: Run | undefined;
    for (let at = rank; at > 0; at -= at & -at) joined = better(joined, best[at]);
    const run = { length: (joined?.length ?? 0) + 1, end };
    before.push(joined?.end ?? null);
    startsFirst.push(joined ? startsFirst[joined.end] === true : end === 0);
    for (let at = rank; at < best.length; at += at & -at) best[at] = better(best[at], run);
    if (!keepFirst || startsFirst[end]) whole = better(whole, run);
  }
  const kept: R[] = [];
  for (let at: number | null = whole?.end ?? null; at !== null; at = before[at] ?? null) kept.push(stretch[at] as R);
  return kept.reverse();
}

const better = (a: Run | undefined, b: Run | undefined): Run | undefined =>
  a && (!b || a.length > b.length || (a.length === b.length && a.end > b.end)) ? a : b;
