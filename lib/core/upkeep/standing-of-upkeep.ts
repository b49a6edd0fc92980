import type { UpkeepDone, UpkeepItem } from "./upkeep-item";

const MS_PER_MONTH = (365.25 / 12) * 24 * 3600 * 1000;
/** From this share of its interval on, an item is soon due. */
const SOON = 0.85;
/** And from this on overdue: a fifth over is no longer a matter of finding the day. */
const OVER = 1.2;

/** The engine at the moment of asking. `since`: from when the fleet's log knows it. */
export type EngineNow = { readonly now: string; readonly hours: number | null; readonly since: string; readonly sinceHours: number | null };

/**
 * "not-known": never logged, and the engine not watched for as long as the interval. Months are months of 30.4 days. `used`: share of the interval gone, by
 * whichever is further; 1 is due. `hoursLeft` and `monthsLeft` go below 0; null where that clock does not count.
 */
export type UpkeepStanding = {
  readonly state: "not-known" | "good" | "soon" | "due" | "overdue";
  readonly used: number;
  readonly by: "hours" | "months";
  readonly hoursLeft: number | null;
  readonly monthsLeft: number | null;
  readonly last: UpkeepDone | null;
};

/** Where an item stands: by hours or months since it was last done, whichever is further gone (rules U2 to U5). */
export function standingOfUpkeep(item: UpkeepItem, done: readonly UpkeepDone[], engine: EngineNow): UpkeepStanding {
  const last =
    [...done]
      .filter((one) => one.item === item.key)
      .sort((a, b) => Date.parse(a.at) - Date.parse(b.at))
      .at(-1) ?? null;
  const from = last ?? { at: engine.since, hours: engine.sinceHours };
  // A new engine's first service comes early: it is new where its log begins near nothing.
  const isNew = last === null && engine.sinceHours !== null && engine.sinceHours < (item.firstHours ?? 0);
  const everyHours = isNew ? item.firstHours : item.everyHours;
  const ranHours = isNew ? engine.hours : engine.hours === null || from.hours === null ? null : engine.hours - from.hours;
  const ranMonths = (Date.parse(engine.now) - Date.parse(from.at)) / MS_PER_MONTH;
  const hoursLeft = everyHours === null || ranHours === null ? null : everyHours - ranHours;
  const monthsLeft = item.everyMonths === null ? null : item.everyMonths - ranMonths;
  const byHours = everyHours === null || ranHours === null ? 0 : ranHours / everyHours;
  const byMonths = item.everyMonths === null ? 0 : ranMonths / item.everyMonths;
  const used = Math.max(byHours, byMonths, 0);
  const known = last !== null || isNew;
  return {
    state: stateOf(used, known),
    used,
    by: byHours >= byMonths && byHours > 0 ? "hours" : hoursLeft !== null && monthsLeft === null ? "hours" : "months",
    hoursLeft,
    monthsLeft,
    last,
  };
}

/** Without a record it is not known to be good; once the engine has been watched for the whole interval it is due all the same. */
function stateOf(used: number, known: boolean): UpkeepStanding["state"] {
  if (used > OVER) return "overdue";
  if (used >= 1) return "due";
  if (!known) return "not-known";
  return used >= SOON ? "soon" : "good";
}
