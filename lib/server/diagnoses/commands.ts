import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { engines } from "@/db/schema/boats";
import { diagnoses, diagnosisEvents } from "@/db/schema/diagnoses";
import { logEntries } from "@/db/schema/log-entries";
import { DiagnosisEvent, type EventOf, type EventReceipt } from "@/lib/core/contract/event";
import { allKeepable } from "@/lib/core/contract/kept-text";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { projectDiagnosis } from "@/lib/server/log/project-diagnosis";
import { pinnedVersion } from "@/lib/server/trees/pinned-version";
import { documentOf, findTreeVersion } from "@/lib/server/trees/queries";
import { refusalOf } from "./check-event";
import { sortOut } from "./sort-out";
import { rowOf } from "./stored-events";

/** An event as it came, of which only the id is sure. */
export type PostedEvent = { id: string } & Record<string, unknown>;

/**
 * Takes in events of one diagnosis from a device's outbox. Each gets a receipt:
 * stored, a duplicate of one that is here, or rejected with the reason; one bad
 * event holds up no other. Sent twice, late, out of order or from two phones the
 * log ends the same, and the projection with it, in this transaction.
 *
 * @throws Problem 404 when the diagnosis is not in this fleet and none of the events begins it
 */
export async function recordEvents(
  scope: FleetScope<"diagnosis:write">,
  diagnosisId: string,
  posted: readonly PostedEvent[],
): Promise<EventReceipt[]> {
  const receipts = new Map<string, EventReceipt>();
  const reject = (id: string, because: string) => receipts.set(id, { id, result: "rejected", because });

  const events: DiagnosisEvent[] = [];
  for (const one of posted) {
    const parsed = DiagnosisEvent.safeParse(one);
    if (!parsed.success)
      reject(
        one.id,
        `It cannot be read: ${parsed.error.issues
          .map((i) => `${i.path.join(".")}: ${i.message}`)
          .slice(0, 3)
          .join("; ")}`,
      );
    else if (!allKeepable(parsed.data)) reject(one.id, "There is a character in it that cannot be kept.");
    else if (parsed.data.diagnosisId !== diagnosisId) reject(one.id, "It belongs to another diagnosis.");
    else events.push(parsed.data);
  }

  const begun = events.filter((event) => event.kind === "begun").sort(byDeviceAndSequence);
  for (const event of begun) await begin(scope, event);
  const [diagnosis] = await scope.tx
    .select()
    .from(diagnoses)
    .where(and(eq(diagnoses.fleetId, scope.fleetId), eq(diagnoses.id, diagnosisId)))
    .for("update"); // two phones at once: the second projects both
  if (!diagnosis) {
    const unread = posted.find((one) => one.kind === "begun" && receipts.has(one.id));
    const because = begun[0] ? await beginRefusal(scope, begun[0]) : unread && `It was not begun. ${receipts.get(unread.id)?.because}`;
    if (!because) throw Problem.notFound();
    for (const event of events) reject(event.id, because);
    return posted.map((one) => receipts.get(one.id) as EventReceipt);
  }

  const tree = await documentOf(scope, pinnedVersion(diagnosis));
  const fresh = await sortOut(scope, diagnosis, events.sort(byDeviceAndSequence), tree, receipts);
  if (fresh.length > 0) {
    await scope.tx.insert(diagnosisEvents).values(fresh.map((event) => rowOf(scope, event)));
    await projectDiagnosis(scope, diagnosisId);
  }
  return posted.map((one) => receipts.get(one.id) as EventReceipt);
}

/** Makes the diagnosis that an event begins, pinned to its tree version; nothing when it is there already or cannot be. */
async function begin(scope: FleetScope<"diagnosis:write">, event: EventOf<"begun">): Promise<void> {
  if (await beginRefusal(scope, event)) return;
  const version = await findTreeVersion(scope, event.payload.treeVersionId);
  if (!version) return;
  // A phone whose clock runs ahead does not put it above all that follow.
  const at = new Date(Math.min(Date.parse(event.madeAt), Date.now()));
  await scope.tx
    .insert(diagnoses)
    .values({
      fleetId: scope.fleetId,
      id: event.diagnosisId,
      engineId: event.payload.engineId,
      ...(version.from === "shipped" ? { shippedVersionId: version.id } : { ownVersionId: version.id }),
      begunAt: at,
      begunBy: scope.actor.userId,
      symptoms: event.payload.symptoms,
      lastEventAt: at,
    })
    .onConflictDoNothing();
}

async function beginRefusal(scope: FleetScope, event: EventOf<"begun">): Promise<string | null> {
  const [engine] = await scope.tx
    .select({ id: engines.id })
    .from(engines)
    .where(and(eq(engines.fleetId, scope.fleetId), eq(engines.id, event.payload.engineId)));
  if (!engine) return "There is no such engine in this fleet.";
  const [repair] = await scope.tx
    .select({ id: logEntries.id })
    .from(logEntries)
    .where(and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, event.diagnosisId), isNull(logEntries.diagnosisId)));
  if (repair) return "A repair in the log has this id already.";
  const version = await findTreeVersion(scope, event.payload.treeVersionId);
  if (!version) return "There is no such version of the fault tree.";
  return refusalOf(event, await documentOf(scope, version));
}

function byDeviceAndSequence(a: DiagnosisEvent, b: DiagnosisEvent): number {
  return a.device < b.device ? -1 : a.device > b.device ? 1 : a.sequence - b.sequence;
}
