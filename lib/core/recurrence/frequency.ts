import { poissonAtLeast } from "../statistics/poisson";
import { mtbfLimits } from "./constant-rate";
import type { FaultRecord } from "./fault-records";
import { atLeastInFleet, type FleetRate } from "./fleet-rate";
import { CONFIDENCE, timesOf } from "./trend";
import { FEWEST_FAULTS } from "./watch-levels";

/** "no-fleet": no other engine to compare with. "oftener": more than the fleet's own rate makes by chance. */
export type FrequencyVerdict = "no-fleet" | "too-few" | "not-shown" | "oftener";

export type Frequency = {
  verdict: FrequencyVerdict;
  count: number;
  /** Hours (or days) watched. */
  time: number;
  /** Hours (or days) between faults at a constant rate, and its limits; null where nothing bounds it. */
  mtbf: number | null;
  mtbfLimits: [number, number | null];
  /** How many the fleet's own rate would make in that time. */
  expected: number | null;
  /** P(so many or more): the fleet's rate taken as it stands, and with what is not known of it. */
  byPoisson: number | null;
  byChance: number | null;
};

/**
 * How often the fault comes, against the rate among the other engines (rules F1 to F3).
 *
 * @param level what this record may spend of the chance of a false "oftener", over its whole life
 */
export function frequencyOf(record: FaultRecord, fleet: FleetRate | null, level: number): Frequency {
  const count = record.times.length;
  const time = record.now;
  const [low, high] = mtbfLimits(count, time, timesOf(record).ended, CONFIDENCE);
  const expected = fleet && fleet.mean * time;
  return {
    verdict: !fleet ? "no-fleet" : count < FEWEST_FAULTS ? "too-few" : isOftener(record, fleet, level) ? "oftener" : "not-shown",
    count,
    time,
    mtbf: count > 0 ? time / count : null,
    mtbfLimits: [low, Number.isFinite(high) ? high : null],
    expected,
    byPoisson: expected === null ? null : poissonAtLeast(count, expected),
    byChance: fleet && atLeastInFleet(count, fleet, time),
  };
}

/** Looked at with the 4th, 8th, 16th ... fault, half of what is left spent each time (rule F3). */
function isOftener({ times }: FaultRecord, fleet: FleetRate, level: number): boolean {
  let allowance = level / 2;
  for (let n = FEWEST_FAULTS; n <= times.length; n *= 2, allowance /= 2) {
    if (atLeastInFleet(n, fleet, times[n - 1] ?? 0) <= allowance) return true;
  }
  return false;
}
