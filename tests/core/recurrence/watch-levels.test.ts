import { describe, expect, test } from "vitest";
import { shareOfRecord, spentAt, spentBy, wearBounds, wearSums } from "../../../lib/core/recurrence/watch-levels";
import { milHdbk189 } from "../../../lib/core/recurrence/mil-hdbk-189";
import { chiSquareBelow } from "../../../lib/core/statistics/chi-square";
import { dice } from "../../support/simulated-fleet";

describe("the level that is held over an engine's life", () => {
  test("G3: the wear sum is half of the chi-square of the record that ends at that fault", () => {
    const times = [30, 75, 160, 210, 238, 260];
    const sums = wearSums(times, 1e-9);
    for (const [i, sum] of sums.entries()) {
      const until = times.slice(0, i + 2);
      expect(2 * sum).toBeCloseTo(milHdbk189({ times: until, end: until.at(-1) ?? 0, ended: "failure" })?.x ?? NaN, 12);
    }
  });
  test("G3: gaps shorter than the meter can tell count as what it can tell", () => {
    expect(wearSums([10, 10, 10], 1)).toEqual(wearSums([10, 11, 11], 1).map((sum, i) => (i === 0 ? sum : expect.any(Number))));
    expect(wearSums([10, 10], 1)[0]).toBeCloseTo(Math.log(11 / 10), 12);
    expect(wearSums([0, 5], 1)[0]).toBeCloseTo(Math.log(5), 12);
  });
  test("G4: the fourth fault spends seven sixteenths, all of them never more than everything", () => {
    expect(spentBy(3)).toBe(0);
    expect(spentAt(4)).toBe(7 / 16);
    expect(spentBy(6)).toBe(0.75);
    const all = Array.from({ length: 100_000 }, (_, i) => spentAt(i + 1)).reduce((sum, one) => sum + one, 0);
    expect(all).toBeLessThan(1);
    expect(all).toBeGreaterThan(0.9999);
  });
  test("G4: the first bound is the chi-square's own quantile", () => {
    expect(chiSquareBelow(2 * (wearBounds(0.05, 4)[4] ?? NaN), 6)).toBeCloseTo((0.05 * 7) / 16, 10);
  });
  test("G4: at a constant rate the bounds are crossed first at each fault with the chance spent there", () => {
    const level = 0.4;
    const bounds = wearBounds(level, 10);
    const roll = dice(5);
    const runs = 40_000;
    const first = new Array<number>(11).fill(0);
    for (let run = 0; run < runs; run++) {
      let sum = 0;
      for (let n = 2; n <= 10; n++) {
        sum -= Math.log(1 - roll());
        if (sum <= (bounds[n] ?? -Infinity)) {
          first[n] = (first[n] ?? 0) + 1 / runs;
          break;
        }
      }
    }
    for (let n = 4; n <= 10; n++) {
      const spend = level * spentAt(n);
      expect(Math.abs((first[n] ?? 0) - spend)).toBeLessThan(4 * Math.sqrt(spend / runs));
    }
  });
  test("G5: the shares of all records of a fleet add up to one", () => {
    const all = Array.from({ length: 10_000 }, (_, i) => shareOfRecord(i + 1)).reduce((sum, one) => sum + one, 0);
    expect(all).toBeCloseTo(1 - 1 / 10_001, 10);
  });
  test("a record of thousands of faults is still judged", () => {
    expect(wearBounds(0.05, 3000)).toHaveLength(301);
  });
});
