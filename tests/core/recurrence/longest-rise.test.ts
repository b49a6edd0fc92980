import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { longestRise } from "../../../lib/core/recurrence/longest-rise";

type Reading = { id: number; reading: number };
const stretchOf = (values: readonly number[]): Reading[] => values.map((reading, id) => ({ id, reading }));

/** The rule as it is said, by trying every join: of equal runs the one with the later readings. */
function byTrying(stretch: readonly Reading[], keepFirst: boolean): Reading[] {
  const longer = (runs: Reading[][]) => runs.reduce<Reading[]>((best, run) => (run.length >= best.length ? run : best), []);
  const runs: Reading[][] = [];
  for (const reading of stretch) runs.push([...longer(runs.filter((run) => (run.at(-1)?.reading ?? 0) <= reading.reading)), reading]);
  return longer(keepFirst ? runs.filter((run) => run[0] === stretch[0]) : runs);
}

describe("longestRise", () => {
  it("[H4] is what trying every join finds", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 12 }), { maxLength: 25 }), fc.boolean(), (values, keepFirst) => {
        const stretch = stretchOf(values);
        expect(longestRise(stretch, keepFirst)).toEqual(byTrying(stretch, keepFirst));
      }),
      { seed: 4, numRuns: 2000 },
    );
  });

  it("takes the readings of many years without ado", () => {
    const stretch = stretchOf(Array.from({ length: 50_000 }, (_, i) => (i % 10 === 0 ? 0 : i)));
    expect(longestRise(stretch, false)).toHaveLength(45_001);
  });
});
