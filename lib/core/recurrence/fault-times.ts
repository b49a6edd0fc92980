/**
 * When one fault was seen on one engine, counted from the beginning of the record, in hours (or days) of use; rising, all above 0.
 * `ended` "time": watched until `end`, whatever came. "failure": the record stops at its last fault, which then says only where it ends.
 */
export type FaultTimes = { readonly times: readonly number[]; readonly end: number; readonly ended: "time" | "failure" };

/** The times that carry evidence on the trend, and the end they are measured against (rule T1). */
export function informative({ times, end, ended }: FaultTimes): { times: readonly number[]; end: number } {
  return ended === "time" ? { times, end } : { times: times.slice(0, -1), end: times.at(-1) ?? end };
}

/** Hours between the faults, the first from the beginning of the record. */
export const gapsOf = (times: readonly number[]): number[] => times.map((time, i) => time - (times[i - 1] ?? 0));
