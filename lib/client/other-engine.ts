import type { Answer } from "@/lib/core/contract/event";
import type { Engine, EngineProfile } from "@/lib/core/contract/engine";
import { shareOfEngines } from "@/lib/core/tree/applies";
import type { Check, FaultTree, Situation } from "@/lib/core/tree/schema";

/** The check that is asked with the complaint, and the feature that says whether there is another engine to compare with. */
const CHECK = "other-engine";
const FEATURE = "second-engine";

/** Said in place of a finding. */
export const CANNOT_TELL = "cannot-tell";

/** Engines of the same boat. */
export const othersOf = (engine: Engine, engines: readonly Engine[]): readonly Engine[] =>
  engines.filter(({ boatId, id }) => boatId === engine.boatId && id !== engine.id);

/**
 * The profile a diagnosis begins with. Whether there is a second engine is seen
 * from the fleet where the profile does not say; so nobody is asked twice.
 */
export function profileAtStart(engine: Engine, engines: readonly Engine[], tree: FaultTree): EngineProfile {
  const { profile } = engine;
  if (profile.features[FEATURE] !== undefined || !tree.features.some(({ key }) => key === FEATURE)) return profile;
  const seen = othersOf(engine, engines).length > 0 ? "fitted" : "not-fitted";
  return { ...profile, features: { ...profile.features, [FEATURE]: seen } };
}

/** The check "does the other one do it?", where there is one to compare with for certain; null: nothing to ask. */
export function otherEngineCheck(tree: FaultTree, profile: EngineProfile, situation: Situation): Check | null {
  const check = tree.checks.find(({ key }) => key === CHECK);
  return check && shareOfEngines(check.appliesTo, profile, situation, tree.features) === 1 ? check : null;
}

/** What was said of the other engine as an answer to its check; null: nothing was, or what was is no answer any more. */
export function answerOfOther(check: Check, said: string | null): Answer | null {
  if (said === CANNOT_TELL) return { cannotTell: true };
  return check.findings.some(({ key }) => key === said) ? { finding: said! } : null;
}
