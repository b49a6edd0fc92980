import type { FaultTree } from "../tree/schema";
import type { DiagnosisState } from "./fold";
import type { Setting } from "./model";

/** What the model is compiled for, with what "not fitted" says of the engine. Rules [F5], [F6]. */
export function settingOf(tree: FaultTree, state: DiagnosisState): Setting {
  const begun = state.begun?.payload;
  return {
    profile: { ...state.profile, features: { ...state.profile.features, ...notFitted(tree, state) } },
    situation: state.situation,
    person: begun?.person ?? "skipper-at-sea",
    multipliers: begun?.multipliers ?? [],
    notAboard: state.notAboard,
    // The price was set for where it began; elsewhere the table's holds.
    ...(begun?.callMinutes !== undefined && state.situation === begun.situation ? { callMinutes: begun.callMinutes } : {}),
  };
}

/** "Not fitted" tells a feature where just one option is left to it. */
function notFitted(tree: FaultTree, state: DiagnosisState): Record<string, string> {
  const told: Record<string, string> = {};
  for (const [key, event] of state.answers) {
    if (!("notFitted" in event.payload.answer)) continue;
    const wanted = Object.entries(tree.checks.find((check) => check.key === key)?.appliesTo?.features ?? {});
    const open = wanted.filter(([feature]) => state.profile.features[feature] === undefined);
    const [only] = open;
    if (!only || open.length > 1) continue;
    const others =
      tree.features.find((feature) => feature.key === only[0])?.options.filter((option) => !only[1].includes(option.key)) ?? [];
    const [left] = others;
    if (left && others.length === 1) told[only[0]] = left.key;
  }
  return told;
}
