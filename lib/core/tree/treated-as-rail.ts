import type { EngineProfile } from "../contract/engine";

/** Options of the feature "injection" whose high-pressure unions may be slackened by a mechanic. */
const OPENABLE = ["in-line-pump", "rotary-pump"];

/** Common rail, unit injectors, or not known: nothing is opened after the last filter. */
export const treatedAsRail = (profile: Pick<EngineProfile, "features">): boolean => !OPENABLE.includes(profile.features.injection ?? "");
