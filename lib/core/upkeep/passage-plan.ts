import type { Watched } from "../recurrence/constant-rate";
import type { FaultTree, Cause } from "../tree/schema";
import { STRENGTHS } from "../tree/strength";
import { chanceEnough, certainly, enough, faultDemand, meanOf, together, type Demand } from "./demand";
import { dirtyLitres, elementsPerLitre, PASSED_ON, type DirtyTank } from "./dirty-tank";
import { rateOnEngine, treeRates } from "./fault-rates";
import { renewalsOnPassage } from "./renewals-on-passage";
import type { EngineNow } from "./standing-of-upkeep";
import type { UpkeepDone, UpkeepItem } from "./upkeep-item";

/** `counts`: of a cause, on this engine and on all others of the fleet together. */
export type PlannedEngine = {
  readonly id: string;
  readonly name: string;
  readonly cylinders: number;
  readonly now: EngineNow;
  readonly items: readonly UpkeepItem[];
  readonly done: readonly UpkeepDone[];
  readonly counts: (cause: string) => { own: Watched; others: Watched };
};

export type Passage = {
  readonly hours: number;
  readonly litres: number;
  readonly months: number;
  readonly dirtyTank?: DirtyTank | undefined;
};

/** What a part is needed for, and how many on average: the largest comes first and drives the number. */
export type Reason = {
  readonly kind: "upkeep" | "fault" | "dirty-tank";
  readonly title: string;
  readonly mean: number;
  readonly words: string;
};

export type PassageLine = {
  readonly part: string;
  readonly title: string;
  readonly mean: number;
  /** How many to carry to have enough 90, 95 and 99 times in 100. */
  readonly carry: { readonly at90: number; readonly at95: number; readonly at99: number };
  /** The chance that what is aboard is enough. */
  readonly enoughAboard: number;
  readonly aboard: number;
  readonly reasons: readonly Reason[];
};

type Need = { title: string; demand: Demand; reasons: Reason[] };

/**
 * How many of each spare to carry for a passage (rules P1 to P6): what falls due by upkeep for certain, faults that a crew can put right at
 * the rates of this engine and fleet, and elements for a dirty tank. Pure counting: what is not in a remedy or the plan is not on the list.
 *
 * @param engines those of one boat that take the same parts
 * @param aboard how many of a part are aboard, by its key
 */
export function planPassage(
  tree: Pick<FaultTree, "causes" | "remedies">,
  engines: readonly PlannedEngine[],
  passage: Passage,
  aboard: ReadonlyMap<string, number> = new Map(),
): PassageLine[] {
  const needs = new Map<string, Need>();
  const add = (part: string, title: string, demand: Demand, reason: Omit<Reason, "mean">) => {
    const need = needs.get(part) ?? { title, demand: certainly(0), reasons: [] };
    const mean = meanOf(demand);
    if (mean === 0) return;
    needs.set(part, { title: need.title, demand: together(need.demand, demand), reasons: [...need.reasons, { ...reason, mean }] });
  };
  const guesses = treeRates(tree);
  for (const engine of engines) {
    for (const item of engine.items) addRenewals(item, engine, passage, add);
    for (const cause of tree.causes) addFaults(cause, guesses.get(cause.key) ?? 0, tree, engine, passage, add);
  }
  if (passage.dirtyTank) addDirtyTank(passage.dirtyTank, passage.litres, engines, add);
  return [...needs]
    .map(([part, need]) => lineOf(part, need, aboard.get(part) ?? 0))
    .filter((line) => line.carry.at99 > 0 || line.aboard > 0)
    .sort((a, b) => b.mean - a.mean || (a.part < b.part ? -1 : 1));
}

type Add = (part: string, title: string, demand: Demand, reason: Omit<Reason, "mean">) => void;

function addRenewals(item: UpkeepItem, engine: PlannedEngine, passage: Passage, add: Add) {
  const times = renewalsOnPassage(item, engine.done, engine.now, passage);
  if (times === 0) return;
  for (const { key, title, quantity } of item.parts) {
    const each = quantity === "cylinders" ? engine.cylinders : quantity;
    add(key, title, certainly(Math.ceil(each * times)), {
      kind: "upkeep",
      title: item.title,
      words: `${item.title} falls due ${times === 1 ? "once" : `${times} times`}`,
    });
  }
}

function addFaults(cause: Cause, guess: number, tree: Pick<FaultTree, "remedies">, engine: PlannedEngine, passage: Passage, add: Add) {
  const remedy = crewRemedy(cause, tree);
  if (!remedy || guess <= 0) return;
  const { own, others } = engine.counts(cause.key);
  const rate = rateOnEngine(guess, others, own);
  const seen = own.faults + others.faults;
  const words =
    seen === 0
      ? `${cause.title}: not seen in this fleet, the tree's guess`
      : `${cause.title}: ${own.faults} on this engine in ${Math.round(own.time)} h, ${others.faults} on the fleet's others in ${Math.round(others.time)} h`;
  for (const { key, title, quantity } of remedy.parts)
    add(key, title, faultDemand(rate, passage.hours, quantity), { kind: "fault", title: cause.title, words });
}

/** The remedy that cures it most surely of those that a crew can do at sea and that use parts (rule P3). */
function crewRemedy(cause: Cause, { remedies }: Pick<FaultTree, "remedies">) {
  const strength = (key: string) => {
    const word = cause.curedBy[key];
    return word === undefined ? 0 : typeof word === "number" ? word : STRENGTHS[word];
  };
  return remedies
    .filter((remedy) => strength(remedy.key) > 0 && remedy.who === "skipper-at-sea" && remedy.parts.length > 0)
    .sort((a, b) => strength(b.key) - strength(a.key) || (a.key < b.key ? -1 : 1))[0];
}

function addDirtyTank(tank: DirtyTank, litres: number, engines: readonly PlannedEngine[], add: Add) {
  const dirty = dirtyLitres(tank, litres);
  const rate = elementsPerLitre(tank);
  for (const part of new Map(
    engines.flatMap(({ items }) => items.flatMap((item) => item.parts.map((one) => [one.key, one.title] as const))),
  )) {
    const passed = PASSED_ON[part[0]];
    if (passed === undefined || dirty === 0) continue;
    const counted = tank.seen
      ? `${tank.seen.elements} elements seen in ${Math.round(tank.seen.litres)} litres`
      : "nobody counted, so the usual element in 50 litres";
    add(part[0], part[1], faultDemand(rate, dirty * passed), {
      kind: "dirty-tank",
      title: "Dirty tank",
      words: `${Math.round(dirty)} litres of dirty fuel to burn through; ${counted}`,
    });
  }
}

function lineOf(part: string, { title, demand, reasons }: Need, aboard: number): PassageLine {
  return {
    part,
    title,
    mean: meanOf(demand),
    carry: { at90: enough(demand, 0.9), at95: enough(demand, 0.95), at99: enough(demand, 0.99) },
    aboard,
    enoughAboard: chanceEnough(demand, aboard),
    reasons: reasons.sort((a, b) => b.mean - a.mean),
  };
}
