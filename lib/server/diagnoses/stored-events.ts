import "server-only";
import { and, asc, eq, inArray } from "drizzle-orm";
import { diagnosisEvents } from "@/db/schema/diagnoses";
import { people } from "@/db/schema/fleets";
import type { DiagnosisEvent, StoredEvent } from "@/lib/core/contract/event";
import type { FleetScope } from "@/lib/server/auth/scope";

export type EventRow = typeof diagnosisEvents.$inferSelect;

/** The event as its device made it. */
export function eventOf(row: EventRow): DiagnosisEvent {
  const { id, diagnosisId, device, sequence, kind, payload, seen, supersedes } = row;
  return {
    id,
    diagnosisId,
    device,
    sequence,
    kind,
    payload,
    seen,
    madeAt: row.madeAt.toISOString(),
    ...(supersedes ? { supersedes } : {}),
  } as DiagnosisEvent;
}

export function rowOf(scope: FleetScope, event: DiagnosisEvent): typeof diagnosisEvents.$inferInsert {
  return { ...event, fleetId: scope.fleetId, madeAt: new Date(event.madeAt), by: scope.actor.userId };
}

/** All events of one diagnosis, by device and sequence. */
export async function readEvents(scope: FleetScope, diagnosisId: string): Promise<StoredEvent[]> {
  return (await readEventsOf(scope, [diagnosisId])).get(diagnosisId) ?? [];
}

/** The events of several diagnoses, by diagnosis, each by device and sequence. */
export async function readEventsOf(scope: FleetScope, diagnosisIds: readonly string[]): Promise<Map<string, StoredEvent[]>> {
  if (diagnosisIds.length === 0) return new Map();
  const rows = await scope.tx
    .select({ event: diagnosisEvents, byName: people.name })
    .from(diagnosisEvents)
    .innerJoin(people, and(eq(people.fleetId, diagnosisEvents.fleetId), eq(people.userId, diagnosisEvents.by)))
    .where(and(eq(diagnosisEvents.fleetId, scope.fleetId), inArray(diagnosisEvents.diagnosisId, [...diagnosisIds])))
    .orderBy(asc(diagnosisEvents.diagnosisId), asc(diagnosisEvents.device), asc(diagnosisEvents.sequence));
  const byDiagnosis = new Map<string, StoredEvent[]>();
  for (const { event, byName } of rows) {
    const list = byDiagnosis.get(event.diagnosisId) ?? [];
    byDiagnosis.set(event.diagnosisId, list);
    list.push({ ...eventOf(event), receivedAt: event.receivedAt.toISOString(), by: event.by, byName });
  }
  return byDiagnosis;
}

/** The events alone, as fold and view take them. */
export const plainEvents = (stored: readonly StoredEvent[]): DiagnosisEvent[] =>
  stored.map(({ id, diagnosisId, device, sequence, kind, payload, seen, madeAt, supersedes }) => {
    return { id, diagnosisId, device, sequence, kind, payload, seen, madeAt, ...(supersedes ? { supersedes } : {}) } as DiagnosisEvent;
  });
