import type { FaultTree } from "@/lib/core/tree/schema";

export type Figure = { figure: string; value: number; bar?: number; holds?: boolean };

/**
 * The shipped tree is never to hold less than this; a fleet's own tree may be of any size.
 * Of 38 dangers known beforehand 23 stop, call or hand over, and 15 are cautions beside a step.
 * Readings: as many as tests/reference/known-readings.ts names.
 */
const AT_LEAST: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  "small-marine-diesel": {
    symptoms: 48,
    causes: 201,
    checks: 149,
    readings: 83,
    remedies: 102,
    cautions: 15,
    stopRules: 23,
    knownCases: 60,
    drawings: 20,
  },
};

/** No tree may have errors. */
const AT_MOST: Readonly<Record<string, number>> = { errors: 0 };

/** A figure beside its bar, where it has one. */
export function barred(figure: string, value: number, tree: Pick<FaultTree, "key"> | null): Figure {
  const most = AT_MOST[figure];
  if (most !== undefined) return { figure, value, bar: most, holds: value <= most };
  const least = AT_LEAST[tree?.key ?? ""]?.[figure];
  return least === undefined ? { figure, value } : { figure, value, bar: least, holds: value >= least };
}
