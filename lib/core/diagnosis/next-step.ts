import { believe } from "./believe";
import { callingMinutes } from "./calling-minutes";
import { candidatesOf, SAME, type Candidate } from "./candidates";
import { standingMinutes } from "./costs";
import { AT_REST, type Evidence } from "./evidence";
import { ExpectedCost, type BestTry } from "./expected-cost";
import { firstSteps, type Pinned } from "./first-steps";
import { Gates, type StepRef } from "./gates";
import type { Model } from "./model";
import { PlanAhead, type Act } from "./plan-ahead";

/** So many of the most telling checks for their minutes are looked at one step ahead. */
const LOOKED_AT = 12;
/** Of these, so many are thought through further, beside the most telling. */
const THOUGHT_THROUGH = 2;
/** Beliefs followed for each act that is thought through: as many as this pays for, in checks times hypotheses, within these limits. */
const WORK = 8000;
const BELIEFS = { least: 10, most: 40 };
/** Checks that a plan may use later: so many of the most telling now, and for each of so many of the likeliest causes the one that shows it soonest. */
const LATER = 16;
const SHOWN_SOONEST = 8;
/** A cause under this share is left out of the reckoning, and at most so many are in it. */
const KEPT_FROM = 0.002;
const KEPT_MOST = 32;
/** A remedy less likely than this to cure is a long shot: nothing is put off for it. */
const LONG_SHOT = 0.3;

type Chosen = { readonly act: Act; readonly value: number; readonly key: string };

export type Because = Pinned["because"] | "tells-most" | "cheaper-than-trying" | "likely-cure" | "nothing-better";

export type NextStep = {
  readonly kind: "check" | "remedy" | "call";
  /** The check's or remedy's key; "call" for a call. */
  readonly key: string;
  readonly because: Because;
  /** The step that this one opens the way to; null when it stands for itself. */
  readonly gateTo: StepRef | null;
  /** What it costs now, in minutes as the planner counts them. */
  readonly minutes: number;
  /** Expected minutes to a cured engine from here, this step first; null for a step that no reckoning chose. */
  readonly expected: number | null;
  readonly shares: Float64Array;
};

/**
 * The step that makes the expected cost to a cured engine least: a check, a
 * remedy, or a call for help. One-step look-ahead over the dozen checks that
 * tell most for their minutes picks a few; these, the best remedies and a call
 * are then thought through. Rules [G1]-[G5], [N1]-[N10].
 */
export function nextStep(model: Model, evidence: Evidence): NextStep {
  const standing = evidence.standing ?? AT_REST;
  const { shares } = believe(model, evidence);
  const gates = new Gates(model, evidence, standing, shares);
  const call = { kind: "call", key: "call", gateTo: null, minutes: model.callMinutes, shares } as const;
  const minutesOf = (ref: StepRef): number => {
    const step = ref.kind === "check" ? model.checks[model.checkAt.get(ref.key) ?? -1] : model.remedies[model.remedyAt.get(ref.key) ?? -1];
    return step ? step.minutes + standingMinutes("check" in step ? step.check : step.remedy, standing) : 0;
  };
  const first = standing.mustCall ? null : firstSteps(model, evidence, gates, shares, standing.clearing);
  if (first)
    return {
      ...first.ref,
      because: first.because,
      gateTo: first.gateTo === null ? null : { kind: "check", key: first.gateTo },
      minutes: minutesOf(first.ref),
      expected: null,
      shares,
    };
  if (standing.mustCall) return { ...call, because: "clears-a-rule", expected: null };

  const kept = keptOf(model, shares);
  const weights = Float64Array.from(kept, (index) => shares[index]!);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  weights.forEach((weight, place) => (weights[place] = weight / total));
  const cost = new ExpectedCost(model, gates, standing, kept);
  const trying = cost.from(weights);
  const candidates = usable(candidatesOf(model, evidence, gates, shares), weights, kept);
  const plan = new PlanAhead(candidates, cost, kept);
  const looks = candidates.slice(0, LOOKED_AT).map((_, place) => ({ place, value: plan.worthOf({ kind: "check", place }, weights, 0) }));
  const telling = [...looks].sort((a, b) => a.value - b.value).slice(0, THOUGHT_THROUGH);
  const acts: Act[] = [...new Set([0, ...telling.map(({ place }) => place)])]
    .filter((place) => place < candidates.length)
    .map((place) => ({ kind: "check", place }));
  if (trying.first !== null) acts.push({ kind: "remedy", place: trying.first });
  const beliefs = Math.round(Math.min(BELIEFS.most, Math.max(BELIEFS.least, WORK / (kept.length * Math.max(1, candidates.length)))));
  let best: Chosen | null = null;
  for (const act of acts) {
    const value = plan.worthOf(act, weights, beliefs);
    const key = act.kind === "check" ? candidates[act.place]!.check.key : model.remedies[cost.options[act.place]!.at]!.key;
    if (!best || value < best.value - SAME || (value < best.value + SAME && key < best.key)) best = { act, value, key };
  }
  best = putOff(best, plan, cost, weights, trying, model) ?? best;
  const helpersMinutes = Float64Array.from(kept, (index) => model.helpersMinutes[index]!);
  const calling = callingMinutes({ callMinutes: model.callMinutes, helpersMinutes }, weights);
  if (!best || best.value >= calling - SAME) return { ...call, because: "nothing-better", expected: calling };
  const own: StepRef = { kind: best.act.kind, key: best.key };
  if (best.act.kind === "check") {
    const { gate } = candidates[best.act.place]!;
    const alone = looks[best.act.place];
    const because = alone && alone.value < trying.minutes - SAME ? "tells-most" : "cheaper-than-trying";
    const ref = gate ?? own;
    return { ...ref, because, gateTo: gate ? own : null, minutes: minutesOf(ref), expected: best.value, shares };
  }
  const gate = gates.gateOf(model.remedies[model.remedyAt.get(best.key) ?? -1]!);
  const ref = gate.open || gate.shut ? own : gate.first;
  return { ...ref, because: "likely-cure", gateTo: ref === own ? null : own, minutes: minutesOf(ref), expected: best.value, shares };
}

/**
 * A check that would not change what is tried next is put off until the try has
 * failed: asked first it costs its minutes always, asked after only then. Both
 * ways are followed to the same depth. Rule [N5].
 */
function putOff(
  best: Chosen | null,
  plan: PlanAhead,
  cost: ExpectedCost,
  weights: Float64Array,
  trying: BestTry,
  model: Model,
): Chosen | null {
  const option = trying.option;
  if (best?.act.kind !== "check" || option === null || cost.chanceOf(option, weights) < LONG_SHOT) return null;
  const asking = plan.worthOf(best.act, weights, 0);
  const after = plan.worthOf({ kind: "remedy", place: option }, weights, 0, best.act);
  if (asking < after - SAME) return null;
  return { act: { kind: "remedy", place: option }, value: after, key: model.remedies[cost.options[option]!.at]!.key };
}

/** The hypotheses that are reckoned with, likeliest first; the unknown always. */
function keptOf(model: Model, shares: Float64Array): readonly number[] {
  const keyOf = (index: number): string => model.causes[index]?.key ?? "";
  const kept = model.causes
    .map((_, index) => index)
    .filter((index) => shares[index]! >= KEPT_FROM)
    .sort((a, b) => shares[b]! - shares[a]! || (keyOf(a) < keyOf(b) ? -1 : 1));
  return [...kept.slice(0, KEPT_MOST), model.unknownAt];
}

/** Of all checks those that tell most now, and those that would show one of the likeliest causes soonest if it were the one. */
function usable(candidates: readonly Candidate[], weights: Float64Array, kept: readonly number[]): readonly Candidate[] {
  const count = Math.min(SHOWN_SOONEST, kept.length);
  const soonest = new Int32Array(count).fill(-1);
  const most = new Float64Array(count);
  candidates.forEach(({ outcomes, minutes, learns }, candidate) => {
    const tells = new Float64Array(count);
    for (const row of outcomes.predict) {
      let chance = 0;
      for (let place = 0; place < kept.length; place++) chance += weights[place]! * row[kept[place]!]!;
      for (let place = 0; place < count; place++) tells[place] = tells[place]! + row[kept[place]!]! * Math.log(row[kept[place]!]! / chance);
    }
    for (let place = 0; place < count; place++) {
      const rate = (tells[place]! * learns) / minutes;
      if (rate <= most[place]!) continue;
      most[place] = rate;
      soonest[place] = candidate;
    }
  });
  return candidates.filter((_, place) => place < LATER || soonest.includes(place));
}
