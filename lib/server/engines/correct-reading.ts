import "server-only";
import { and, eq } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { diagnosisEvents } from "@/db/schema/diagnoses";
import { logEntries } from "@/db/schema/log-entries";
import type { Reading, ReadingChange } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { putAside } from "@/lib/server/log/corrections";
import { notAhead } from "@/lib/server/web/not-ahead";
import { getReading } from "./readings";
import { refuseRunningBack } from "./running-back";

/**
 * Writes a reading of the meter as it should have been. What it said is put aside, readable; the engine's hours go by
 * the new figure from now on.
 *
 * @throws Problem 412 when somebody corrected it since `version`; 409 when it was taken back or is part of a line of the log
 */
export async function correctReading(
  scope: FleetScope<"engine:write">,
  engineId: string,
  id: string,
  change: ReadingChange,
  version: number,
): Promise<Reading> {
  const readAt = notAhead("readAt", change.readAt);
  await setAside(scope, engineId, id, version, false);
  await refuseRunningBack(scope, { ...change, id, engineId }, readAt);
  await scope.tx
    .update(hourReadings)
    .set({ reading: change.reading, readAt, reset: change.reset, version: version + 1 })
    .where(itself(scope, id));
  return getReading(scope, engineId, id);
}

/** Takes a reading out of the count that was written down by mistake; it stays readable. */
export async function takeBackReading(scope: FleetScope<"engine:write">, engineId: string, id: string, version: number): Promise<void> {
  await setAside(scope, engineId, id, version, true);
  await scope.tx
    .update(hourReadings)
    .set({ takenBackAt: new Date(), version: version + 1 })
    .where(itself(scope, id));
}

async function setAside(scope: FleetScope<"engine:write">, engineId: string, id: string, version: number, takenBack: boolean) {
  const [row] = await scope.tx
    .select()
    .from(hourReadings)
    .where(and(itself(scope, id), eq(hourReadings.engineId, engineId)))
    .for("update"); // of two corrections at once the second is stale
  if (!row) throw Problem.notFound();
  await refusePart(scope, id);
  if (row.version !== version) throw Problem.stale(await getReading(scope, engineId, id));
  if (row.takenBackAt) throw Problem.conflict("This reading has been taken back. Write it down again if it was right after all.");
  const was: ReadingChange = { reading: row.reading, readAt: row.readAt.toISOString(), reset: row.reset };
  await putAside(scope, { kind: "reading", subjectId: id, version, was, takenBack });
}

/** A reading that came with a line of the log is corrected there, or the two would say different things. */
async function refusePart(scope: FleetScope, id: string): Promise<void> {
  const [line] = await scope.tx
    .select({ id: logEntries.id })
    .from(logEntries)
    .where(and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, id)));
  if (line) throw Problem.conflict("This reading was written down with a repair. Correct the repair.");
  const [event] = await scope.tx
    .select({ id: diagnosisEvents.id })
    .from(diagnosisEvents)
    .where(and(eq(diagnosisEvents.fleetId, scope.fleetId), eq(diagnosisEvents.id, id)));
  if (event) throw Problem.conflict("This reading was written down with the outcome of a diagnosis. Change the outcome there.");
}

const itself = (scope: FleetScope, id: string) => and(eq(hourReadings.fleetId, scope.fleetId), eq(hourReadings.id, id));
