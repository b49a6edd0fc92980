import { standingOfUpkeep, type EngineNow } from "./standing-of-upkeep";
import type { UpkeepDone, UpkeepItem } from "./upkeep-item";

/** How often an item falls due on a passage: once now if it is due already, then each time an interval of hours or months is gone (rule P2). */
export function renewalsOnPassage(
  item: UpkeepItem,
  done: readonly UpkeepDone[],
  engine: EngineNow,
  passage: { hours: number; months: number },
): number {
  const { used, state } = standingOfUpkeep(item, done, engine);
  const perHour = item.everyHours === null ? 0 : passage.hours / item.everyHours;
  const perMonth = item.everyMonths === null ? 0 : passage.months / item.everyMonths;
  const through = Math.max(perHour, perMonth);
  // Without a record half its life is taken as gone: as likely more as less.
  const gone = state === "not-known" ? 0.5 : Math.min(used, 1);
  return Math.floor(gone + through + 1e-9);
}
