import type { EngineProfile } from "../contract/engine";
import type { AppliesTo, Feature, Situation } from "./schema";

/**
 * The share of engines like this one that a node applies to: 0, it does not;
 * 1, it does; between, when the profile does not know a feature, by that
 * feature's shares (the step then says "if fitted").
 */
export function shareOfEngines(
  appliesTo: AppliesTo | undefined,
  profile: Pick<EngineProfile, "features">,
  situation: Situation,
  features: readonly Feature[],
): number {
  if (appliesTo?.situations !== undefined && !appliesTo.situations.includes(situation)) return 0;
  let share = 1;
  for (const [key, wanted] of Object.entries(appliesTo?.features ?? {})) {
    const known = profile.features[key];
    if (known !== undefined) share *= wanted.includes(known) ? 1 : 0;
    else
      share *= shareOfOptions(
        features.find((feature) => feature.key === key),
        wanted,
      );
  }
  return share;
}

/** How many of all engines have each option, from 0 to 1 with a sum of 1: the options without a share part what the others leave. */
export function optionShares(feature: Pick<Feature, "options">): Map<string, number> {
  const named = feature.options.reduce((sum, option) => sum + (option.share ?? 0), 0);
  const unnamed = feature.options.filter((option) => option.share === undefined).length;
  const rest = unnamed === 0 ? 0 : Math.max(0, 1 - named) / unnamed;
  const total = named + rest * unnamed;
  return new Map(feature.options.map((option) => [option.key, total === 0 ? 0 : (option.share ?? rest) / total]));
}

function shareOfOptions(feature: Feature | undefined, wanted: readonly string[]): number {
  if (feature === undefined) return 0.5;
  const shares = optionShares(feature);
  return [...new Set(wanted)].reduce((sum, option) => sum + (shares.get(option) ?? 0), 0);
}
