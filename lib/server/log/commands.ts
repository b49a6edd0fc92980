import "server-only";
import { and, eq } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { LogEntry, NewRepair, RepairChange } from "@/lib/core/contract/log";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { refuseEventId } from "@/lib/server/diagnoses/event-ids";
import { getEngine } from "@/lib/server/engines/queries";
import { canonical } from "@/lib/server/trees/content-hash";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { notAhead } from "@/lib/server/web/not-ahead";
import { namesOf, unknownIn } from "./outcome-names";
import { getLogEntry } from "./queries";

/** Writes a repair into an engine's log that was done without a diagnosis. Sent twice it is one line. */
export async function logRepair(scope: FleetScope<"log:write">, repair: NewRepair): Promise<LogEntry> {
  await getEngine(scope, repair.engineId);
  const line = { engineId: repair.engineId, ...(await contentOf(scope, repair)) };
  await refuseEventId(scope, repair.id);
  const [stored] = await scope.tx
    .insert(logEntries)
    .values({ fleetId: scope.fleetId, id: repair.id, ...line, by: scope.actor.userId })
    .onConflictDoNothing()
    .returning({ id: logEntries.id });
  if (!stored) {
    const [there] = await scope.tx
      .select()
      .from(logEntries)
      .where(and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, repair.id)));
    // What was corrected since then is not undone by its first form coming once more.
    const corrected = there?.diagnosisId === null && there.engineId === repair.engineId && there.version > 1 && !there.takenBackAt;
    if (corrected) return getLogEntry(scope, repair.id);
    if (there?.diagnosisId !== null || there.takenBackAt || canonical(asSent(there)) !== canonical(asSent(line)))
      throw Problem.conflict("Another line of the log has this id already.");
    return getLogEntry(scope, repair.id);
  }
  await writeReading(scope, repair.id, repair.engineId, repair);
  return getLogEntry(scope, repair.id);
}

/** What a repair says, as a line of the log keeps it. @throws Problem 422 where it names what the tree does not have */
export async function contentOf(scope: FleetScope<"log:write">, repair: RepairChange) {
  const tree = await documentOf(scope, await getCurrentTreeVersion(scope));
  const errors = unknownIn(repair, tree);
  if (errors.length > 0) throw Problem.invalid(errors);
  return {
    at: notAhead("doneAt", repair.doneAt),
    outcome: repair.outcome,
    ...namesOf(repair, repair.symptoms, tree),
    proof: repair.proof ?? null,
    engineHours: repair.engineHours ?? null,
    minutes: repair.minutes ?? null,
    parts: repair.parts,
    note: repair.note ?? null,
  };
}

/** The hours that a repair names are a reading of the meter under the repair's own id. */
export async function writeReading(scope: FleetScope<"log:write">, id: string, engineId: string, repair: RepairChange): Promise<void> {
  if (repair.engineHours === undefined) return;
  await scope.tx
    .insert(hourReadings)
    .values({
      fleetId: scope.fleetId,
      id,
      engineId,
      reading: repair.engineHours,
      readAt: new Date(repair.doneAt),
      reset: repair.meterReset ?? false,
      by: scope.actor.userId,
    })
    .onConflictDoNothing();
}

type Line = Pick<
  typeof logEntries.$inferSelect,
  | "engineId"
  | "at"
  | "outcome"
  | "causeKey"
  | "causeTitle"
  | "remedyKey"
  | "remedyTitle"
  | "proof"
  | "engineHours"
  | "minutes"
  | "parts"
  | "note"
>;

/** What a person wrote, apart from titles that a newer tree may word in another way. */
const asSent = ({
  engineId,
  at,
  outcome,
  causeKey,
  causeTitle,
  remedyKey,
  remedyTitle,
  proof,
  engineHours,
  minutes,
  parts,
  note,
}: Line) => ({
  ...{ engineId, at: at.getTime(), outcome, proof, engineHours, minutes, parts, note },
  cause: causeKey ?? causeTitle,
  remedy: remedyKey ?? remedyTitle,
});
