import { describe, expect, test } from "vitest";
import { joinMultipliers, upkeepMultipliers } from "../../../lib/core/upkeep/odds-of-upkeep";
import { standingOfUpkeep, type EngineNow } from "../../../lib/core/upkeep/standing-of-upkeep";
import { STARTER_ITEMS } from "../../../lib/core/upkeep/starter-items";
import { starterPlan } from "../../../lib/core/upkeep/starter-plan";
import { UpkeepItem } from "../../../lib/core/upkeep/upkeep-item";

const item = (change: Partial<UpkeepItem> = {}) =>
  UpkeepItem.parse({
    key: "impeller",
    title: "Impeller",
    system: "raw-water",
    everyHours: 200,
    everyMonths: 12,
    renews: true,
    guards: ["impeller-failed"],
    mayBring: ["raw-pump-leak"],
    source: "Made up for this test",
    ...change,
  });
const MONTH = (365.25 / 12) * 24 * 3600 * 1000;
const moment = (months: number) => new Date(Date.UTC(2026, 0, 1) + months * MONTH).toISOString();
const engine = (months: number, hours: number | null, sinceHours: number | null = 1000): EngineNow => ({
  now: moment(months),
  hours,
  since: moment(0),
  sinceHours,
});
const doneAt = (months: number, hours: number | null) => [{ item: "impeller", at: moment(months), hours }];

describe("where an item stands", () => {
  test("U2: by hours or months, whichever is further gone", () => {
    expect(standingOfUpkeep(item(), doneAt(0, 1000), engine(3, 1100))).toMatchObject({ by: "hours", used: 0.5, hoursLeft: 100 });
    expect(standingOfUpkeep(item(), doneAt(0, 1000), engine(9, 1010))).toMatchObject({
      by: "months",
      used: expect.closeTo(0.75, 9),
      state: "good",
    });
  });
  test("U2: hours that are not known leave the months", () => {
    expect(standingOfUpkeep(item(), doneAt(0, null), engine(13, 5000))).toMatchObject({ by: "months", state: "due", hoursLeft: null });
  });
  test("U2: the last time counts, in whatever order they were logged", () => {
    const done = [...doneAt(5, 1150), ...doneAt(1, 1000)];
    expect(standingOfUpkeep(item(), done, engine(6, 1160))).toMatchObject({ hoursLeft: 190 });
  });
  test.each([
    [169, "good"],
    [170, "soon"],
    [199, "soon"],
    [200, "due"],
    [240, "due"],
    [241, "overdue"],
  ])("U3: %i of 200 h is %s", (ran, state) => {
    expect(standingOfUpkeep(item({ everyMonths: null }), doneAt(0, 1000), engine(1, 1000 + ran)).state).toBe(state);
  });
  test("U4: never logged is not known, until the engine has been watched for the interval", () => {
    expect(standingOfUpkeep(item(), [], engine(2, 1050))).toMatchObject({ state: "not-known", last: null });
    expect(standingOfUpkeep(item(), [], engine(2, 1210)).state).toBe("due");
  });
  test("U5: a new engine's first service comes early; an old one's does not", () => {
    const first = item({ firstHours: 50 });
    expect(standingOfUpkeep(first, [], engine(1, 55, 5))).toMatchObject({ state: "due", hoursLeft: -5 });
    expect(standingOfUpkeep(first, [], engine(1, 1055, 1000)).state).toBe("not-known");
    expect(standingOfUpkeep(first, doneAt(1, 52), engine(2, 60, 5))).toMatchObject({ state: "good", hoursLeft: 192 });
  });
});

describe("the starter plan", () => {
  test("U1: every item names its source and an interval, each key once", () => {
    expect(new Set(STARTER_ITEMS.map(({ key }) => key)).size).toBe(STARTER_ITEMS.length);
    expect(() => item({ everyHours: null, everyMonths: null })).toThrow(/hours or months/);
  });
  test("U1: what cannot apply is left out, what may is marked", () => {
    const keys = (features: Record<string, string>) => starterPlan({ features }, []).map(({ key }) => key);
    expect(keys({ gearbox: "saildrive", "third-filter": "not-fitted", cooling: "raw-water" })).toEqual(
      expect.arrayContaining(["saildrive-diaphragm", "saildrive-oil", "primary-element", "secondary-element"]),
    );
    expect(keys({ gearbox: "saildrive" })).not.toContain("gearbox-oil");
    expect(keys({ "third-filter": "not-fitted" })).not.toContain("third-element");
    expect(keys({ cooling: "raw-water" })).not.toContain("heat-exchanger");
    expect(starterPlan({ features: {} }, []).find(({ key }) => key === "third-element")?.ifFitted).toBe(true);
    expect(starterPlan({ features: { "third-filter": "fitted" } }, []).find(({ key }) => key === "third-element")?.ifFitted).toBe(false);
  });
  test("U1: three fuel-filter stages stand apart", () => {
    expect(
      starterPlan({ features: {} }, [])
        .filter(({ key }) => key.endsWith("-element"))
        .map(({ key }) => key),
    ).toEqual(["primary-element", "secondary-element", "third-element"]);
  });
});

describe("what upkeep says of the odds", () => {
  test("O1: fresh, half as likely; from half the interval on nothing; overdue, as many times as intervals", () => {
    const times = (ran: number) =>
      upkeepMultipliers([item({ everyMonths: null, mayBring: [] })], doneAt(0, 1000), engine(1, 1000 + ran)).map((one) => one.times);
    expect(times(0)).toEqual([0.5]);
    expect(times(50)).toEqual([0.75]);
    expect(times(120)).toEqual([]);
    expect(times(300)).toEqual([1.5]);
    expect(times(2000)).toEqual([3]);
  });
  test("O1: the reason is said", () => {
    const [found] = upkeepMultipliers([item()], doneAt(0, 1000), engine(1, 1300));
    expect(found).toEqual({ cause: "impeller-failed", times: 1.5, reason: "Impeller: overdue by hours, last done 300 h ago." });
  });
  test("O2: what the work may bring in, for ten hours", () => {
    const causes = (ran: number) =>
      upkeepMultipliers([item()], doneAt(0, 1000), engine(1, 1000 + ran)).map((one) => [one.cause, one.times]);
    expect(causes(4)).toContainEqual(["raw-pump-leak", 3]);
    expect(causes(11).map(([cause]) => cause)).not.toContain("raw-pump-leak");
  });
  test("O3: reasons about one cause multiply, at most 5 either way", () => {
    const one = { cause: "a", times: 3, reason: "First." };
    expect(joinMultipliers([one, { ...one, reason: "Second." }])).toEqual([{ cause: "a", times: 5, reason: "First. Second." }]);
    expect(joinMultipliers([one, { ...one, times: 1 / 3 }])).toEqual([]);
    expect(joinMultipliers([{ ...one, times: 0.1 }])[0]?.times).toBe(0.2);
  });
});
