import type { Watched } from "../recurrence/constant-rate";
import type { GammaRate } from "../statistics/gamma-poisson";
import type { FaultTree } from "../tree/schema";
import { BASE_RATES } from "../tree/strength";

/** Before any log: one fault of any kind in so many engine hours. Judgement, to be outweighed by the fleet's own hours. */
const HOURS_PER_FAULT = 150;
/** That guess is worth so many hours of the fleet's running; the fleet's rate so many of the engine's own. Engines differ much: what keeps coming on one soon counts for more than all the others. */
const GUESS_HOURS = 500;
const FLEET_HOURS = 200;
/** Engines of a fleet are never taken to be more alike than this (gamma shape). */
const MOST_ALIKE = 1;

/** The tree's own guess at a cause's faults an hour: its share of the base weights. */
export function treeRates(tree: Pick<FaultTree, "causes">): Map<string, number> {
  const weight = (base: FaultTree["causes"][number]["base"]) => (typeof base === "number" ? base : BASE_RATES[base]);
  const total = tree.causes.reduce((sum, cause) => sum + weight(cause.base), 0);
  return new Map(tree.causes.map((cause) => [cause.key, weight(cause.base) / total / HOURS_PER_FAULT]));
}

/**
 * This engine's rate of one cause as a gamma distribution: the tree's guess, outweighed by the other engines' faults and hours, then by this one's (rule P3).
 *
 * @param guess faults an hour, above 0
 */
export function rateOnEngine(guess: number, others: Watched, own: Watched): GammaRate {
  const fleet = (GUESS_HOURS * guess + others.faults) / (GUESS_HOURS + others.time);
  const events = Math.min(MOST_ALIKE, FLEET_HOURS * fleet);
  return { events: events + own.faults, exposure: events / fleet + own.time };
}
