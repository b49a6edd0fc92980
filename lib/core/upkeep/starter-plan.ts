import type { EngineProfile } from "../contract/engine";
import { shareOfEngines } from "../tree/applies";
import type { Feature } from "../tree/schema";
import { STARTER_ITEMS } from "./starter-items";
import type { UpkeepItem } from "./upkeep-item";

/** An item of the starter plan. `ifFitted`: the profile does not say whether the engine has what it is about. */
export type StarterItem = UpkeepItem & { readonly ifFitted: boolean };

/**
 * The upkeep that an engine like this one begins with (rule U1): what cannot apply to it is left out, what may is kept and says "if fitted".
 *
 * @param features the features of the fleet's tree
 */
export function starterPlan(profile: Pick<EngineProfile, "features">, features: readonly Feature[]): StarterItem[] {
  return STARTER_ITEMS.flatMap((item) => {
    const share = shareOfEngines(item.appliesTo, profile, "alongside", features);
    return share > 0 ? [{ ...item, ifFitted: share < 1 }] : [];
  });
}
