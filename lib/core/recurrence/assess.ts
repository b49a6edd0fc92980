import { faultRecords, type FaultRecord, type WatchedEngine } from "./fault-records";
import { fleetRate } from "./fleet-rate";
import { frequencyOf, type Frequency } from "./frequency";
import type { CaseEntry } from "./spells";
import { trendOf, type Trend } from "./trend";
import { FEWEST_FAULTS, shareOfRecord } from "./watch-levels";

/** Of healthy fleets, at most so many ever hear a false "getting worse", over all engines, causes and years; the same again for "oftener". */
export const FALSE_ALARM_LEVEL = 0.05;

export type Assessment = FaultRecord & { readonly trend: Trend; readonly frequency: Frequency };

/**
 * What the log of a fleet says of each cause on each engine that has had it: how often, against the fleet, and whether it is
 * getting worse. Rules R, T, G and F of SPEC.md.
 *
 * @param entries the fleet's log, in any order
 * @param engines all engines of the fleet, those without a fault too: their quiet hours are the fleet's rate
 */
export function assess(entries: readonly CaseEntry[], engines: readonly WatchedEngine[]): Assessment[] {
  const records = faultRecords(entries, engines);
  const levels = levelsOf(records);
  const spans = new Map(engines.map((engine) => [engine.id, spanOf(engine)]));
  const byCause = new Map<string, FaultRecord[]>();
  for (const record of records) byCause.set(record.cause, [...(byCause.get(record.cause) ?? []), record]);
  // Which record comes under watch first hangs on its rate, so here each gets the same, whoever comes first (rule F3).
  const oftenerLevel = FALSE_ALARM_LEVEL / Math.max(1, engines.length * causesThatCameBack(records));
  return records.map((record) => {
    const sameCause = new Map((byCause.get(record.cause) ?? []).map((one) => [one.engineId, one]));
    const others = engines.flatMap(({ id }) => {
      const span = spans.get(id)?.[record.unit] ?? null;
      if (id === record.engineId || span === null) return [];
      return [{ faults: sameCause.get(id)?.dates.length ?? 0, time: span }];
    });
    return {
      ...record,
      trend: trendOf(record, levels.get(record) ?? 0),
      frequency: frequencyOf(record, fleetRate(others, { faults: record.times.length, time: record.now }), oftenerLevel),
    };
  });
}

const causesThatCameBack = (records: readonly FaultRecord[]): number =>
  new Set(records.filter(({ times, beginsWithFault }) => times.length + Number(beginsWithFault) > 1).map(({ cause }) => cause)).size;

/** The fleet's allowance is shared out in the order in which records came under watch: by the moment of their fourth fault (rule G5). */
function levelsOf(records: readonly FaultRecord[]): Map<FaultRecord, number> {
  const fourth = (record: FaultRecord) => Date.parse(record.dates[FEWEST_FAULTS - 1] ?? "");
  const watched = records
    .filter((record) => record.times.length >= FEWEST_FAULTS)
    .sort((a, b) => fourth(a) - fourth(b) || compare(a.engineId, b.engineId) || compare(a.cause, b.cause));
  return new Map(watched.map((record, i) => [record, FALSE_ALARM_LEVEL * shareOfRecord(i + 1)]));
}

const MS_PER_DAY = 24 * 3600 * 1000;

function spanOf({ since, now, clock }: WatchedEngine): { hours: number | null; days: number } {
  const from = clock.at(since).hours;
  const to = clock.at(now).hours;
  return { hours: from === null || to === null ? null : Math.max(0, to - from), days: (Date.parse(now) - Date.parse(since)) / MS_PER_DAY };
}

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
