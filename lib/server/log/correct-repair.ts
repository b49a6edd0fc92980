import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { Repair, RepairChange, RepairThen } from "@/lib/core/contract/log";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { contentOf, writeReading } from "./commands";
import { putAside } from "./corrections";
import { getRepair, repairThen } from "./repairs";

/**
 * Writes a repair as it should have been. What it said is put aside, readable; hours, recurrence and odds go by the new
 * words from now on.
 *
 * @throws Problem 412 when somebody corrected it since `version`; 409 when it has been taken back
 */
export async function correctRepair(
  scope: FleetScope<"log:write">,
  engineId: string,
  id: string,
  change: RepairChange,
  version: number,
): Promise<Repair> {
  const content = await contentOf(scope, change);
  await setAside(scope, engineId, id, version, false);
  await scope.tx
    .update(logEntries)
    .set({ ...content, version: version + 1 })
    .where(itself(scope, id));
  await forgetReading(scope, id);
  await writeReading(scope, id, engineId, change);
  return getRepair(scope, engineId, id);
}

/** Takes a repair off the log that was written in by mistake; it stays readable, and counts for nothing. */
export async function takeBackRepair(scope: FleetScope<"log:write">, engineId: string, id: string, version: number): Promise<void> {
  await setAside(scope, engineId, id, version, true);
  await scope.tx
    .update(logEntries)
    .set({ takenBackAt: new Date(), version: version + 1 })
    .where(itself(scope, id));
  await forgetReading(scope, id);
}

async function setAside(scope: FleetScope<"log:write">, engineId: string, id: string, version: number, takenBack: boolean): Promise<void> {
  const [row] = await scope.tx
    .select()
    .from(logEntries)
    .where(and(itself(scope, id), eq(logEntries.engineId, engineId)))
    .for("update"); // of two corrections at once the second is stale
  if (!row) throw Problem.notFound();
  if (row.version !== version) throw Problem.stale(await getRepair(scope, engineId, id));
  if (row.takenBackAt) throw Problem.conflict("This repair has been taken back. Log it again if it was done after all.");
  const was: RepairThen = await repairThen(scope, row);
  await putAside(scope, { kind: "repair", subjectId: id, version, was, takenBack });
}

/** The reading that came with it: what it showed stands in what was put aside. */
const forgetReading = (scope: FleetScope<"log:write">, id: string) =>
  scope.tx.delete(hourReadings).where(and(eq(hourReadings.fleetId, scope.fleetId), eq(hourReadings.id, id)));

const itself = (scope: FleetScope, id: string) =>
  and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, id), isNull(logEntries.diagnosisId));
