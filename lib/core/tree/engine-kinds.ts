import type { EngineProfile } from "../contract/engine";
import { optionShares } from "./applies";
import type { AppliesTo, Feature } from "./schema";

/** From this share of all engines an option makes a kind of its own. */
const COMMON = 0.1;

/** A whole engine, every feature known, and by what it differs from the commonest (null: it is the commonest). */
export type EngineKind = Pick<EngineProfile, "features"> & { readonly differsBy: { feature: string; option: string } | null };

/**
 * The common engines, by the features' shares: the commonest in everything,
 * then that engine with one feature changed, for every other option that at
 * least 1 engine in 10 has. Few, and the same for the same features.
 */
export function engineKinds(features: readonly Feature[]): EngineKind[] {
  const commonest = Object.fromEntries(features.map((feature) => [feature.key, commonestOption(feature)]));
  const changed = features.flatMap(({ key, ...feature }) =>
    [...optionShares(feature)]
      .filter(([option, share]) => share >= COMMON && option !== commonest[key])
      .map(([option]): EngineKind => ({ features: { ...commonest, [key]: option }, differsBy: { feature: key, option } })),
  );
  return [{ features: commonest, differsBy: null }, ...changed];
}

function commonestOption(feature: Feature): string {
  const shares = [...optionShares(feature)];
  return shares.reduce((best, one) => (one[1] > best[1] ? one : best), shares[0] ?? ["", 0])[0];
}

/** Does the node apply to an engine of this kind, in some situation? */
export const fits = ({ appliesTo }: { appliesTo?: AppliesTo }, { features }: Pick<EngineKind, "features">): boolean =>
  Object.entries(appliesTo?.features ?? {}).every(([key, wanted]) => wanted.includes(features[key] ?? ""));
