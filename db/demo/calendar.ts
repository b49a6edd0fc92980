import type { DemoEngine } from "./story";

const DAY_MS = 24 * 3600 * 1000;

/** So many days before today, at an hour of the day (UTC). */
export const daysBefore = (today: Date, days: number, hour = 9): Date => {
  const midnight = Date.UTC(today.getUTCFullYear(), today.getUTCMonth(), today.getUTCDate());
  return new Date(midnight - Math.round(days) * DAY_MS + hour * 3600 * 1000);
};

/** The day on which an engine had run so many hours, on the line between its readings, after lunch; for one without a meter `at` is days before today already. */
export function whenAt(engine: DemoEngine, at: number, today: Date): Date {
  const after = engine.meter.findIndex(([, hours]) => hours >= at);
  const [before, next] = [engine.meter[after - 1], engine.meter[after]];
  if (engine.hoursPerYear !== undefined || !before || !next) return daysBefore(today, at, 14);
  const part = (at - before[1]) / (next[1] - before[1]);
  return daysBefore(today, Math.ceil(before[0] + part * (next[0] - before[0])), 13);
}
