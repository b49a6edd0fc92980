import * as z from "zod";
import { DiagnosisEvent } from "@/lib/core/contract/event";
import { Phone } from "@/lib/core/contract/phone";
import { FaultTree } from "@/lib/core/tree/schema";
import type { PhoneStore } from "../store/phone-store";
import { readLoosely } from "./read-loosely";
import { NoAnswer, request } from "./request";

/** What the server adds to an event, and what is no part of it, is left out; so is an event of a kind that this phone does not know. */
const Events = z.object({ events: z.array(DiagnosisEvent) });

/** A fault tree that this page cannot read: it is written for a newer one. */
class TreeTooNew extends Error {}

/**
 * Makes the store fresher: the fleet, the trees its diagnoses are pinned to, and what other phones have said.
 * Where the fleet's tree is too new for this page, new diagnoses go on with the one that is on the phone.
 *
 * @param tooNew versions that could not be read before; they are not asked for again, and those found now are added.
 * @throws NoAnswer
 */
export async function pull(store: PhoneStore, fleetId: string, tooNew: Set<string> = new Set()): Promise<void> {
  const phone = readLoosely(Phone, await request(`/api/v1/fleets/${fleetId}/phone`));
  const take = async (version: string): Promise<void> => {
    if (tooNew.has(version) || (await store.tree(version))) return;
    try {
      await store.keepTree(version, await fetchTree(fleetId, version));
    } catch (failure) {
      if (!(failure instanceof TreeTooNew)) throw failure;
      tooNew.add(version);
    }
  };
  const before = (await store.phone())?.phone.treeVersion;
  // The tree first, where there is one to go on with until it is here.
  if (before) await take(phone.treeVersion.id);
  await store.keepPhone(before && tooNew.has(phone.treeVersion.id) ? { ...phone, treeVersion: before } : phone);
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
  for (const version of versions) await take(version);
}

/** @throws NoAnswer */
export async function takeInFromServer(store: PhoneStore, fleetId: string, diagnosisId: string): Promise<void> {
  const { events } = readLoosely(Events, await request(`/api/v1/fleets/${fleetId}/diagnoses/${diagnosisId}/events`));
  await store.takeIn(events);
}

/**
 * A tree as this page knows trees. Part of one would be worse than none: a stop rule might be in what was left out.
 *
 * @throws NoAnswer; TreeTooNew
 */
async function fetchTree(fleetId: string, versionId: string): Promise<FaultTree> {
  const answer = await request(`/api/v1/fleets/${fleetId}/trees/versions/${versionId}`);
  const document: unknown = typeof answer === "object" && answer !== null && "document" in answer ? answer.document : answer;
  const read = FaultTree.safeParse(document);
  if (!read.success) throw new TreeTooNew(versionId);
  return read.data;
}

/** A diagnosis whose beginning was refused is only on this phone. */
function unlessMissing(failure: unknown): void {
  if (!(failure instanceof NoAnswer && failure.status === 404)) throw failure;
}
