import { uuidv7 } from "uuidv7";
import type { Engine } from "@/lib/core/contract/engine";
import type { Phone } from "@/lib/core/contract/phone";
import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import type { FaultTree, Situation, Who } from "@/lib/core/tree/schema";
import { answerOfOther, otherEngineCheck, profileAtStart } from "./other-engine";
import type { Draft } from "./store/draft";
import type { PhoneStore } from "./store/phone-store";

const CALLS = { alongside: "alongside", "at-anchor": "atAnchor", "under-way": "underWay" } as const;

type Start = {
  store: PhoneStore;
  phone: Phone;
  engine: Engine;
  tree: FaultTree;
  draft: Draft & { situation: Situation };
  symptoms: readonly string[];
};

/** Begins a diagnosis: pinned to the tree, the profile and the weights of this moment, so that every device works out the same. Gives its id. */
export async function begin({ store, phone, engine, tree, draft, symptoms }: Start): Promise<string> {
  const d = uuidv7();
  const callMinutes = phone.boats.find(({ id }) => id === engine.boatId)?.callMinutes[CALLS[draft.situation]];
  const profile = profileAtStart(engine, phone.engines, tree);
  const inTree = new Set(tree.causes.map(({ key }) => key));
  await store.record(d, "begun", {
    engineId: engine.id,
    treeVersionId: phone.treeVersion.id,
    profile,
    situation: draft.situation,
    person: whoIs(draft),
    symptoms: symptoms.slice(0, 12),
    ...(draft.complaint.trim() ? { complaint: draft.complaint.trim() } : {}),
    multipliers: (phone.multipliers[engine.id] ?? []).filter(({ cause }) => inTree.has(cause)),
    ...(callMinutes === undefined ? {} : { callMinutes }),
    coreVersion: CORE_VERSION,
  });
  const other = otherEngineCheck(tree, profile, draft.situation);
  const answer = other && answerOfOther(other, draft.otherEngine);
  if (other && answer) await store.record(d, "answered", { check: other.key, answer, photos: [] });
  await store.dropDraft(engine.id);
  return d;
}

const whoIs = (draft: Draft): Who => (draft.mechanic ? "mechanic" : draft.situation === "alongside" ? "skipper-in-port" : "skipper-at-sea");
