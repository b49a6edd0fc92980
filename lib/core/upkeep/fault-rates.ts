import type { Watched } from "../recurrence/constant-rate";
import type { GammaRate } from "../statistics/gamma-poisson";
import type { FaultTree } from "../tree/schema";
import { BASE_RATES } from "../tree/strength";

/** Before any log: one fault of any kind in so many engine hours. Judgement, to be outweighed by the fleet's own hours. */
const HOURS_PER_FAULT = 150;
/** What that judgement is worth, in faults of the one cause. */
const WORTH = 0.5;
/** How unlike engines of a fleet are in their rate of one cause: the gamma shape about the fleet's. */
const SHAPE = 1;

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
  const fleet = (WORTH + others.faults) / (WORTH / guess + others.time);
  return { events: SHAPE + own.faults, exposure: SHAPE / fleet + own.time };
}
