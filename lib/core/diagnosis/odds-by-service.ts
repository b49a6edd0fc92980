import type { LogEntry } from "../contract/log";
import type { FaultTree, Remedy, Upkeep } from "../tree/schema";

/** Why a cause weighs more or less on this engine, before it is held to what a log may move. */
export type Moved = { readonly times: number; readonly reason: string };

/** How things stand now: the moment, and the engine's hours since new where they are known. */
export type EngineNow = { readonly at: string; readonly hours: number | null };

const MS_PER_MONTH = (365.25 * 24 * 3600 * 1000) / 12;

/**
 * By how much the time since the last service that guards a cause moves its
 * odds: 2 x age / interval. What wears out fails at a rate that grows with its
 * age (Weibull, shape 2); over an interval that mean is 1. No service in the
 * log: nothing is known, nothing is moved. Rule [B6].
 *
 * @param log the engine's own entries, in any order.
 * @returns by cause.
 */
export function movedByService(tree: FaultTree, log: readonly LogEntry[], now: EngineNow): ReadonlyMap<string, Moved> {
  return new Map(
    tree.remedies.flatMap((remedy) => {
      if (!remedy.upkeep) return [];
      const ages = log.flatMap((entry) => (wasDone(entry, remedy) ? [ageOf(entry, remedy.upkeep!, now)] : []));
      const youngest = ages.filter((age) => age !== null).sort((a, b) => a.intervals - b.intervals)[0];
      if (!youngest) return [];
      const moved = {
        times: 2 * youngest.intervals,
        reason: `\u201c${remedy.title}\u201d was last done ${youngest.says} ago, and is due every ${dueSaid(remedy.upkeep)}.`,
      };
      return remedy.upkeep.guards.map((cause): [string, Moved] => [cause, moved]);
    }),
  );
}

const wasDone = (entry: LogEntry, remedy: Remedy): boolean =>
  entry.remedy?.key === remedy.key && (entry.outcome === "cured" || entry.outcome === "held");

/** By hours or by months, whichever is further on. */
function ageOf(entry: LogEntry, upkeep: Upkeep, now: EngineNow): { intervals: number; says: string } | null {
  const months = Math.max(0, (Date.parse(now.at) - Date.parse(entry.at)) / MS_PER_MONTH);
  const hours = now.hours === null || entry.engineHours === null ? null : Math.max(0, now.hours - entry.engineHours);
  const byHours = upkeep.everyHours === undefined || hours === null ? null : hours / upkeep.everyHours;
  const byMonths = upkeep.everyMonths === undefined ? null : months / upkeep.everyMonths;
  if (byHours === null && byMonths === null) return null;
  const hoursLead = byHours !== null && byHours >= (byMonths ?? 0);
  return {
    intervals: Math.max(byHours ?? 0, byMonths ?? 0),
    says: hoursLead ? `${Math.round(hours ?? 0)} h` : monthsSaid(months),
  };
}

const monthsSaid = (months: number): string =>
  months < 1.5 ? `${Math.round((months * MS_PER_MONTH) / (24 * 3600 * 1000))} days` : `${Math.round(months)} months`;

const dueSaid = ({ everyHours, everyMonths }: Upkeep): string =>
  [everyHours === undefined ? [] : [`${everyHours} h`], everyMonths === undefined ? [] : [`${everyMonths} months`]].flat().join(" or ");
