import { believe } from "@/lib/core/diagnosis/believe";
import { compile } from "@/lib/core/diagnosis/compile";
import { COSTS } from "@/lib/core/diagnosis/costs";
import type { Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model, Setting } from "@/lib/core/diagnosis/model";
import { entropyOf } from "@/lib/core/diagnosis/outcomes";
import type { FaultTree } from "@/lib/core/tree/schema";
import { dice, placeOf, seedAt } from "../../support/dice";
import { shippedTree } from "../../support/shipped-tree";
import { minutesIfKnown } from "./known-cause";
import { drawLuck } from "./luck";
import { otherNumbers } from "./other-numbers";
import { play, type World } from "./play";
import type { Runs } from "./runs";
import { WAYS, type WayName } from "./ways";

const RUNS_A_TRUTH = 6;
const COSTS_OFF_BY = 1.65;
/** So often a person can not tell what is asked; the planner reckons with as much. */
const CANNOT_TELL = 0.1;

const PROFILE = { features: {}, figures: {}, healthy: {} };
const SETTINGS: readonly Setting[] = [
  { profile: PROFILE, situation: "alongside", person: "mechanic", faults: "one" },
  { profile: PROFILE, situation: "alongside", person: "skipper-in-port", faults: "one" },
  { profile: PROFILE, situation: "at-anchor", person: "skipper-at-sea", faults: "one" },
];

export type ShippedTask = {
  readonly kind: "shipped";
  readonly from: number;
  readonly to: number;
  readonly seed: number;
  readonly wrong: number;
  readonly refused: number;
  /** A call costs its price and no more, for whoever plans and in truth. */
  readonly bareCall: boolean;
};

/** Every way on the shipped tree, in worlds whose numbers are unlike its own. */
export async function shippedRuns({ from, to, seed, wrong, refused, bareCall }: ShippedTask): Promise<Runs> {
  const tree = await shippedTree();
  const priced = (model: Model): Model =>
    bareCall ? { ...model, helpersMinutes: new Float64Array(model.helpersMinutes.length), helperFinds: 0 } : model;
  const models = SETTINGS.map((setting) => priced(compile(tree, setting)));
  const runs: Runs = { group: [], minutes: { known: [] }, called: {} };
  const names = Object.keys(WAYS) as WayName[];
  let group = -1;
  let truths: Model[] = [];
  for (let run = from; run < to; run++) {
    const own = Math.floor(run / RUNS_A_TRUTH);
    if (own !== group) truths = SETTINGS.map((setting) => priced(compile(otherNumbers(tree, dice(seedAt(seed, own))), setting)));
    group = own;
    const model = models[run % models.length]!;
    const truth = truths[run % models.length]!;
    const { symptom, weights } = complaint(truth, tree, dice(seedAt(seed + 1, run)).roll());
    const luck = drawLuck(seedAt(seed + 2, run), weights, model.checks.length, model.remedies.length);
    const begin: Evidence = { symptoms: [{ symptom, present: true }], findings: [], remedies: [] };
    const world = worldFor(truth, seedAt(seed + 3, own), { wrong, refused: Math.max(refused, CANNOT_TELL) });
    runs.group.push(group);
    runs.minutes.known!.push(minutesIfKnown(truth, luck.truth));
    for (const name of names) {
      const { minutes, called } = play(WAYS[name], model, begin, world, luck);
      (runs.minutes[name] ??= []).push(minutes);
      (runs.called[name] ??= []).push(called ? 1 : 0);
    }
  }
  return runs;
}

/** A complaint, as often as engines in this world have it, and how likely each hypothesis then is. */
function complaint(truth: Model, tree: FaultTree, roll: number): { symptom: string; weights: Float64Array } {
  const weightsOf = (symptom: string): Float64Array =>
    truth.logPrior.map((log, index) => (index === truth.unknownAt ? 0 : Math.exp(log) * truth.symptoms.get(symptom)![index]!));
  const sums = tree.symptoms.map(({ key }) => weightsOf(key).reduce((sum, one) => sum + one, 0));
  const symptom = tree.symptoms[placeOf(sums, roll)]!.key;
  const { shares } = believe(truth, { symptoms: [{ symptom, present: true }], findings: [], remedies: [] });
  return { symptom, weights: shares };
}

function worldFor(truth: Model, seed: number, spoilt: Pick<World, "wrong" | "refused">): World {
  const { roll } = dice(seed);
  const times = new Map([...truth.checks, ...truth.remedies].map(({ key }) => [key, roll() < 0.5 ? COSTS_OFF_BY : 1 / COSTS_OFF_BY]));
  const temporary = new Set(truth.remedies.filter(({ remedy }) => remedy.temporary).map(({ key }) => key));
  return {
    ...spoilt,
    truth,
    times: (key) => times.get(key) ?? 1,
    // Whoever comes knows the true numbers, and has to find what is open by these.
    call: (evidence, at) => truth.callMinutes + truth.helpersMinutes[at]! + truth.helperFinds * entropyOf(believe(truth, evidence).shares),
    owed: (remedy) => (temporary.has(remedy) ? COSTS.heldOnly[truth.setting.situation] : 0),
  };
}
