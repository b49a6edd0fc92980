import { believe } from "./believe";
import { callingMinutes } from "./calling-minutes";
import { candidatesOf, SAME, type Candidate } from "./candidates";
import { standingMinutes } from "./costs";
import { AT_REST, type Evidence, type Standing } from "./evidence";
import { ExpectedCost, type BestTry } from "./expected-cost";
import { firstSteps, type Pinned } from "./first-steps";
import { Gates, type StepRef } from "./gates";
import { inTheDark } from "./in-the-dark";
import type { Model, RemedyModel } from "./model";
import { optionsOf } from "./options";
import { PlanAhead, type Act } from "./plan-ahead";
import { PlanChecks } from "./plan-checks";

/** So many of the most telling checks for their minutes are looked at one step ahead. */
const LOOKED_AT = 12;
/** Of these, so many are thought through further, beside the most telling. */
const THOUGHT_THROUGH = 2;
/** And so many remedies, those with the best cure chance per minute. */
const TRIED = 2;
/** Beliefs followed for each act that is thought through: as many as this pays for, in checks times hypotheses, within these limits. */
const WORK = 8000;
const BELIEFS = { least: 10, farEnough: 40, most: 150 };
/**
 * Checks that a plan may use later: so many of the most telling now, more where there are few hypotheses; and for each of so many of the
 * likeliest causes the one that shows it soonest.
 */
const LATER = { least: 16, most: 64, work: 500 };
const SHOWN_SOONEST = 8;
/** A remedy less likely than this to cure is a long shot: nothing is put off for it. */
const LONG_SHOT = 0.3;
/** So many minutes a look has to spare whoever is called, over its own: being asked is a burden too. */
const SPARES_LEAST = 2;
/** A cause under this share is left out of the reckoning, and at most so many are in it. */
const KEPT_FROM = 0.002;
const KEPT_MOST = 32;

type Chosen = { readonly act: Act; readonly value: number };

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
  /** At a call: the check that tells most for its minutes, else the best remedy, for whoever goes on all the same. */
  readonly goOn: NextStep | null;
};

/**
 * The step that makes the expected cost to a cured engine least: a check, a
 * remedy, or a call for help. One-step look-ahead over the dozen checks that
 * tell most for their minutes picks a few; these, the best remedy and a call
 * are then thought through. Rules [G1]-[G5], [N1]-[N12], [C8].
 */
export function nextStep(model: Model, evidence: Evidence): NextStep {
  const standing = evidence.standing ?? AT_REST;
  const { shares } = believe(model, evidence);
  const gates = new Gates(model, evidence, standing, shares);
  if (standing.mustCall) return { ...CALL, because: "clears-a-rule", minutes: model.callMinutes, expected: null, shares, goOn: null };
  const first = firstSteps(model, evidence, gates, shares, standing.clearing);
  if (!first) return reckoned(model, evidence, gates, shares);
  const gateTo = first.gateTo === null ? null : ({ kind: "check", key: first.gateTo } as const);
  const minutes = minutesOf(model, standing, first.ref);
  return { ...first.ref, because: first.because, gateTo, minutes, expected: null, shares, goOn: null };
}

const CALL = { kind: "call", key: "call", gateTo: null } as const;

function reckoned(model: Model, evidence: Evidence, gates: Gates, shares: Float64Array): NextStep {
  const standing = evidence.standing ?? AT_REST;
  const options = optionsOf(model, gates, standing);
  const candidates = candidatesOf(model, evidence, gates, shares);
  /** The act as a step, or what has to come before it. */
  const stepOf = (own: StepRef, gate: StepRef | null, because: Because, expected: number): NextStep => {
    const ref = gate ?? own;
    return { ...ref, because, gateTo: gate && own, minutes: minutesOf(model, standing, ref), expected, shares, goOn: null };
  };
  const asking = (candidate: Candidate, because: Because, expected: number): NextStep =>
    stepOf({ kind: "check", key: candidate.check.key }, candidate.gate, because, expected);
  const [mostTelling] = candidates;
  const dark = inTheDark(model, options, shares, candidates);
  if (mostTelling && dark !== null) return asking(mostTelling, "tells-most", dark);

  const kept = keptOf(model, shares);
  const weights = weightsOf(kept, shares);
  const cost = new ExpectedCost(options, model, kept);
  const trying = cost.from(weights);
  const ranked = cost.ranked(TRIED);
  const later = usable(candidates, weights, kept);
  const beliefs = Math.round(Math.min(BELIEFS.most, Math.max(BELIEFS.least, WORK / (kept.length * Math.max(1, later.length)))));
  const plan = new PlanAhead(new PlanChecks(later, kept), cost, weights, beliefs);
  const looks = later.slice(0, LOOKED_AT).map((_, place) => ({ place, value: plan.worthOf({ kind: "check", place }, 0) }));
  const thought = thoughtThrough(looks, ranked);
  const keyOf = ({ kind, place }: Act): string => (kind === "check" ? later[place]!.check.key : cost.options[place]!.remedy.key);
  let best: Chosen | null = null;
  for (const act of thought) {
    const value = plan.worthOf(act, beliefs);
    if (!best || value < best.value - SAME || (value < best.value + SAME && keyOf(act) < keyOf(best.act))) best = { act, value };
  }
  if (beliefs < BELIEFS.farEnough) best = putOff(best, plan, cost, weights, trying) ?? best;
  const actOf = ({ act, value }: Chosen): NextStep => {
    if (act.kind === "check") {
      const telling = looks[act.place]!.value < trying.minutes - SAME;
      return asking(later[act.place]!, telling ? "tells-most" : "cheaper-than-trying", value);
    }
    const { remedy } = cost.options[act.place]!;
    return stepOf({ kind: "remedy", key: remedy.key }, gateBefore(gates, remedy), "likely-cure", value);
  };
  const helpersMinutes = Float64Array.from(kept, (index) => model.helpersMinutes[index]!);
  const calling = callingMinutes({ callMinutes: model.callMinutes, helpersMinutes, helperFinds: model.helperFinds }, weights);
  if (best && best.value < calling - SAME) return actOf(best);
  const spares = mostSparing(model, candidates);
  if (spares) return asking(spares.candidate, "cheaper-than-trying", calling - spares.minutes);
  const [act] = thought;
  const goOn = act ? actOf({ act, value: plan.worthOf(act, 0) }) : null;
  return { ...CALL, because: "nothing-better", minutes: model.callMinutes, expected: calling, shares, goOn };
}

/** The check that spares whoever is called the most, over what it costs now: all hypotheses count, not only those thought through. Rule [C8]. */
function mostSparing(model: Model, candidates: readonly Candidate[]): { candidate: Candidate; minutes: number } | null {
  let best: { candidate: Candidate; minutes: number } | null = null;
  for (const candidate of candidates) {
    const minutes = model.helperFinds * candidate.information - candidate.minutes;
    if (minutes > (best?.minutes ?? SPARES_LEAST)) best = { candidate, minutes };
  }
  return best;
}

function gateBefore(gates: Gates, remedy: RemedyModel): StepRef | null {
  const gate = gates.gateOf(remedy);
  return gate.open || gate.shut ? null : gate.first;
}

function minutesOf(model: Model, standing: Standing, ref: StepRef): number {
  const step = ref.kind === "check" ? model.checks[model.checkAt.get(ref.key) ?? -1] : model.remedies[model.remedyAt.get(ref.key) ?? -1];
  return step ? step.minutes + standingMinutes("check" in step ? step.check : step.remedy, standing) : 0;
}

/** The most telling check first, then those that do best one step ahead, then the remedies with the best cure chance per minute. */
function thoughtThrough(looks: readonly { readonly place: number; readonly value: number }[], remedies: readonly number[]): readonly Act[] {
  const best = [...looks].sort((a, b) => a.value - b.value).slice(0, THOUGHT_THROUGH);
  const checks = [...new Set([...looks.slice(0, 1), ...best])].map(({ place }): Act => ({ kind: "check", place }));
  return [...checks, ...remedies.map((place): Act => ({ kind: "remedy", place }))];
}

/** The shares of the hypotheses that are kept, made to sum to 1. */
function weightsOf(kept: readonly number[], shares: Float64Array): Float64Array {
  const weights = Float64Array.from(kept, (index) => shares[index]!);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight) => weight / total);
}

/**
 * A check that would not change what is tried next is put off until the try has
 * failed: asked first it costs its minutes always, asked after only then. Both
 * ways are followed to the same depth. Where few beliefs can be followed the
 * plan does not see this by itself. Rule [N5].
 */
function putOff(best: Chosen | null, plan: PlanAhead, cost: ExpectedCost, weights: Float64Array, trying: BestTry): Chosen | null {
  const option = trying.option;
  if (best?.act.kind !== "check" || option === null || cost.chanceOf(option, weights) < LONG_SHOT) return null;
  const asking = plan.worthOf(best.act, 0);
  const after = plan.worthOf({ kind: "remedy", place: option }, 0, best.act);
  if (asking < after - SAME) return null;
  return { act: { kind: "remedy", place: option }, value: after };
}

/** The hypotheses that are reckoned with, likeliest first; the unknown always. */
function keptOf(model: Model, shares: Float64Array): readonly number[] {
  const keyOf = (index: number): string => model.causes[index]?.key ?? "";
  // Equal shares may differ in their last bits, which must not choose among them.
  const roundedOf = (index: number): number => Math.round(shares[index]! * 1e12);
  const kept = model.causes
    .map((_, index) => index)
    .filter((index) => shares[index]! >= KEPT_FROM)
    .sort((a, b) => roundedOf(b) - roundedOf(a) || (keyOf(a) < keyOf(b) ? -1 : 1));
  return [...kept.slice(0, KEPT_MOST), model.unknownAt];
}

/** Of all checks those that tell most now, and those that would show one of the likeliest causes soonest if it were the one. */
function usable(candidates: readonly Candidate[], weights: Float64Array, kept: readonly number[]): readonly Candidate[] {
  const count = Math.min(SHOWN_SOONEST, kept.length);
  const soonest = new Int32Array(count).fill(-1);
  const most = new Float64Array(count);
  const tells = new Float64Array(count);
  candidates.forEach(({ outcomes, minutes, learns }, candidate) => {
    tells.fill(0);
    for (const row of outcomes.predict) {
      let chance = 0;
      for (let place = 0; place < kept.length; place++) chance += weights[place]! * row[kept[place]!]!;
      for (let place = 0; place < count; place++) {
        const share = row[kept[place]!]!;
        if (share > 0) tells[place] = tells[place]! + share * Math.log(share / chance);
      }
    }
    for (let place = 0; place < count; place++) {
      const rate = (tells[place]! * learns) / minutes;
      if (rate <= most[place]!) continue;
      most[place] = rate;
      soonest[place] = candidate;
    }
  });
  const later = Math.min(LATER.most, Math.max(LATER.least, LATER.work / kept.length));
  return candidates.filter((_, place) => place < later || soonest.includes(place));
}
