import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import type { Payload } from "@/lib/core/diagnosis/log-of";
import type { Situation } from "@/lib/core/tree/schema";

/** How a trial begins: an engine of which nothing is known, in a skipper's hands. */
export const trialBegun = (symptom: string, situation: Situation): Payload => ({
  kind: "begun",
  payload: {
    engineId: "trial",
    treeVersionId: "trial",
    profile: { features: {}, figures: {}, healthy: {} },
    situation,
    person: situation === "alongside" ? "skipper-in-port" : "skipper-at-sea",
    symptoms: [symptom],
    multipliers: [],
    coreVersion: CORE_VERSION,
  },
});
