import { describe, expect, test } from "vitest";
import { acrossFleet } from "../../../lib/core/recurrence/across-fleet";
import { aCase } from "./a-case";

const SINCE = new Date(Date.UTC(2024, 0, 1)).toISOString();
const on = (engineId: string, day: number) => aCase(day, null, { engineId });

describe("the same cause on several engines within days", () => {
  test("A1: three boats in four days are one event, with the chance of it", () => {
    const [found, ...rest] = acrossFleet([on("a", 10), on("b", 12), on("c", 14), on("d", -300)], SINCE);
    expect(rest).toEqual([]);
    expect(found).toMatchObject({ cause: "primary-filter-blocked", system: "fuel-supply", days: 4 });
    expect(found?.engines.map(({ engineId }) => engineId)).toEqual(["a", "b", "c"]);
    // Two more of three others within 4 days of the 744 to then: 3 p^2 (1 - p) + p^3.
    const p = 4 / 744;
    expect(found?.byChance).toBeCloseTo(3 * p * p * (1 - p) + p ** 3, 12);
  });
  test("A1: two weeks are the most, from the first of them", () => {
    expect(acrossFleet([on("a", 0), on("b", 15)], SINCE)).toEqual([]);
    const trickle = acrossFleet([on("a", 0), on("b", 10), on("c", 20)], SINCE);
    expect(trickle).toHaveLength(1);
    expect(trickle[0]?.engines.map(({ engineId }) => engineId)).toEqual(["a", "b"]);
  });
  test("A2: the same engine twice is no event of the fleet", () => {
    expect(acrossFleet([on("a", 0), on("a", 3)], SINCE)).toEqual([]);
  });
  test("A3: the newest stands first; the order of the log never matters", () => {
    const entries = [on("a", 0), on("b", 1), on("c", 100), on("d", 101)];
    const found = acrossFleet(entries, SINCE);
    expect(found.map(({ engines }) => engines[0]?.engineId)).toEqual(["c", "a"]);
    expect(acrossFleet([...entries].reverse(), SINCE)).toEqual(found);
  });
});
