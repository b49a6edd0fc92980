import { believe } from "@/lib/core/diagnosis/believe";
import { candidatesOf, type Candidate } from "@/lib/core/diagnosis/candidates";
import { AT_REST, type Evidence } from "@/lib/core/diagnosis/evidence";
import { ExpectedCost } from "@/lib/core/diagnosis/expected-cost";
import { Gates } from "@/lib/core/diagnosis/gates";
import type { CheckModel, Model, RemedyModel } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { optionsOf } from "@/lib/core/diagnosis/options";
import type { Act, Way } from "./play";

/** The planner itself. */
export const planner: Way = (model, evidence) => nextStep(model, evidence);

/** Nothing is asked: remedies in the order of cure chance per minute, a call where that is cheaper. */
export const curePerCost: Way = (model, evidence) => {
  const { cost, shares, gates } = look(model, evidence);
  const { option } = cost.from(shares);
  return option === null ? CALL : opened(gates, model.remedies[cost.options[option]!.at]!);
};

/** Nothing is asked: remedies of the causes in the order of how common they are with these symptoms, a call once its price is spent. */
export const baseRateOrder: Way = (model, evidence, spent) => {
  const gates = gatesOf(model, evidence);
  if (spent >= model.callMinutes) return CALL;
  const next = baseRateRemedies(model, evidence).find((remedy) => isOpenTo(gates, remedy, "remedy"));
  return next ? opened(gates, next) : CALL;
};

/** A third of the checks that bear on the complaint in the order of the list, pins first; then as above. */
export const chartOrder: Way = (model, evidence, spent) => {
  const gates = gatesOf(model, evidence);
  const next = chartOf(model, evidence).find((check) => isOpenTo(gates, check, "check"));
  return next ? opened(gates, next) : curePerCost(model, evidence, spent);
};

/** So sure of one cause, asking for information's sake stops. */
const SURE = 0.8;

/** What tells most for its minutes, until one cause is nearly sure or nothing tells more; then as above. */
export const informationPerCost: Way = (model, evidence, spent) => {
  const { shares, candidates } = look(model, evidence);
  const [first] = candidates;
  return first && !shares.some((share) => share >= SURE) ? asked(first) : curePerCost(model, evidence, spent);
};

/** Looked at one step ahead: so many of the most telling for their minutes. */
const LOOKED_AT = 12;

/** Of the dozen checks that tell most for their minutes the one after which the cure order is cheapest, if any is cheaper than the cure order now. */
export const lookAhead: Way = (model, evidence, spent) => {
  const { shares, candidates, cost } = look(model, evidence);
  let best: Candidate | null = null;
  let least = cost.from(shares).minutes;
  for (const candidate of candidates.slice(0, LOOKED_AT)) {
    const minutes = costAfter(candidate, cost, shares);
    if (minutes < least) [best, least] = [candidate, minutes];
  }
  return best ? asked(best) : curePerCost(model, evidence, spent);
};

function costAfter({ minutes, learns, outcomes }: Candidate, cost: ExpectedCost, shares: Float64Array): number {
  const after = outcomes.predict.reduce((sum, row, finding) => {
    const weights = shares.map((share, index) => share * outcomes.weigh[finding]![index]!);
    let chance = 0;
    for (let index = 0; index < row.length; index++) chance += shares[index]! * row[index]!;
    return sum + chance * cost.from(weights).minutes;
  }, 0);
  return minutes + learns * after + (1 - learns) * cost.from(shares).minutes;
}

const CALL: Act = { kind: "call", key: "call" };

const gatesOf = (model: Model, evidence: Evidence): Gates =>
  new Gates(model, evidence, evidence.standing ?? AT_REST, believe(model, evidence).shares);

function look(model: Model, evidence: Evidence) {
  const { shares } = believe(model, evidence);
  const gates = new Gates(model, evidence, evidence.standing ?? AT_REST, shares);
  const every = Array.from(shares, (_, index) => index);
  const cost = new ExpectedCost(optionsOf(model, gates, evidence.standing ?? AT_REST), model, every);
  return { shares, gates, cost, candidates: candidatesOf(model, evidence, gates, shares) };
}

const asked = ({ check, gate }: Candidate): Act => gate ?? { kind: "check", key: check.key };

function opened(gates: Gates, step: CheckModel | RemedyModel): Act {
  const gate = gates.gateOf(step);
  const own: Act = { kind: "check" in step ? "check" : "remedy", key: step.key };
  return gate.open || gate.shut ? own : gate.first;
}

function isOpenTo(gates: Gates, step: CheckModel | RemedyModel, kind: "check" | "remedy"): boolean {
  const gate = gates.gateOf(step);
  return !gates.isDone({ kind, key: step.key }) && gates.isFeasible(step) && (gate.open || !gate.shut);
}

const sharesOnSymptoms = (model: Model, evidence: Evidence): Float64Array =>
  believe(model, { symptoms: evidence.symptoms, findings: [], remedies: [] }).shares;

/** Lists that hang on the complaint alone are made once for it. */
function keptFor<T>(make: (model: Model, evidence: Evidence) => T): (model: Model, evidence: Evidence) => T {
  const kept = new WeakMap<Model, Map<string, T>>();
  return (model, evidence) => {
    const ofModel = kept.get(model) ?? new Map<string, T>();
    kept.set(model, ofModel);
    const key = evidence.symptoms.map(({ symptom, present }) => `${symptom}:${present}`).join();
    const made = ofModel.get(key) ?? make(model, evidence);
    ofModel.set(key, made);
    return made;
  };
}

const baseRateRemedies = keptFor((model, evidence): readonly RemedyModel[] => {
  const shares = sharesOnSymptoms(model, evidence);
  const causes = model.causes.map((_, index) => index).sort((a, b) => shares[b]! - shares[a]! || a - b);
  const curing = (cause: number): readonly RemedyModel[] =>
    model.remedies.filter(({ linkedAt }) => linkedAt.includes(cause)).sort((a, b) => b.cure[cause]! - a.cure[cause]!);
  return [...new Set(causes.flatMap(curing))];
});

/** A cause under this share does not bring its checks onto the chart. */
const ON_THE_CHART = 0.01;

const chartOf = keptFor((model, evidence): readonly CheckModel[] => {
  const shares = sharesOnSymptoms(model, evidence);
  const told = evidence.symptoms.filter(({ present }) => present).map(({ symptom }) => symptom);
  const pinOf = ({ check }: CheckModel): number => Math.min(Infinity, ...told.map((symptom) => check.firstFor[symptom] ?? Infinity));
  const bears = ({ check }: CheckModel): boolean =>
    told.length === 0 || model.causes.some((cause, index) => shares[index]! > ON_THE_CHART && cause.gives[check.key] !== undefined);
  const pins = model.checks.filter((check) => pinOf(check) < Infinity).sort((a, b) => pinOf(a) - pinOf(b));
  const others = model.checks.filter((check) => pinOf(check) === Infinity && check.linked && bears(check));
  return [...pins, ...others.slice(0, Math.ceil(others.length / 3))];
});

export const WAYS = { chartOrder, baseRateOrder, curePerCost, informationPerCost, lookAhead, planner } as const;
export type WayName = keyof typeof WAYS;
