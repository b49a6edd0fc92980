import { shareOfEngines } from "../tree/applies";
import type { Cause, Check, FaultTree, Remedy, Situation } from "../tree/schema";
import { BASE_RATES } from "../tree/strength";
import { treatedAsRail } from "../tree/treated-as-rail";
import { probabilityOf } from "./cause-row";
import { compileCheck } from "./compile-check";
import { compilePairs } from "./compile-pairs";
import { COSTS, fixedMinutes } from "./costs";
import type { Model, RemedyModel, Setting, StepModel } from "./model";
import { symptomShares } from "./symptom-shares";
import { whoMay } from "./who-may";

/** Prior share of "something not in this tree". */
export const UNKNOWN = 0.05;
/** Prior share of all pairs together. */
const PAIRS = 0.1;
/** A remedy cures a cause that it has no link to 1 time in 100. */
const UNLINKED_CURE = 0.01;
/** "Better, not cured" is as likely as a fifth of a cure where there is one cause only. */
const BETTER = 0.2;
/** A person is taken to tell nine answers of ten; that weighs as much as five questions asked. Rule [N10]. */
const TELLS = { told: 4.5, asked: 5 } as const;
/** Even what is not in the tree can get a little better by chance. */
const BETTER_LEAST = 0.002;

/**
 * Makes a tree ready for arithmetic: what does not apply to this engine here is
 * left out, words become numbers, and "something not in this tree" joins as the
 * last single hypothesis; pairs of causes stand beside. Rules [B1]-[B4], [K1], [M1], [W1]-[W5]; rows [L1]-[L6]; symptoms [S1]-[S3].
 */
export function compile(tree: FaultTree, setting: Setting): Model {
  const shareFor = (node: { appliesTo?: Cause["appliesTo"] }): number =>
    shareOfEngines(node.appliesTo, setting.profile, setting.situation, tree.features);
  const causes = tree.causes.filter((cause) => weightOf(cause, shareFor(cause), setting) > 0);
  const weights = Float64Array.from(causes, (cause) => weightOf(cause, shareFor(cause), setting));
  const pairs = setting.faults === "one" ? null : compilePairs(tree, causes, weights, setting, PAIRS);
  const prior = withUnknown(weights, pairs ? PAIRS : 0);
  // What cannot be done in this situation may have been done in another, and told: it is compiled, and not offered. Rule [W4].
  const stepOf = (step: Check | Remedy): StepModel =>
    stepModel(step, shareFor({ appliesTo: step.appliesTo && { ...step.appliesTo, situations: undefined } }), setting);
  const checks = tree.checks
    .map((check) => ({ check, step: stepOf(check) }))
    .filter(({ step }) => step.share > 0)
    .map(({ check, step }) => compileCheck(check, step, causes, prior));
  const remedies = tree.remedies.map((remedy) => compileRemedy(remedy, stepOf(remedy), causes)).filter((remedy) => remedy.share > 0);
  const symptoms = new Map(tree.symptoms.map(({ key }) => [key, withUnknownPlace(symptomShares(key, causes, weights).shares)]));
  return {
    tree,
    setting,
    causes,
    hypotheses: [...causes.map((cause) => [cause.key]), []],
    causeAt: placesOf(causes),
    unknownAt: causes.length,
    logPrior: prior.map(Math.log),
    pairs,
    logPriorOfCauses: Math.log1p(-(prior[causes.length] ?? 0)),
    symptoms,
    logSymptoms: new Map(
      [...symptoms].map(([key, row]) => [key, { present: row.map(Math.log), absent: row.map((share) => Math.log1p(-share)) }]),
    ),
    checks,
    checkAt: placesOf(checks),
    remedies,
    remedyAt: placesOf(remedies),
    callMinutes: setting.callMinutes ?? COSTS.call[setting.situation],
    helpersMinutes: helpersMinutes(remedies, prior, setting.situation),
    helperFinds: COSTS.helperFinds,
    tells: TELLS,
  };
}

const placesOf = (items: readonly { key: string }[]): ReadonlyMap<string, number> => new Map(items.map((item, index) => [item.key, index]));

const baseOf = (base: Cause["base"]): number => (typeof base === "number" ? base : BASE_RATES[base]);

/** Base rate among the engines it applies to, times their share, times what this engine's log says. */
function weightOf(cause: Cause, share: number, setting: Setting): number {
  const moved = setting.multipliers?.find((multiplier) => multiplier.cause === cause.key)?.times ?? 1;
  return baseOf(cause.base) * share * moved;
}

/** Shares of the single causes and, last, the unknown; `pairs` is kept for the pairs. */
function withUnknown(weights: Float64Array, pairs: number): Float64Array {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const prior = new Float64Array(weights.length + 1);
  weights.forEach((weight, index) => (prior[index] = (weight / total) * (1 - UNKNOWN - pairs)));
  // A tree with nothing that applies still has its unknown.
  prior[weights.length] = weights.length > 0 ? UNKNOWN : 1;
  return prior;
}

function withUnknownPlace(shares: Float64Array): Float64Array {
  const all = new Float64Array(shares.length + 1).fill(1);
  all.set(shares);
  return all;
}

function stepModel(step: Check | Remedy, share: number, setting: Setting): StepModel {
  const missing = isMissing(step, setting.notAboard ?? []);
  const alongside = setting.situation === "alongside";
  const here = step.appliesTo?.situations?.includes(setting.situation) ?? true;
  const unionsAllowed = !step.flags.opensHighPressureFuel || !treatedAsRail(setting.profile);
  return {
    key: step.key,
    share,
    here,
    offered:
      here && unionsAllowed && fuelAllowed(step, setting) && whoMay(step, setting.person, setting.situation) && (!missing || alongside),
    minutes: fixedMinutes(step, setting.situation) + (missing && alongside ? COSTS.fetchAlongside : 0),
  };
}

/**
 * A step that opens clean fuel and goes by the kind of injection is one that
 * must not be done on the wrong kind: while it is not known, nobody short of a
 * workshop is asked to; a skipper neither on what is, or may be, rail. Rule [W5].
 */
function fuelAllowed(step: Check | Remedy, { profile, person }: Setting): boolean {
  if (!step.flags.opensFuelClean || step.appliesTo?.features?.injection === undefined || person === "workshop") return true;
  return person === "mechanic" ? profile.features.injection !== undefined : !treatedAsRail(profile);
}

function isMissing(step: Check | Remedy, notAboard: readonly string[]): boolean {
  const parts = "parts" in step ? step.parts.flatMap((part) => [part.key, part.title]) : [];
  return [...step.tools, ...parts].some((item) => notAboard.includes(item));
}

function compileRemedy(remedy: Remedy, step: StepModel, causes: readonly Cause[]): RemedyModel {
  const cure = new Float64Array(causes.length + 1).fill(UNLINKED_CURE);
  // Nothing in the tree cures what is not in the tree.
  cure[causes.length] = 0;
  const linkedAt: number[] = [];
  causes.forEach((cause, index) => {
    const strength = cause.curedBy[remedy.key];
    if (strength === undefined) return;
    cure[index] = probabilityOf(strength);
    linkedAt.push(index);
  });
  const logResults = {
    cured: cure.map(Math.log),
    better: cure.map((chance) => Math.log(Math.max(BETTER_LEAST, BETTER * chance))),
    "no-change": cure.map((chance) => Math.log1p(-chance)),
  };
  return {
    ...step,
    remedy,
    cure,
    logResults,
    linkedAt: Int32Array.from(linkedAt),
    linkedCure: Float64Array.from(linkedAt, (index) => cure[index] ?? 0),
  };
}

/**
 * What whoever is called still has to do: the least work that puts the cause
 * right, with all tools at hand; for what is not in the tree, or has no remedy
 * in it, the mean. Rule [C7].
 */
function helpersMinutes(remedies: readonly RemedyModel[], prior: Float64Array, situation: Situation): Float64Array {
  const least = new Float64Array(prior.length).fill(Infinity);
  for (const { remedy, linkedAt, linkedCure } of remedies) {
    if (remedy.temporary) continue;
    linkedAt.forEach((at, link) => (least[at] = Math.min(least[at]!, fixedMinutes(remedy, situation) / (linkedCure[link] ?? 0))));
  }
  let sum = 0;
  let total = 0;
  least.forEach((minutes, index) => {
    if (minutes === Infinity) return;
    sum += minutes * prior[index]!;
    total += prior[index]!;
  });
  const mean = total > 0 ? sum / total : 0;
  return least.map((minutes) => (minutes === Infinity ? mean : minutes));
}
