import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { Repair, RepairThen } from "@/lib/core/contract/log";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { readCorrections } from "./corrections";
import { causeOf, linesOf, selectLines } from "./lines";

/** A repair that was logged without a diagnosis, with all that was ever written of it; one that was taken back too. */
export async function getRepair(scope: FleetScope, engineId: string, id: string): Promise<Repair> {
  const rows = await selectLines(scope).where(
    and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, id), eq(logEntries.engineId, engineId), isNull(logEntries.diagnosisId)),
  );
  const [row] = rows;
  const [entry] = await linesOf(scope, rows);
  if (!row || !entry) throw Problem.notFound();
  return {
    entry,
    ...(await meterOf(scope, id)),
    version: row.entry.version,
    takenBackAt: row.entry.takenBackAt?.toISOString() ?? null,
    corrections: await readCorrections<RepairThen>(scope, "repair", id),
  };
}

/** What a repair says now, in the shape in which it is put aside. */
export async function repairThen(scope: FleetScope, row: typeof logEntries.$inferSelect): Promise<RepairThen> {
  const { at, outcome, symptoms, remedyKey, remedyTitle, proof, minutes, parts, note } = row;
  const remedy = remedyTitle === null ? null : { key: remedyKey, title: remedyTitle };
  const meter = await meterOf(scope, row.id);
  return { doneAt: at.toISOString(), outcome, symptoms, cause: causeOf(row), remedy, proof, ...meter, minutes, parts, note };
}

async function meterOf(scope: FleetScope, id: string) {
  const [row] = await scope.tx
    .select({ reading: hourReadings.reading, reset: hourReadings.reset })
    .from(hourReadings)
    .where(and(eq(hourReadings.fleetId, scope.fleetId), eq(hourReadings.id, id)));
  return { meterShowed: row?.reading ?? null, meterReset: row?.reset ?? false };
}
