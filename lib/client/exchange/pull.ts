import * as z from "zod";
import { DiagnosisEvent } from "@/lib/core/contract/event";
import { Phone } from "@/lib/core/contract/phone";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { PhoneStore } from "../store/phone-store";
import { readLoosely } from "./read-loosely";
import { NoAnswer, request } from "./request";

/** What the server adds to an event, and what is no part of it, is left out; so is an event of a kind that this phone does not know. */
const Events = z.object({ events: z.array(DiagnosisEvent) });

/** Makes the store fresher: the fleet, the trees its diagnoses are pinned to, and what other phones have said. @throws NoAnswer */
export async function pull(store: PhoneStore, fleetId: string): Promise<void> {
  const phone = readLoosely(Phone, await request(`/api/v1/fleets/${fleetId}/phone`));
  await store.keepPhone(phone);
  const open = new Set<string>();
  const versions = new Set([phone.treeVersion.id]);
  for (const diagnosis of phone.openDiagnoses) {
    open.add(diagnosis.id);
    versions.add(diagnosis.treeVersionId);
    await store.takeIn(diagnosis.events);
  }
  for (const summary of await store.summaries()) {
    if (summary.ended) continue;
    versions.add(summary.treeVersionId);
    // Open here and not there: another phone has ended it, and its last words are on the server.
    if (!open.has(summary.id)) await takeInFromServer(store, fleetId, summary.id).catch(unlessMissing);
  }
  for (const version of versions) if (!(await store.tree(version))) await store.keepTree(version, await fetchTree(fleetId, version));
}

/** @throws NoAnswer */
export async function takeInFromServer(store: PhoneStore, fleetId: string, diagnosisId: string): Promise<void> {
  const { events } = readLoosely(Events, await request(`/api/v1/fleets/${fleetId}/diagnoses/${diagnosisId}/events`));
  await store.takeIn(events);
}

/** @throws NoAnswer */
export async function fetchTree(fleetId: string, versionId: string): Promise<FaultTree> {
  const answer = (await request(`/api/v1/fleets/${fleetId}/trees/versions/${versionId}`)) as FaultTree | { document: FaultTree };
  return "document" in answer ? answer.document : answer;
}

/** A diagnosis whose beginning was refused is only on this phone. */
function unlessMissing(failure: unknown): void {
  if (!(failure instanceof NoAnswer && failure.status === 404)) throw failure;
}
