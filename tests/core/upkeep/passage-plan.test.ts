import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { chanceEnough, certainly, enough, faultDemand, meanOf, together } from "../../../lib/core/upkeep/demand";
import { planPassage, type PlannedEngine } from "../../../lib/core/upkeep/passage-plan";
import { rateOnEngine } from "../../../lib/core/upkeep/fault-rates";
import { shoppingList } from "../../../lib/core/upkeep/shopping-list";
import { UpkeepItem } from "../../../lib/core/upkeep/upkeep-item";
import { smallTree } from "../../support/small-tree";

const element = UpkeepItem.parse({
  key: "primary-element",
  title: "Primary element",
  system: "fuel-supply",
  everyHours: 200,
  everyMonths: 12,
  renews: true,
  parts: [{ key: "primary-element", title: "Primary filter element" }],
  source: "Made up for this test",
});
const NOW = "2026-06-01T00:00:00.000Z";
const engine = (change: Partial<PlannedEngine> = {}): PlannedEngine => ({
  id: "engine-1",
  name: "main engine",
  cylinders: 3,
  now: { now: NOW, hours: 1100, since: "2025-12-01T00:00:00.000Z", sinceHours: 800 },
  items: [element],
  done: [{ item: "primary-element", at: "2026-03-01T00:00:00.000Z", hours: 1000 }],
  counts: () => ({ own: { faults: 0, time: 300 }, others: { faults: 0, time: 0 } }),
  ...change,
});
const noFaults = { causes: [], remedies: [] };
const carried = (
  hours: number,
  litres = 0,
  change: Partial<PlannedEngine> = {},
  dirty?: { litres: number; seen?: { elements: number; litres: number } },
) => planPassage(noFaults, [engine(change)], { hours, litres, months: 0, dirtyTank: dirty }).find(({ part }) => part === "primary-element");

describe("demand for one part", () => {
  test("P5: adding two needs is adding their means, and chances stay chances", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 8, noNaN: true }),
        fc.double({ min: 1, max: 500, noNaN: true }),
        fc.integer({ min: 0, max: 5 }),
        (events, time, sure) => {
          const fault = faultDemand({ events, exposure: 400 }, time);
          const both = together(fault, certainly(sure));
          expect(both.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 9);
          expect(meanOf(both)).toBeCloseTo((events * time) / 400 + sure, 3);
          expect(chanceEnough(both, enough(both, 0.95))).toBeGreaterThanOrEqual(0.95 - 1e-9);
          if (enough(both, 0.95) > 0) expect(chanceEnough(both, enough(both, 0.95) - 1)).toBeLessThan(0.95);
        },
      ),
      { seed: 7, numRuns: 100 },
    );
  });
  test("P3: a fault that takes four of a part takes them four at a time", () => {
    const demand = faultDemand({ events: 2, exposure: 100 }, 50, 4);
    expect(demand.flatMap((p, n) => (p > 1e-6 && n % 4 !== 0 ? [n] : []))).toEqual([]);
    expect(enough(demand, 0.9) % 4).toBe(0);
  });
  test("P5: Poisson by hand: mean 2, enough 95 times in 100 is 5, 99 is 6", () => {
    const demand = faultDemand({ events: 1e12, exposure: 5e11 }, 1);
    expect([enough(demand, 0.9), enough(demand, 0.95), enough(demand, 0.99)]).toEqual([4, 5, 6]);
  });
});

describe("upkeep on passage", () => {
  test("P2: half gone, and one and a half more: due twice", () => {
    expect(carried(99)).toBeUndefined();
    expect(carried(100)?.carry).toEqual({ at90: 1, at95: 1, at99: 1 });
    expect(carried(300)?.carry.at99).toBe(2);
  });
  test("P2: overdue is done once at once, not for every interval missed", () => {
    expect(carried(10, 0, { now: { now: NOW, hours: 1900, since: NOW, sinceHours: 0 } })?.carry.at99).toBe(1);
  });
  test("P6: says what drives it", () => {
    expect(carried(300)?.reasons).toEqual([
      { kind: "upkeep", title: "Primary element", mean: 2, words: "Primary element falls due 2 times" },
    ]);
  });
});

describe("a dirty tank", () => {
  test("P4: elements until it is burnt through, then no more", () => {
    const seen = { elements: 6, litres: 150 };
    const burning = carried(10, 100, {}, { litres: 200, seen });
    // (1 + 6) / (50 + 150) a litre.
    expect(burning?.mean).toBeCloseTo(3.5, 3);
    expect(carried(10, 200, {}, { litres: 200, seen })?.mean).toBeCloseTo(7, 2);
    expect(carried(10, 900, {}, { litres: 200, seen })?.mean).toBeCloseTo(7, 2);
    expect(burning?.reasons[0]).toMatchObject({
      kind: "dirty-tank",
      words: "100 litres of dirty fuel to burn through; 6 elements seen in 150 litres",
    });
  });
  test("P4: counted, the number is surer than guessed", () => {
    const guessed = carried(10, 100, {}, { litres: 100 });
    const counted = carried(10, 100, {}, { litres: 100, seen: { elements: 20, litres: 1000 } });
    expect(guessed?.mean).toBeCloseTo(2, 3);
    expect(counted?.mean).toBeCloseTo(2, 3);
    expect(guessed?.carry.at99).toBeGreaterThan(counted?.carry.at99 ?? 99);
  });
});

describe("faults on passage", () => {
  const small = smallTree();
  const tree = {
    ...small,
    remedies: small.remedies.map((one) => ({ ...one, parts: [{ key: `${one.key}-part`, title: one.title, quantity: 1 }] })),
  };
  const cause = tree.causes.find((one) =>
    tree.remedies.some((remedy) => one.curedBy[remedy.key] !== undefined && remedy.who === "skipper-at-sea" && remedy.parts.length > 0),
  );
  test("P3: this engine's own faults outweigh the fleet's, and the fleet's the tree's guess", () => {
    const mean = (rate: { events: number; exposure: number }) => rate.events / rate.exposure;
    const none = { faults: 0, time: 0 };
    expect(mean(rateOnEngine(0.001, none, none))).toBeCloseTo(0.001, 12);
    expect(mean(rateOnEngine(0.001, { faults: 50, time: 10_000 }, none))).toBeCloseTo(50.5 / 10_500, 12);
    expect(mean(rateOnEngine(0.001, { faults: 50, time: 10_000 }, { faults: 30, time: 1000 }))).toBeGreaterThan(0.025);
    // Three in its last 50 h are not explained away by a rare guess: more than one in the next hundred.
    expect(100 * mean(rateOnEngine(0.0001, { faults: 0, time: 500 }, { faults: 3, time: 50 }))).toBeGreaterThan(1);
  });
  test("P3: a fault that keeps coming puts its part on the list, and says why", () => {
    expect(cause).toBeDefined();
    const counts = (key: string) => ({ own: { faults: key === cause?.key ? 7 : 0, time: 460 }, others: { faults: 1, time: 2000 } });
    const plan = planPassage(tree, [engine({ items: [], counts })], { hours: 120, litres: 300, months: 1 });
    const line = plan.find(({ reasons }) => reasons[0]?.title === cause?.title);
    expect(line?.carry.at95).toBeGreaterThan(1);
    expect(line?.reasons[0]?.words).toBe(`${cause?.title ?? ""}: 7 on this engine in 460 h, 1 on the fleet's others in 2000 h`);
  });
  test("P5: two engines share their spares: fewer than twice one's", () => {
    const counts = () => ({ own: { faults: 4, time: 400 }, others: { faults: 0, time: 0 } });
    const one = planPassage(tree, [engine({ items: [], counts })], { hours: 200, litres: 300, months: 1 });
    const two = planPassage(tree, [engine({ items: [], counts }), engine({ id: "engine-2", items: [], counts })], {
      hours: 200,
      litres: 300,
      months: 1,
    });
    const total = (plan: typeof one) => plan.reduce((sum, line) => sum + line.carry.at99, 0);
    expect(total(two)).toBeGreaterThan(total(one));
    expect(total(two)).toBeLessThan(2 * total(one));
  });
});

describe("the shopping list", () => {
  const plan = planPassage(noFaults, [engine()], { hours: 300, litres: 0, months: 0 }, new Map([["primary-element", 1]]));
  test("P6: what is carried less what is aboard", () => {
    expect(shoppingList(plan, "at95")).toEqual([
      {
        part: "primary-element",
        title: "Primary filter element",
        carry: 2,
        aboard: 1,
        buy: 1,
        driver: "Primary element falls due 2 times",
      },
    ]);
    expect(plan[0]?.enoughAboard).toBe(0);
  });
  test("P6: the owner's own minimum where that is more", () => {
    const minimums = new Map([
      ["primary-element", { title: "Primary filter element", minimum: 4, aboard: 1 }],
      ["impeller", { title: "Impeller", minimum: 2, aboard: 2 }],
    ]);
    expect(shoppingList(plan, "at95", minimums)).toEqual([
      expect.objectContaining({ part: "primary-element", buy: 3, driver: "Your own minimum of 4" }),
    ]);
  });
});
