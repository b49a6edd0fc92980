import { believe } from "./believe";
import { standingMinutes } from "./costs";
import { AT_REST, type Evidence } from "./evidence";
import { ExpectedCost } from "./expected-cost";
import { heard, reportedIn } from "./finding-weight";
import { firstSteps, type Pinned } from "./first-steps";
import { Gates, type StepRef } from "./gates";
import type { CheckModel, Model } from "./model";
import { entropyOf, informationOf, outcomesOf, type Outcomes } from "./outcomes";

/** So many of the most telling checks for their minutes are looked at in full. */
const LOOKED_AT = 12;
/** A remedy less likely than this to cure is a long shot. */
const LONG_SHOT = 0.3;
/** Under this, in nats, a check tells nothing worth a minute. */
const TELLS_NOTHING = 1e-4;
/** Values closer than this are the same; the key decides. */
const SAME = 1e-9;

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

type Candidate = {
  readonly check: CheckModel;
  readonly minutes: number;
  readonly outcomes: Outcomes;
  readonly information: number;
  readonly gate: StepRef | null;
};

/**
 * The step that makes the expected cost to a cured engine least: a check, a
 * remedy, or a call for help. One-step look-ahead over the dozen checks that
 * tell most for their minutes, over the order of cure chance per minute; where
 * it would give up or try a long shot while asking on is cheaper, it asks.
 * Rules [G1]-[G5], [N1]-[N8].
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

  const cost = new ExpectedCost(model, gates, standing);
  const candidates = candidatesOf(model, evidence, gates, shares);
  const trying = cost.from(shares);
  const asking = bestCheck(candidates, cost, shares, trying.minutes);
  const remedy = trying.remedy === null ? undefined : model.remedies[trying.remedy];
  const asked = (candidate: Candidate, because: Because, expected: number): NextStep => {
    const own: StepRef = { kind: "check", key: candidate.check.key };
    const ref = candidate.gate ?? own;
    return { ...ref, because, gateTo: candidate.gate ? own : null, minutes: minutesOf(ref), expected, shares };
  };
  if (asking && asking.value < trying.minutes - SAME) return asked(asking.candidate, "tells-most", asking.value);
  const guarded = cheaperToAsk(candidates, cost, shares, trying.minutes, remedy ? chanceOf(remedy.cure, shares) : 0);
  if (guarded) return asked(guarded.candidate, "cheaper-than-trying", guarded.value);
  if (!remedy) return { ...call, because: "nothing-better", expected: trying.minutes };
  const own: StepRef = { kind: "remedy", key: remedy.key };
  const gate = gates.gateOf(remedy);
  const ref = gate.open || gate.shut ? own : gate.first;
  return { ...ref, because: "likely-cure", gateTo: ref === own ? null : own, minutes: minutesOf(ref), expected: trying.minutes, shares };
}

function chanceOf(cure: Float64Array, shares: Float64Array): number {
  let chance = 0;
  for (let index = 0; index < cure.length; index++) chance += cure[index]! * shares[index]!;
  return chance;
}

/** Checks that could be asked now or after their gates, the most telling for their minutes first. */
function candidatesOf(model: Model, evidence: Evidence, gates: Gates, shares: Float64Array): readonly Candidate[] {
  const standing = evidence.standing ?? AT_REST;
  const reported = reportedIn(evidence);
  const seen = new Set(heard(model, evidence.findings).map((one) => one.check.check.sameSight));
  const all: Candidate[] = [];
  for (const check of model.checks) {
    if (!check.linked || gates.isDone({ kind: "check", key: check.key }) || !gates.isFeasible(check)) continue;
    if (check.check.sameSight !== undefined && seen.has(check.check.sameSight)) continue;
    const gate = gates.gateOf(check);
    if (!gate.open && gate.shut) continue;
    const outcomes = outcomesOf(model, check, reported);
    const information = informationOf(outcomes, shares) * check.share * (gate.open ? 1 : gate.pass);
    if (information < TELLS_NOTHING) continue;
    const minutes = check.minutes + standingMinutes(check.check, standing) + (gate.open ? 0 : gate.minutes);
    all.push({ check, minutes, outcomes, information, gate: gate.open ? null : gate.first });
  }
  const rate = (one: Candidate): number => one.information / one.minutes;
  return all.sort((a, b) => (Math.abs(rate(a) - rate(b)) > SAME ? rate(b) - rate(a) : a.check.key < b.check.key ? -1 : 1));
}

type Asking = { readonly candidate: Candidate; readonly value: number };

function bestCheck(candidates: readonly Candidate[], cost: ExpectedCost, shares: Float64Array, otherwise: number): Asking | null {
  let best: Asking | null = null;
  for (const candidate of candidates.slice(0, LOOKED_AT)) {
    const value = candidate.minutes + after(candidate, cost, shares, otherwise);
    if (!best || value < best.value - SAME || (value < best.value + SAME && candidate.check.key < best.candidate.check.key))
      best = { candidate, value };
  }
  return best;
}

/** Expected minutes that remain once the check is answered; where it is not fitted, nothing is learnt. */
function after({ check, outcomes }: Candidate, cost: ExpectedCost, shares: Float64Array, otherwise: number): number {
  const then = new Float64Array(shares.length);
  let sum = 0;
  outcomes.predict.forEach((row, finding) => {
    const weigh = outcomes.weigh[finding]!;
    let chance = 0;
    for (let index = 0; index < shares.length; index++) {
      chance += shares[index]! * row[index]!;
      then[index] = shares[index]! * weigh[index]!;
    }
    sum += chance * cost.from(then).minutes;
  });
  return check.share * sum + (1 - check.share) * otherwise;
}

/**
 * Guard against giving up too early. With a diffuse belief no single answer
 * changes the plan, so each looks worthless, though ten would settle it. If the
 * price of knowing (minutes a nat, times the nats that are open) and the cost
 * once known are less than the plan, the check with the best price is asked. Rule [N5].
 */
function cheaperToAsk(
  candidates: readonly Candidate[],
  cost: ExpectedCost,
  shares: Float64Array,
  plan: number,
  chance: number,
): Asking | null {
  const candidate = candidates[0];
  if (!candidate || chance >= LONG_SHOT) return null;
  const known = cost.known();
  let bound = 0;
  for (let index = 0; index < shares.length; index++) bound += shares[index]! * known[index]!;
  const value = bound + (candidate.minutes / candidate.information) * entropyOf(shares);
  return value < plan - SAME ? { candidate, value } : null;
}
