import type { HourReading } from "../contract/engine";
import { longestRise } from "./longest-rise";

/** A reading of the meter, as far as the hours hang on it. */
export type MeterReading = Pick<HourReading, "id" | "reading" | "readAt" | "reset">;

export type EngineMeter = {
  hasHourMeter: boolean;
  /** Hours run in a usual year; absent: not known. */
  estimatedHoursPerYear?: number | undefined;
  readings: readonly MeterReading[];
  /** The first moment that the engine's log knows; only an engine without meter and readings counts from it. */
  since?: string | undefined;
};

export type HoursThen = { hours: number | null; estimated: boolean };

export type EngineClock = {
  /** Hours since new at a moment (rules H5 to H7). */
  at: (moment: string) => HoursThen;
  /** The first believed reading; null before it. */
  first: { hours: number; readAt: string } | null;
  /** The last believed reading with its hours since new; null before the first. */
  latest: { id: string; reading: number; hours: number; readAt: string } | null;
  /** Ids of readings that do not fit the others (rule H4). */
  doubtful: readonly string[];
};

const MS_PER_YEAR = 365.25 * 24 * 3600 * 1000;

type Fixed = { id: string; reading: number; hours: number; readAt: string; ms: number };

/** Turns an engine's readings into hours since new: the clock that repeat faults are counted on. Rules H1 to H7 of SPEC.md. */
export function engineClock(meter: EngineMeter): EngineClock {
  const { believed, doubtful } = believedReadings(meter.readings);
  const perMs = (meter.estimatedHoursPerYear ?? 0) / MS_PER_YEAR;
  const mayEstimate = meter.estimatedHoursPerYear !== undefined;
  const first = believed[0];
  const last = believed.at(-1);

  const at = (moment: string): HoursThen => {
    const ms = Date.parse(moment);
    if (!first || !last) {
      if (meter.hasHourMeter || !mayEstimate || meter.since === undefined) return { hours: null, estimated: !meter.hasHourMeter };
      return { hours: Math.max(0, (ms - Date.parse(meter.since)) * perMs), estimated: true };
    }
    const exact = believed.findLast((r) => r.ms === ms);
    if (exact) return { hours: exact.hours, estimated: !meter.hasHourMeter };
    if (ms < first.ms) return { hours: mayEstimate ? Math.max(0, first.hours - (first.ms - ms) * perMs) : null, estimated: true };
    if (ms > last.ms) return { hours: mayEstimate ? last.hours + (ms - last.ms) * perMs : null, estimated: true };
    const next = believed.findIndex((r) => r.ms > ms);
    const before = believed[next - 1] as Fixed;
    const after = believed[next] as Fixed;
    const part = (ms - before.ms) / (after.ms - before.ms);
    return { hours: before.hours + part * (after.hours - before.hours), estimated: true };
  };

  return {
    at,
    first: first ? { hours: first.hours, readAt: first.readAt } : null,
    latest: last ? { id: last.id, reading: last.reading, hours: last.hours, readAt: last.readAt } : null,
    doubtful,
  };
}

function believedReadings(readings: readonly MeterReading[]): { believed: Fixed[]; doubtful: string[] } {
  const ordered = [...readings].sort((a, b) => Date.parse(a.readAt) - Date.parse(b.readAt) || compare(a.id, b.id));
  const stretches: MeterReading[][] = [];
  for (const reading of ordered) {
    if (reading.reset || stretches.length === 0) stretches.push([]);
    stretches.at(-1)?.push(reading);
  }
  const believed: Fixed[] = [];
  const doubtful: string[] = [];
  for (const [index, stretch] of stretches.entries()) {
    const kept = longestRise(stretch, index > 0);
    const isKept = new Set(kept);
    const start = kept[0];
    const sumSoFar = believed.at(-1)?.hours;
    for (const r of stretch) {
      if (!isKept.has(r) || !start) doubtful.push(r.id);
      else {
        const hours = sumSoFar === undefined ? r.reading : sumSoFar + r.reading - start.reading;
        believed.push({ id: r.id, reading: r.reading, hours, readAt: r.readAt, ms: Date.parse(r.readAt) });
      }
    }
  }
  return { believed, doubtful };
}

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
