import { chiSquareAbove, chiSquareBelow } from "../statistics/chi-square";
import { informative, type FaultTimes } from "./fault-times";

/**
 * The chi-square test of a constant rate against a power law: 2 sum ln(end / time) on 2n degrees of freedom, exact for every n.
 * `worsening`: the chance of so small a value at a constant rate; `improving`: of so large a one.
 * Source: MIL-HDBK-189, Reliability Growth Management, 1981; NIST/SEMATECH e-Handbook 8.2.3.4.
 */
export type MilHdbk189 = { x: number; degrees: number; worsening: number; improving: number };

/** null where nothing carries evidence. */
export const milHdbk189 = (record: FaultTimes): MilHdbk189 | null => pooledMilHdbk189([record]);

/** Several records under one question: each at a constant rate of its own. */
export function pooledMilHdbk189(records: readonly FaultTimes[]): MilHdbk189 | null {
  let x = 0;
  let degrees = 0;
  for (const { times, end } of records.map(informative)) {
    for (const time of times) x += 2 * Math.log(end / time);
    degrees += 2 * times.length;
  }
  if (degrees === 0) return null;
  return { x, degrees, worsening: chiSquareBelow(x, degrees), improving: chiSquareAbove(x, degrees) };
}
