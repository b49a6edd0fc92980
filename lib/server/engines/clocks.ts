import "server-only";
import { and, asc, eq, inArray, isNull, min } from "drizzle-orm";
import { type engines, hourReadings } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import { engineClock, type EngineClock, type MeterReading } from "@/lib/core/recurrence/engine-clock";
import type { FleetScope } from "@/lib/server/auth/scope";

export type EngineRow = typeof engines.$inferSelect;

/** The clocks of these engines, by id: what turns a moment into hours since new. */
export async function clocksOf(scope: FleetScope, rows: readonly EngineRow[]): Promise<Map<string, EngineClock>> {
  const ids = rows.map((row) => row.id);
  if (ids.length === 0) return new Map();
  const found = await scope.tx
    .select()
    .from(hourReadings)
    .where(and(eq(hourReadings.fleetId, scope.fleetId), inArray(hourReadings.engineId, ids), isNull(hourReadings.takenBackAt)))
    .orderBy(asc(hourReadings.readAt));
  const firsts = await scope.tx
    .select({ engineId: logEntries.engineId, at: min(logEntries.at) })
    .from(logEntries)
    .where(and(eq(logEntries.fleetId, scope.fleetId), inArray(logEntries.engineId, ids), isNull(logEntries.takenBackAt)))
    .groupBy(logEntries.engineId);
  const firstEntry = new Map(firsts.map((first) => [first.engineId, first.at]));
  const readings = new Map<string, MeterReading[]>(ids.map((id) => [id, []]));
  for (const row of found) readings.get(row.engineId)?.push(meterReading(row));
  return new Map(
    rows.map((row) => [
      row.id,
      engineClock({
        hasHourMeter: row.hasHourMeter,
        estimatedHoursPerYear: row.estimatedHoursPerYear ?? undefined,
        readings: readings.get(row.id) ?? [],
        since: earlier(row.createdAt, firstEntry.get(row.id) ?? null).toISOString(),
      }),
    ]),
  );
}

/** A row as the clock reads it. */
export function meterReading(row: typeof hourReadings.$inferSelect): MeterReading {
  return { id: row.id, reading: row.reading, readAt: row.readAt.toISOString(), reset: row.reset };
}

const earlier = (a: Date, b: Date | null) => (b && b < a ? b : a);

/** Hours since new at present: the meter's last reading; without a meter the estimate of today. */
export function hoursNow(engine: Pick<EngineRow, "hasHourMeter">, clock: EngineClock): number | null {
  return engine.hasHourMeter ? (clock.latest?.hours ?? null) : clock.at(new Date().toISOString()).hours;
}
