import type { EngineClock } from "./engine-clock";
import { historiesOf, isProved, type CaseEntry, type CauseHistory } from "./spells";

/** An engine as it is watched: from when its log knows it, until now. */
export type WatchedEngine = { readonly id: string; readonly since: string; readonly now: string; readonly clock: Pick<EngineClock, "at"> };

/** One cause on one engine, over all the time it was watched (rules R1 to R4). */
export type FaultRecord = {
  readonly engineId: string;
  readonly cause: string;
  readonly title: string;
  readonly unit: "hours" | "days";
  /** Some of the hours are estimated. */
  readonly estimated: boolean;
  /** From the beginning of the record to where each spell began, and to now. */
  readonly times: readonly number[];
  readonly now: number;
  /** Moments of the spells counted in `times`. */
  readonly dates: readonly string[];
  /** The record begins with the fault itself, which is then not counted. */
  readonly beginsWithFault: boolean;
  /** Cures between the spells that nobody proved. */
  readonly unproved: number;
};

const MS_PER_DAY = 24 * 3600 * 1000;
/** What a meter tells apart, in hours; in days, a morning. */
export const LEAST = { hours: 1, days: 0.5 } as const;

/** The records of a fleet: of every cause that has appeared on any engine, one for each engine it has appeared on. */
export function faultRecords(entries: readonly CaseEntry[], engines: readonly WatchedEngine[]): FaultRecord[] {
  const byId = new Map(engines.map((engine) => [engine.id, engine]));
  return historiesOf(entries).flatMap((history) => {
    const engine = byId.get(history.engineId);
    return engine ? [recordOf(history, engine)] : [];
  });
}

function recordOf({ engineId, cause, spells }: CauseHistory, engine: WatchedEngine): FaultRecord {
  const firsts = spells.map((spell) => spell.entries[0]);
  const hoursOf = (entry: CaseEntry) => entry.engineHours;
  const from = engine.clock.at(engine.since);
  const to = engine.clock.at(engine.now);
  const known = from.hours !== null && to.hours !== null && firsts.every((entry) => hoursOf(entry) !== null);
  const unit = known ? "hours" : "days";
  const start = known ? (from.hours ?? 0) : Date.parse(engine.since) / MS_PER_DAY;
  const at = (entry: CaseEntry) => Math.max(0, (known ? (hoursOf(entry) ?? 0) : Date.parse(entry.at) / MS_PER_DAY) - start);
  const all = firsts.map((entry) => ({ time: at(entry), date: entry.at })).sort((a, b) => a.time - b.time);
  const beginsWithFault = (all[0]?.time ?? 0) < LEAST[unit];
  const base = beginsWithFault ? (all[0]?.time ?? 0) : 0;
  const counted = beginsWithFault ? all.slice(1) : all;
  const times = counted.map(({ time }) => time - base);
  const end = (known ? (to.hours ?? 0) : Date.parse(engine.now) / MS_PER_DAY) - start - base;
  const last = spells.flatMap((spell) => spell.entries);
  return {
    engineId,
    cause,
    title: (last.findLast((entry) => entry.cause?.key) ?? last.at(-1))?.cause?.title ?? cause,
    unit,
    estimated: known && (from.estimated || to.estimated || firsts.some((entry) => entry.hoursAreEstimated)),
    times,
    now: Math.max(end, times.at(-1) ?? 0),
    dates: counted.map(({ date }) => date),
    beginsWithFault,
    unproved: spells.slice(0, -1).filter((spell) => spell.cure && !isProved(spell.cure)).length,
  };
}
