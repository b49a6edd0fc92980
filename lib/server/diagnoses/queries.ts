import "server-only";
import { and, desc, eq, isNull, isNotNull, sql } from "drizzle-orm";
import { boats, engines } from "@/db/schema/boats";
import { diagnoses } from "@/db/schema/diagnoses";
import { people } from "@/db/schema/fleets";
import { logEntries } from "@/db/schema/log-entries";
import type { Diagnosis, DiagnosisQuery } from "@/lib/core/contract/diagnosis";
import type { StoredEvent } from "@/lib/core/contract/event";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { pageKey, readPageKey } from "@/lib/server/web/page-key";
import { readEvents } from "./stored-events";

/** A page of the fleet's diagnoses, the newest begun first. */
export async function listDiagnoses(
  scope: FleetScope,
  query: Partial<DiagnosisQuery> = {},
): Promise<{ items: Diagnosis[]; next: string | null }> {
  const { limit = 50, after } = query;
  const from = readPageKey(after);
  const rows = await selectDiagnoses(scope)
    .where(
      and(
        eq(diagnoses.fleetId, scope.fleetId),
        query.engineId ? eq(diagnoses.engineId, query.engineId) : undefined,
        query.open === "yes" ? isNull(diagnoses.endedAt) : query.open === "no" ? isNotNull(diagnoses.endedAt) : undefined,
        from && sql`(${diagnoses.begunAt}, ${diagnoses.id}) < (${from.at.toISOString()}::timestamptz, ${from.id}::uuid)`,
      ),
    )
    .orderBy(desc(diagnoses.begunAt), desc(diagnoses.id))
    .limit(limit + 1);
  const page = rows.slice(0, limit).map(diagnosisOf);
  const last = rows.length > limit ? page.at(-1) : undefined;
  return { items: page, next: last ? pageKey(new Date(last.begunAt), last.id) : null };
}

export async function getDiagnosis(scope: FleetScope, id: string): Promise<Diagnosis> {
  const [row] = await selectDiagnoses(scope).where(and(eq(diagnoses.fleetId, scope.fleetId), eq(diagnoses.id, id)));
  if (!row) throw Problem.notFound();
  return diagnosisOf(row);
}

/** The whole log of a diagnosis, by device and sequence. */
export async function getEvents(scope: FleetScope, id: string): Promise<StoredEvent[]> {
  await getDiagnosis(scope, id);
  return readEvents(scope, id);
}

const selectDiagnoses = (scope: FleetScope) =>
  scope.tx
    .select({ diagnosis: diagnoses, engineName: engines.name, boatName: boats.name, begunBy: people.name, symptoms: logEntries.symptoms })
    .from(diagnoses)
    .innerJoin(engines, and(eq(engines.fleetId, diagnoses.fleetId), eq(engines.id, diagnoses.engineId)))
    .innerJoin(boats, and(eq(boats.fleetId, engines.fleetId), eq(boats.id, engines.boatId)))
    .innerJoin(people, and(eq(people.fleetId, diagnoses.fleetId), eq(people.userId, diagnoses.begunBy)))
    .innerJoin(logEntries, and(eq(logEntries.fleetId, diagnoses.fleetId), eq(logEntries.diagnosisId, diagnoses.id)))
    .$dynamic();

type Row = Awaited<ReturnType<typeof selectDiagnoses>>[number];

function diagnosisOf({ diagnosis, engineName, boatName, begunBy, symptoms }: Row): Diagnosis {
  return {
    id: diagnosis.id,
    engineId: diagnosis.engineId,
    engineName,
    boatName,
    treeVersionId: diagnosis.shippedVersionId ?? diagnosis.ownVersionId ?? "",
    begunAt: diagnosis.begunAt.toISOString(),
    begunBy,
    symptoms,
    outcome: diagnosis.outcome,
    endedAt: diagnosis.endedAt?.toISOString() ?? null,
    lastEventAt: diagnosis.lastEventAt.toISOString(),
  };
}
