import { callingMinutes } from "../../lib/core/diagnosis/calling-minutes";
import type { Model } from "../../lib/core/diagnosis/model";

/**
 * The least expected minutes to a cured engine, exactly: dynamic programming
 * over what has been answered and which remedies have failed, for small models
 * whose steps cost the same whatever was done before. Bellman's equation with
 * single faults: call; or ask; or try, where a cure ends it.
 */
export function leastMinutes(model: Model): number {
  const size = model.logPrior.length;
  const memo = new Map<string, number>();
  const value = (weights: Float64Array, answers: readonly number[], tried: number): number => {
    const key = `${answers.join()}|${tried}`;
    const before = memo.get(key);
    if (before !== undefined) return before;
    let total = 0;
    for (const weight of weights) total += weight;
    let best = callingMinutes(
      model,
      weights.map((weight) => weight / total),
    );
    model.checks.forEach((check, at) => {
      if (answers[at] !== -1 || check.minutes >= best) return;
      let cost = check.minutes;
      check.rows.forEach((row, finding) => {
        const then = new Float64Array(size);
        let chance = 0;
        for (let index = 0; index < size; index++) chance += then[index] = weights[index]! * row[index]!;
        if (chance > 0 && cost < best) cost += (chance / total) * value(then, answers.with(at, finding), tried);
      });
      best = Math.min(best, cost);
    });
    model.remedies.forEach((remedy, at) => {
      if (tried & (1 << at) || remedy.minutes >= best) return;
      const then = new Float64Array(size);
      let left = 0;
      for (let index = 0; index < size; index++) left += then[index] = weights[index]! * (1 - remedy.cure[index]!);
      best = Math.min(best, remedy.minutes + (left / total) * value(then, answers, tried | (1 << at)));
    });
    memo.set(key, best);
    return best;
  };
  return value(
    model.logPrior.map(Math.exp),
    model.checks.map(() => -1),
    0,
  );
}
