import type { Multiplier } from "../contract/event";
import type { LogEntry } from "../contract/log";
import type { FaultTree } from "../tree/schema";
import { BASE_RATES } from "../tree/strength";

/** How much engines differ: the shape of the gamma distribution of an engine's own rate about the fleet's, mean 1. */
const SHAPE = 0.5;
/** No log moves a cause further than this. */
const MOST = 5;

/**
 * By how much this engine's log moves the odds of its causes before the first
 * question: each cause cured or held here before, its count shrunk to what any
 * engine with so many faults would have had. With a gamma prior of mean 1 the
 * expected factor is (shape + seen) / (shape + expected) (gamma-Poisson). Rule [B3].
 *
 * @param log the engine's own entries, in any order.
 * @returns one multiplier a cause that was here before, between 1 and 5, with its reason in words.
 */
export function multipliersFor(tree: FaultTree, log: readonly LogEntry[]): Multiplier[] {
  const found = log.filter((entry) => (entry.outcome === "cured" || entry.outcome === "held") && entry.cause?.key);
  const total = tree.causes.reduce((sum, cause) => sum + baseOf(cause.base), 0);
  return tree.causes.flatMap((cause) => {
    const here = found.filter((entry) => entry.cause?.key === cause.key);
    if (here.length === 0) return [];
    const expected = (found.length * baseOf(cause.base)) / total;
    const times = (SHAPE + here.length) / (SHAPE + expected);
    return [{ cause: cause.key, times: Math.min(MOST, Math.max(1, times)), reason: reasonFor(here) }];
  });
}

const baseOf = (base: FaultTree["causes"][number]["base"]): number => (typeof base === "number" ? base : BASE_RATES[base]);

function reasonFor(here: readonly LogEntry[]): string {
  const hours = here.flatMap((entry) => (entry.engineHours === null ? [] : [entry.engineHours])).sort((a, b) => b - a)[0];
  const count = here.length === 1 ? "Found on this engine once before" : `Found on this engine ${here.length} times before`;
  return hours === undefined ? `${count}.` : `${count}, last at ${Math.round(hours)} h.`;
}
