import type { Multiplier } from "../contract/event";
import { standingOfUpkeep, type EngineNow } from "./standing-of-upkeep";
import type { UpkeepDone, UpkeepItem } from "./upkeep-item";

/** No log moves a cause further than this, either way. */
const MOST = 5;
/** Just renewed, a part is so much less likely to be the fault; the bonus is gone at half its interval. */
const FRESH = 0.5;
/** What the work itself may bring shows within so many hours. */
const SETTLING_HOURS = 10;
const BROUGHT_IN = 3;

/**
 * By how much the upkeep done and not done moves the odds of causes before the first question (rules O1 to O3).
 *
 * @returns one multiplier a cause, never 1, with its reason in words; to be joined with those of the log (joinMultipliers)
 */
export function upkeepMultipliers(items: readonly UpkeepItem[], done: readonly UpkeepDone[], engine: EngineNow): Multiplier[] {
  return joinMultipliers(items.flatMap((item) => multipliersOf(item, done, engine)));
}

function multipliersOf(item: UpkeepItem, done: readonly UpkeepDone[], engine: EngineNow): Multiplier[] {
  const { used, last, by } = standingOfUpkeep(item, done, engine);
  const found: Multiplier[] = [];
  const guarded = (times: number, reason: string) => {
    for (const cause of item.guards) found.push({ cause, times, reason });
  };
  if (last && used < 0.5) guarded(FRESH + used, `${item.title}: done ${ago(last, engine)}.`);
  // A part at twice its interval fails about twice as often as one in its time.
  else if (used > 1)
    guarded(
      Math.min(3, used),
      last ? `${item.title}: overdue by ${by}, last done ${ago(last, engine)}.` : `${item.title}: no record of it since the log began.`,
    );
  const ran = last && last.hours !== null && engine.hours !== null ? engine.hours - last.hours : null;
  if (ran !== null && ran <= SETTLING_HOURS)
    for (const cause of item.mayBring) found.push({ cause, times: BROUGHT_IN, reason: `${item.title} was done ${Math.round(ran)} h ago.` });
  return found;
}

function ago(last: UpkeepDone, engine: EngineNow): string {
  if (last.hours !== null && engine.hours !== null) return `${Math.round(engine.hours - last.hours)} h ago`;
  return `on ${last.at.slice(0, 10)}`;
}

/** Several reasons about one cause multiply, within a factor of 5 either way (rule O3). */
export function joinMultipliers(multipliers: readonly Multiplier[]): Multiplier[] {
  const byCause = new Map<string, Multiplier>();
  for (const one of multipliers) {
    const before = byCause.get(one.cause);
    if (!before) byCause.set(one.cause, one);
    else
      byCause.set(one.cause, { cause: one.cause, times: before.times * one.times, reason: `${before.reason} ${one.reason}`.slice(0, 200) });
  }
  return [...byCause.values()]
    .map((one) => ({ ...one, times: Math.min(MOST, Math.max(1 / MOST, one.times)) }))
    .filter(({ times }) => times !== 1);
}
