/** A test that never errs: which of its answers each state gives, and what asking costs. */
export type SureTest = { readonly answers: readonly number[]; readonly cost: number };

/**
 * The least expected cost of knowing which state it is, by dynamic programming
 * over sets of states that are still possible: V(A) = min over tests of cost +
 * sum of P(A_answer) / P(A) V(A_answer), and nothing for a single state.
 *
 * @returns the cost times the sum of the weights.
 */
export function leastTests(weights: readonly number[], tests: readonly SureTest[]): number {
  const memo = new Map<number, number>();
  const masks = tests.map(({ answers, cost }) => ({
    cost,
    parts: [...new Set(answers)].map((answer) => answers.reduce((mask, one, state) => (one === answer ? mask | (1 << state) : mask), 0)),
  }));
  const weightOf = (set: number): number => weights.reduce((sum, weight, state) => (set & (1 << state) ? sum + weight : sum), 0);
  const value = (set: number): number => {
    if ((set & (set - 1)) === 0) return 0;
    const before = memo.get(set);
    if (before !== undefined) return before;
    const own = weightOf(set);
    let best = Infinity;
    for (const { cost, parts } of masks) {
      let sum = cost * own;
      let split = true;
      for (let place = 0; place < parts.length && split && sum < best; place++) {
        const part = parts[place]! & set;
        split = part !== set;
        if (part !== 0 && split) sum += value(part);
      }
      if (split && sum < best) best = sum;
    }
    memo.set(set, best);
    return best;
  };
  return value(2 ** weights.length - 1);
}
