import "server-only";
import { and, eq } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { LogEntry, NewRepair } from "@/lib/core/contract/log";
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
  const tree = await documentOf(scope, await getCurrentTreeVersion(scope));
  const errors = unknownIn(repair, tree);
  if (errors.length > 0) throw Problem.invalid(errors);
  const at = notAhead("doneAt", repair.doneAt);
  await refuseEventId(scope, repair.id);
  const line = {
    engineId: repair.engineId,
    at,
    outcome: repair.outcome,
    ...namesOf(repair, repair.symptoms, tree),
    proof: repair.proof ?? null,
    engineHours: repair.engineHours ?? null,
    minutes: repair.minutes ?? null,
    parts: repair.parts,
    note: repair.note ?? null,
  };
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
    if (there?.diagnosisId !== null || canonical(asSent(there)) !== canonical(asSent(line)))
      throw Problem.conflict("Another line of the log has this id already.");
    return getLogEntry(scope, repair.id);
  }
  if (repair.engineHours !== undefined) {
    await scope.tx
      .insert(hourReadings)
      .values({
        fleetId: scope.fleetId,
        id: repair.id,
        engineId: repair.engineId,
        reading: repair.engineHours,
        readAt: at,
        reset: repair.meterReset ?? false,
        by: scope.actor.userId,
      })
      .onConflictDoNothing();
  }
  return getLogEntry(scope, repair.id);
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
