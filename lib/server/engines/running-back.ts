import "server-only";
import { and, eq, isNull, ne } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import type { HourReading } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import { engineClock } from "@/lib/core/recurrence/engine-clock";
import type { FleetScope } from "@/lib/server/auth/scope";
import { meterReading } from "./clocks";

/** A meter that ran back must have been replaced, and that has to be said. @throws Problem 422 */
export async function refuseRunningBack(scope: FleetScope, reading: HourReading, readAt: Date): Promise<void> {
  if (reading.reset) return;
  const rows = await scope.tx
    .select()
    .from(hourReadings)
    .where(
      and(
        eq(hourReadings.fleetId, scope.fleetId),
        eq(hourReadings.engineId, reading.engineId),
        ne(hourReadings.id, reading.id),
        isNull(hourReadings.takenBackAt),
      ),
    );
  // As of that moment: what was read later says nothing about it.
  const earlier = rows.filter((row) => row.readAt <= readAt).map(meterReading);
  const doubtful = new Set(engineClock({ hasHourMeter: true, readings: rows.map(meterReading) }).doubtful);
  const newest = earlier.filter(({ id }) => !doubtful.has(id)).sort((a, b) => Date.parse(b.readAt) - Date.parse(a.readAt))[0];
  if (!newest || newest.reading <= reading.reading) return;
  const says = `The meter showed ${newest.reading} h on ${dayInWords(newest.readAt)} and does not run back. Look again, or say that it was replaced.`;
  throw Problem.invalid([{ path: "reading", says }]);
}

const dayInWords = (moment: string): string =>
  new Date(moment).toLocaleDateString("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: "UTC" });
