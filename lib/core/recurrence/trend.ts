import { LEAST, type FaultRecord } from "./fault-records";
import type { FaultTimes } from "./fault-times";
import { laplace, type Laplace } from "./laplace";
import { milHdbk189, type MilHdbk189 } from "./mil-hdbk-189";
import { mtbfNowLimits } from "./mtbf-now-limits";
import { betaLimits, fitOfPowerLaw, powerLaw } from "./power-law";
import { reverseArrangements, type ReverseArrangements } from "./reverse-arrangements";
import { FEWEST_FAULTS, wearBounds, wearSums } from "./watch-levels";

/** The confidence of all limits that are shown. */
export const CONFIDENCE = 0.9;
/** Quiet for so many times the usual gap at the last fault is 1 in 20 if nothing had changed: e to the -3. */
const QUIET_GAPS = 3;

/**
 * "too-few": under four faults. "not-shown": no more than chance makes. "getting-worse": said, and it stands.
 * "was-getting-worse": said, but quiet since for longer than that rate allows.
 */
export type TrendVerdict = "too-few" | "not-shown" | "getting-worse" | "was-getting-worse";

export type Growth = {
  beta: number;
  betaLimits: [number, number];
  /** Hours (or days) between faults now. The upper limit is null where nothing bounds it. */
  mtbfNow: number;
  mtbfNowLimits: [number, number | null];
  /** false: the faults do not lie on a power law; something changed all at once. null: too few to say. */
  fits: boolean | null;
};

export type Trend = {
  verdict: TrendVerdict;
  /** With which fault it was first said; null: never. */
  saidAt: number | null;
  laplace: Laplace | null;
  chiSquare: MilHdbk189 | null;
  orders: ReverseArrangements | null;
  growth: Growth | null;
};

/** The record as the tests take it: it ends now, or at its last fault where that has only just been (rule T2). */
export function timesOf({ times, now, unit }: FaultRecord): FaultTimes {
  const justNow = times.length > 0 && now - (times.at(-1) ?? 0) < LEAST[unit];
  return { times, end: now, ended: justNow ? "failure" : "time" };
}

/**
 * Whether a record is getting worse (rules G1 to G6), with the numbers that are shown beside it.
 *
 * @param level what this record may spend of the chance of a false alarm, over its whole life
 */
export function trendOf(record: FaultRecord, level: number): Trend {
  const times = timesOf(record);
  const saidAt = firstAlarm(record, level);
  const enough = record.times.length >= FEWEST_FAULTS;
  return {
    verdict: !enough ? "too-few" : saidAt === null ? "not-shown" : isQuietSince(record) ? "was-getting-worse" : "getting-worse",
    saidAt,
    laplace: enough ? laplace(times) : null,
    chiSquare: enough ? milHdbk189(times) : null,
    orders: enough ? reverseArrangements(record.times) : null,
    growth: enough ? growthOf(times) : null,
  };
}

function firstAlarm({ times, unit }: FaultRecord, level: number): number | null {
  if (times.length < FEWEST_FAULTS || level <= 0) return null;
  const bounds = wearBounds(level, times.length);
  const sums = wearSums(times, LEAST[unit]);
  const at = bounds.findIndex((bound, faults) => (sums[faults - 2] ?? Infinity) <= bound);
  return at < 0 ? null : at;
}

function isQuietSince({ times, now }: FaultRecord): boolean {
  const last = times.at(-1) ?? 0;
  const then = powerLaw({ times, end: last, ended: "failure" });
  return then !== null && now - last > QUIET_GAPS * then.mtbfNow;
}

function growthOf(times: FaultTimes): Growth | null {
  const fit = powerLaw(times);
  const beta = betaLimits(times, CONFIDENCE);
  const mtbf = mtbfNowLimits(times, CONFIDENCE);
  if (!fit || !beta || !mtbf) return null;
  return {
    beta: fit.beta,
    betaLimits: beta,
    mtbfNow: fit.mtbfNow,
    mtbfNowLimits: [mtbf[0], Number.isFinite(mtbf[1]) ? mtbf[1] : null],
    fits: fitOfPowerLaw(times)?.fits ?? null,
  };
}
