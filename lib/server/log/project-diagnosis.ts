import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { diagnoses } from "@/db/schema/diagnoses";
import { logEntries } from "@/db/schema/log-entries";
import type { StoredEvent } from "@/lib/core/contract/event";
import { fold } from "@/lib/core/diagnosis/fold";
import type { FleetScope } from "@/lib/server/auth/scope";
import { plainEvents, readEvents } from "@/lib/server/diagnoses/stored-events";
import { pinnedVersion } from "@/lib/server/trees/pinned-version";
import { documentOf } from "@/lib/server/trees/queries";
import { namesOf } from "./outcome-names";

/**
 * Works out from its events what a diagnosis has come to, and writes it where
 * lists read it: the diagnosis' row, its line of the log, the hours its outcome
 * named. The events alone decide, so this may be done again at any time.
 */
export async function projectDiagnosis(scope: FleetScope<"diagnosis:write" | "log:write">, diagnosisId: string): Promise<void> {
  const itself = and(eq(diagnoses.fleetId, scope.fleetId), eq(diagnoses.id, diagnosisId));
  const [diagnosis] = await scope.tx.select().from(diagnoses).where(itself);
  const stored = await readEvents(scope, diagnosisId);
  if (!diagnosis || stored.length === 0) return;
  const tree = await documentOf(scope, pinnedVersion(diagnosis));
  const { ended, symptoms } = fold(plainEvents(stored));
  // What was there until one of two faults was put right was complained of all the same.
  const complainedOf = symptoms.filter((one) => one.present || one.left?.before === true).map((one) => one.symptom);
  const outcome = ended?.payload ?? null;
  const end = stored.find((event) => event.id === ended?.id);
  const by = end?.by ?? diagnosis.begunBy;
  const endedAt = end ? saneMoment(end) : null;

  await scope.tx
    .update(diagnoses)
    .set({
      symptoms: complainedOf,
      endedAt,
      outcome: outcome?.outcome ?? null,
      lastEventAt: new Date(Math.max(...stored.map((event) => saneMoment(event).getTime()))),
    })
    .where(itself);

  const line = {
    engineId: diagnosis.engineId,
    at: endedAt ?? diagnosis.begunAt,
    outcome: outcome?.outcome ?? null,
    ...namesOf(outcome ?? {}, complainedOf, tree),
    proof: outcome?.proof || null,
    engineHours: outcome?.engineHours ?? null,
    minutes: outcome?.minutes ?? null,
    parts: outcome?.parts ?? [],
    note: outcome?.note || null,
    by,
  };
  await scope.tx
    .insert(logEntries)
    .values({ fleetId: scope.fleetId, id: diagnosisId, diagnosisId, ...line })
    .onConflictDoUpdate({ target: [logEntries.fleetId, logEntries.id], set: line, setWhere: eq(logEntries.diagnosisId, diagnosisId) });

  // An outcome's hours are a reading of the meter under the outcome's own id; one that was taken back goes with it.
  const ends = stored.filter((event) => event.kind === "ended").map((event) => event.id);
  if (ends.length > 0)
    await scope.tx.delete(hourReadings).where(and(eq(hourReadings.fleetId, scope.fleetId), inArray(hourReadings.id, ends)));
  if (end && endedAt && outcome?.engineHours !== undefined) {
    await scope.tx.insert(hourReadings).values({
      fleetId: scope.fleetId,
      id: end.id,
      engineId: diagnosis.engineId,
      reading: outcome.engineHours,
      readAt: endedAt,
      reset: outcome.meterReset ?? false,
      by,
    });
  }
}

/** When an event was made; no later than it came in, whatever the phone's clock said. */
const saneMoment = (event: StoredEvent): Date => new Date(Math.min(Date.parse(event.madeAt), Date.parse(event.receivedAt)));
