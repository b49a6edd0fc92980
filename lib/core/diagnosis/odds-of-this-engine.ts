import type { Multiplier } from "../contract/event";
import type { LogEntry } from "../contract/log";
import type { FaultTree } from "../tree/schema";
import { BASE_RATES } from "../tree/strength";
import { movedByService, type EngineNow, type Moved } from "./odds-by-service";

/** How much engines differ: the shape of the gamma distribution of an engine's own rate about the fleet's, mean 1. */
const SHAPE = 0.5;
/** Fleets differ less from the trade than engines from their fleet. */
const FLEET_SHAPE = 2;
/** No log moves a cause further than this, either way. */
const MOST = 5;
/** What moves it less is no reason. */
const WORTH_SAYING = 1.1;

export type OddsKnown = {
  /** Absent: how long ago a service was is not reckoned with. */
  readonly now?: EngineNow;
  /** Entries of the fleet's other engines. */
  readonly fleet?: readonly LogEntry[];
};

/**
 * By how much the log moves the odds of this engine's causes before the first
 * question: each cause that the fleet's other engines had more or less often
 * than their kind, that was cured or held here before, or whose service is
 * fresh or overdue. Counts are shrunk to what would be expected: with a gamma
 * prior of mean 1 the factor is (shape + seen) / (shape + expected)
 * (gamma-Poisson). Rules [B3], [B6].
 *
 * @param log the engine's own entries, in any order.
 * @returns one multiplier a cause that is moved, between 1/5 and 5, with its reasons in words.
 */
export function multipliersFor(tree: FaultTree, log: readonly LogEntry[], { now, fleet = [] }: OddsKnown = {}): Multiplier[] {
  const here = foundIn(log);
  const elsewhere = foundIn(fleet);
  const total = tree.causes.reduce((sum, cause) => sum + baseOf(cause.base), 0);
  const byService = now ? movedByService(tree, log, now) : new Map<string, Moved>();
  return tree.causes.flatMap((cause) => {
    const share = baseOf(cause.base) / total;
    const inFleet = movedByFleet(cause.key, elsewhere, share);
    const reasons = [inFleet, movedHere(cause.key, here, share * inFleet.times), byService.get(cause.key)].flatMap((one) =>
      one && Math.max(one.times, 1 / one.times) > WORTH_SAYING ? [one] : [],
    );
    if (reasons.length === 0) return [];
    const times = reasons.reduce((product, one) => product * one.times, 1);
    const reason = reasons.map((one) => one.reason).join(" ");
    return [{ cause: cause.key, times: Math.min(MOST, Math.max(1 / MOST, times)), reason: reason.slice(0, 200) }];
  });
}

const foundIn = (log: readonly LogEntry[]): readonly LogEntry[] =>
  log.filter((entry) => (entry.outcome === "cured" || entry.outcome === "held") && entry.cause?.key);

const baseOf = (base: FaultTree["causes"][number]["base"]): number => (typeof base === "number" ? base : BASE_RATES[base]);

const of = (cause: string, found: readonly LogEntry[]): readonly LogEntry[] => found.filter((entry) => entry.cause?.key === cause);

const shrunk = (shape: number, seen: number, expected: number): number => (shape + seen) / (shape + expected);

function movedByFleet(cause: string, fleet: readonly LogEntry[], share: number): Moved {
  const seen = of(cause, fleet).length;
  const expected = fleet.length * share;
  const count = seen === 0 ? "Not found" : seen === 1 ? "Found once" : `Found ${seen} times`;
  const usual = expected < 0.5 ? "under one" : `about ${Math.round(expected)}`;
  return {
    times: shrunk(FLEET_SHAPE, seen, expected),
    reason: `${count} among ${fleet.length} faults of the fleet\u2019s other engines, where ${usual} would be usual.`,
  };
}

/** Never down: that an engine did not have a cause before says little. */
function movedHere(cause: string, log: readonly LogEntry[], share: number): Moved {
  const here = of(cause, log);
  if (here.length === 0) return { times: 1, reason: "" };
  return { times: Math.max(1, shrunk(SHAPE, here.length, log.length * share)), reason: reasonFor(here) };
}

function reasonFor(here: readonly LogEntry[]): string {
  const hours = here.flatMap((entry) => (entry.engineHours === null ? [] : [entry.engineHours])).sort((a, b) => b - a)[0];
  const count = here.length === 1 ? "Found on this engine once before" : `Found on this engine ${here.length} times before`;
  return hours === undefined ? `${count}.` : `${count}, last at ${Math.round(hours)} h.`;
}
