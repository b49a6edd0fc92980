import * as z from "zod";
import { EventReceipt } from "@/lib/core/contract/event";
import type { PhoneStore } from "../store/phone-store";
import { batches, type Batch } from "./batches";
import { NoAnswer, request, sendJson } from "./request";

const Receipts = z.object({ receipts: z.array(EventReceipt) });

/** Empties the outbox: events first, since words matter more than pictures. Sending twice is harmless. @throws NoAnswer */
export async function push(store: PhoneStore, fleetId: string): Promise<void> {
  const waiting = (await store.unsentEvents()).map((kept) => kept.event);
  for (const batch of batches(waiting)) await pushBatch(store, fleetId, batch);
  for (const photo of await store.unsentPhotos()) {
    try {
      await request(`/api/v1/fleets/${fleetId}/files/${photo.id}`, {
        method: "PUT",
        headers: { "content-type": photo.blob.type },
        body: photo.blob,
      });
      await store.settlePhoto(photo.id);
    } catch (failure) {
      if (!isForGood(failure)) throw failure;
      await store.settlePhoto(photo.id, failure.because);
    }
  }
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

/** The server understood and will not take it, however often it is sent. */
function isForGood(failure: unknown): failure is NoAnswer {
  return failure instanceof NoAnswer && [400, 409, 413, 415, 422].includes(failure.status);
}
