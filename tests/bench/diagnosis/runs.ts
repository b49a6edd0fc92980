/** What was played, a number a run and way; runs of one group share a model. */
export type Runs = {
  readonly group: number[];
  readonly minutes: Record<string, number[]>;
  readonly called: Record<string, number[]>;
};

export const noRuns = (): Runs => ({ group: [], minutes: {}, called: {} });

/** Puts the runs of one task after those of others. */
export function addRuns(to: Runs, from: Runs): void {
  to.group.push(...from.group);
  for (const part of ["minutes", "called"] as const)
    for (const [name, values] of Object.entries(from[part])) (to[part][name] ??= []).push(...values);
}

export const mean = (values: readonly number[]): number => values.reduce((sum, one) => sum + one, 0) / values.length;

/** Half the width of a 95 % interval, in standard errors. */
const NORMAL_95 = 1.96;

/**
 * Mean of one way to the mean of another on the same luck, and its upper 95 %
 * bound: the delta method, with runs on one model taken together.
 */
export function ratioOf(runs: Runs, name: string, other: string): { ratio: number; upper: number } {
  const [a, b] = [runs.minutes[name]!, runs.minutes[other]!];
  const ratio = mean(a) / mean(b);
  const sums = new Map<number, number>();
  runs.group.forEach((group, run) => sums.set(group, (sums.get(group) ?? 0) + a[run]! - ratio * b[run]!));
  const spread = Math.sqrt([...sums.values()].reduce((sum, one) => sum + one * one, 0)) / a.length;
  return { ratio, upper: ratio + (NORMAL_95 * spread) / mean(b) };
}

/** The cheapest of several ways, by mean. */
export function bestOf(runs: Runs, names: readonly string[]): string {
  return names.reduce((best, name) => (mean(runs.minutes[name]!) < mean(runs.minutes[best]!) ? name : best));
}
