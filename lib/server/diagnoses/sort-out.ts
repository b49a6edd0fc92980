import "server-only";
import { and, eq, inArray, or } from "drizzle-orm";
import { hourReadings } from "@/db/schema/boats";
import { diagnosisEvents, type diagnoses } from "@/db/schema/diagnoses";
import type { DiagnosisEvent, EventOf, EventReceipt } from "@/lib/core/contract/event";
import { Problem } from "@/lib/core/contract/problem";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { FleetScope } from "@/lib/server/auth/scope";
import { canonical } from "@/lib/server/trees/content-hash";
import { pinnedVersion } from "@/lib/server/trees/pinned-version";
import { refusalOf } from "./check-event";
import { eventOf } from "./stored-events";

/** Many times what the longest search needs; each event is folded again at every reading. */
const MOST_EVENTS = 1000;

type DiagnosisRow = typeof diagnoses.$inferSelect;

/**
 * Writes a receipt for each event and gives back those to store.
 *
 * @param events of this diagnosis, by device and sequence
 * @throws Problem 409 when nothing begins the diagnosis: that rolls back one made a moment ago for a beginning that could not be kept
 */
export async function sortOut(
  scope: FleetScope,
  diagnosis: DiagnosisRow,
  events: readonly DiagnosisEvent[],
  tree: FaultTree,
  receipts: Map<string, EventReceipt>,
): Promise<DiagnosisEvent[]> {
  if (events.length === 0) return [];
  const ids = events.map((event) => event.id);
  const rows = await scope.tx
    .select()
    .from(diagnosisEvents)
    .where(
      and(eq(diagnosisEvents.fleetId, scope.fleetId), or(eq(diagnosisEvents.diagnosisId, diagnosis.id), inArray(diagnosisEvents.id, ids))),
    );
  const here = rows.filter((row) => row.diagnosisId === diagnosis.id);
  const known = new Map(rows.map((row) => [row.id, eventOf(row)]));
  const places = new Set(rows.map(placeOf));
  const readings = await readingsUnder(scope, ids);
  let begunBy = here.find((row) => row.kind === "begun")?.id;
  const fresh: DiagnosisEvent[] = [];

  const refusal = (event: DiagnosisEvent): string | null => {
    if (places.has(placeOf(event))) return "Another event has this place in the device's sequence already.";
    if (event.kind === "begun" && begunBy) return "This diagnosis has begun already.";
    if (event.kind === "begun" && !begins(event, diagnosis)) return "This diagnosis has begun on another engine or tree.";
    // An outcome's hours are a reading under the outcome's id.
    if (event.kind === "ended" && readings.has(event.id)) return "A reading of the hour meter has this id already.";
    if (here.length + fresh.length >= MOST_EVENTS) return "This diagnosis holds as much as one can. Begin another.";
    return refusalOf(event, tree);
  };

  for (const event of events) {
    const before = known.get(event.id);
    const because = before ? (sameEvent(before, event) ? null : "Another event has this id already.") : refusal(event);
    if (because) receipts.set(event.id, { id: event.id, result: "rejected", because });
    else if (before) receipts.set(event.id, receipts.get(event.id) ?? { id: event.id, result: "duplicate" });
    else {
      receipts.set(event.id, { id: event.id, result: "stored" });
      known.set(event.id, event);
      places.add(placeOf(event));
      if (event.kind === "begun") begunBy = event.id;
      fresh.push(event);
    }
  }
  if (!begunBy) throw Problem.conflict("The event that begins this diagnosis was refused: its id or its place in the sequence is taken.");
  return fresh;
}

/** Which of these ids are readings of the meter that no event made. */
async function readingsUnder(scope: FleetScope, ids: readonly string[]): Promise<Set<string>> {
  const rows = await scope.tx
    .select({ id: hourReadings.id })
    .from(hourReadings)
    .where(and(eq(hourReadings.fleetId, scope.fleetId), inArray(hourReadings.id, [...ids])));
  return new Set(rows.map((row) => row.id));
}

const begins = ({ payload }: EventOf<"begun">, diagnosis: DiagnosisRow): boolean =>
  payload.engineId === diagnosis.engineId && payload.treeVersionId === pinnedVersion(diagnosis).id;

const placeOf = (event: { diagnosisId: string; device: string; sequence: number }) =>
  `${event.diagnosisId} ${event.device} ${event.sequence}`;

/** The same event, whatever zone its moment is written in. */
const sameEvent = (a: DiagnosisEvent, b: DiagnosisEvent) => canonical(comparable(a)) === canonical(comparable(b));
const comparable = (event: DiagnosisEvent) => ({ ...event, madeAt: Date.parse(event.madeAt) });
