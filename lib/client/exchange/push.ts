import * as z from "zod";
import type { PhoneStore } from "../store/phone-store";
import { batches, type Batch } from "./batches";
import { NoAnswer, request, sendJson } from "./request";

/** Read loosely: a phone that has not been renewed yet must still understand that its entries have arrived. */
const Receipts = z.object({ receipts: z.array(z.object({ id: z.string(), result: z.string(), because: z.string().optional() })) });

/** A picture takes its time from an anchorage. */
const PHOTO_PATIENCE_MS = 180_000;

/**
 * Empties the outbox: events first, since words matter more than pictures.
 * Sending twice is harmless. What the server will not take now is kept, holds up
 * nothing else, and is given back for the next try; null: all has gone ashore.
 *
 * @param withPhotos false: pictures are left for another time
 * @throws NoAnswer where nothing can be sent at all: no signal, signed out, too many requests
 */
export async function push(store: PhoneStore, fleetId: string, withPhotos = true): Promise<Error | null> {
  let held: Error | null = null;
  const hold = (failure: unknown): void => {
    if (!(failure instanceof Error) || stopsAll(failure)) throw failure;
    held ??= failure;
  };
  const waiting = (await store.unsentEvents()).map((kept) => kept.event);
  const stuck = new Set<string>();
  for (const batch of batches(waiting)) {
    // What comes later in a diagnosis waits for what came before it.
    if (stuck.has(batch.diagnosisId)) continue;
    try {
      await pushBatch(store, fleetId, batch);
    } catch (failure) {
      if (await settleUnbegun(store, batch.diagnosisId, failure)) continue;
      stuck.add(batch.diagnosisId);
      hold(failure);
    }
  }
  for (const photo of withPhotos ? await store.unsentPhotos() : []) {
    try {
      await pushPhoto(store, fleetId, photo);
    } catch (failure) {
      hold(failure);
      // Where one picture finds no room, the next would be carried there for nothing.
      if (hasNoRoom(failure)) break;
    }
  }
  return held;
}

async function pushBatch(store: PhoneStore, fleetId: string, batch: Batch): Promise<void> {
  try {
    const answer = await sendJson(`/api/v1/fleets/${fleetId}/diagnoses/${batch.diagnosisId}/events`, { events: batch.events });
    const { receipts } = Receipts.parse(answer);
    await store.settle(
      receipts.map(({ id, result, because }) => (result === "rejected" ? { id, rejected: because ?? "refused" } : { id })),
    );
  } catch (failure) {
    if (!isForGood(failure)) throw failure;
    const only = batch.events[0];
    if (batch.events.length === 1 && only) return store.settle([{ id: only.id, rejected: failure.because }]);
    // One bad event must not hold up the rest.
    for (const event of batch.events) await pushBatch(store, fleetId, { ...batch, events: [event] });
  }
}

/** Where the server refused a diagnosis's beginning it knows nothing of the diagnosis: what follows stays on this phone with it. */
async function settleUnbegun(store: PhoneStore, diagnosisId: string, failure: unknown): Promise<boolean> {
  if (!(failure instanceof NoAnswer && failure.fromServer && failure.status === 404)) return false;
  const events = await store.events(diagnosisId);
  const refused = events.find(({ event, rejected }) => event.kind === "begun" && rejected !== undefined);
  if (!refused) return false;
  const because = `The diagnosis was not taken. ${refused.rejected}`;
  await store.settle(events.filter(({ unsent }) => unsent === 1).map(({ event }) => ({ id: event.id, rejected: because })));
  return true;
}

async function pushPhoto(store: PhoneStore, fleetId: string, { id, blob }: { id: string; blob: Blob }): Promise<void> {
  try {
    const answer = await request(`/api/v1/fleets/${fleetId}/files/${id}`, {
      method: "PUT",
      headers: { "content-type": blob.type || "application/octet-stream" },
      body: blob,
      signal: AbortSignal.timeout(PHOTO_PATIENCE_MS),
    });
    if (!z.object({ id: z.literal(id) }).safeParse(answer).success) throw new NoAnswer(502, "the picture was not acknowledged");
    await store.settlePhoto(id);
  } catch (failure) {
    if (!isForGood(failure)) throw failure;
    await store.settlePhoto(id, failure.because);
  }
}

/** The server understood and will not take it, however often it is sent. A proxy's word counts only for size. */
function isForGood(failure: unknown): failure is NoAnswer {
  if (!(failure instanceof NoAnswer)) return false;
  return failure.status === 413 || (failure.fromServer && [400, 409, 415, 422].includes(failure.status));
}

/** Nothing else would get through either. */
const stopsAll = (failure: Error): boolean =>
  failure instanceof NoAnswer && (failure.isNoSignal || [401, 429, 503].includes(failure.status));

/** The store ashore is full: words still get there, pictures do not. */
export const hasNoRoom = (failure: unknown): boolean => failure instanceof NoAnswer && failure.status === 507;
