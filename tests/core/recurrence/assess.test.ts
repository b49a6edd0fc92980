import { describe, expect, test } from "vitest";
import { assess, FALSE_ALARM_LEVEL } from "../../../lib/core/recurrence/assess";
import { evidenceInWords, oneIn } from "../../../lib/core/recurrence/evidence-words";
import type { WatchedEngine } from "../../../lib/core/recurrence/fault-records";
import type { CaseEntry } from "../../../lib/core/recurrence/spells";
import { aCase } from "./a-case";

/** Runs a hundred days a year, ten hours a day: hour h is day h / 10, beginning at 1000 h. */
const START = Date.UTC(2026, 0, 1);
const DAY = 24 * 3600 * 1000;
const engine = (id: string, untilHours: number): WatchedEngine => ({
  id,
  since: new Date(START).toISOString(),
  now: new Date(START + (untilHours / 10) * DAY).toISOString(),
  clock: { at: (moment) => ({ hours: 1000 + ((Date.parse(moment) - START) / DAY) * 10, estimated: false }) },
});
const faultsAt = (hours: readonly number[], change: Partial<CaseEntry> = {}) =>
  hours.map((hour) => ({ ...aCase(0, 1000 + hour, change), at: new Date(START + (hour / 10) * DAY).toISOString() }));

const WORSE = [600, 720, 810, 870, 915, 945, 963];
const STEADY = [100, 240, 330, 480, 610, 700, 850];

const first = (entries: readonly CaseEntry[], engines: readonly WatchedEngine[]) => {
  const [found] = assess(entries, engines);
  if (!found) throw new Error("no record");
  return found;
};

describe("a record", () => {
  test("R1: is counted on hours from the beginning of the log, not since new", () => {
    const found = first(faultsAt(WORSE), [engine("engine-1", 970)]);
    expect(found).toMatchObject({ unit: "hours", times: WORSE, now: 970, beginsWithFault: false });
  });
  test("R2: goes by days where any hours are unknown, and says so", () => {
    const entries = faultsAt(STEADY).map((entry, i) => (i === 2 ? { ...entry, engineHours: null } : entry));
    const found = first(entries, [engine("engine-1", 900)]);
    expect(found.unit).toBe("days");
    expect(found.times).toEqual(STEADY.map((hour) => expect.closeTo(hour / 10, 9)));
    expect(evidenceInWords(found).join(" ")).toContain("counted in days");
  });
  test("R3: a log that begins with the fault counts from it and not it", () => {
    const found = first(faultsAt([0, 100, 250]), [engine("engine-1", 400)]);
    expect(found).toMatchObject({ beginsWithFault: true, times: [100, 250], now: 400 });
    expect(evidenceInWords(found)[0]).toBe("Came back twice; first gap 100 h, last gap 150 h.");
  });
  test("R4: cures that nobody proved are counted and said", () => {
    const found = first(faultsAt(WORSE, { proof: null }), [engine("engine-1", 970)]);
    expect(found.unproved).toBe(6);
    expect(evidenceInWords(found).at(-1)).toContain("6 cures before a return were never proved");
  });
});

describe("getting worse", () => {
  test("G1: under four faults there are too few to tell", () => {
    const found = first(faultsAt(WORSE.slice(0, 3)), [engine("engine-1", 900)]);
    expect(found.trend).toEqual({ verdict: "too-few", saidAt: null, laplace: null, chiSquare: null, orders: null, growth: null });
    expect(evidenceInWords(found)).toContain("Too few to tell whether it is getting worse: that takes four.");
  });
  test("G2: gaps from 120 to 18 h after a long quiet are said, with the tests beside the words", () => {
    const found = first(faultsAt(WORSE), [engine("engine-1", 970)]);
    expect(found.trend.verdict).toBe("getting-worse");
    expect(found.trend.laplace?.u).toBeGreaterThan(2.5);
    expect(found.trend.growth?.betaLimits[0]).toBeGreaterThan(1);
    const words = evidenceInWords(found);
    expect(words[0]).toBe("Came back 6 times; first gap 120 h, last gap 18 h.");
    expect(words[1]).toMatch(/^Getting worse: the gaps grow shorter \(Laplace 3\.28, 1 in 5200 at a constant rate; chi-square 2\.3 on 14/);
  });
  test("G2: steady gaps are not", () => {
    const found = first(faultsAt(STEADY), [engine("engine-1", 900)]);
    expect(found.trend).toMatchObject({ verdict: "not-shown", saidAt: null });
  });
  test("G6: what was said stands until it has been quiet for three times the gap it had come to", () => {
    expect(first(faultsAt(WORSE), [engine("engine-1", 1000)]).trend.verdict).toBe("getting-worse");
    const later = first(faultsAt(WORSE), [engine("engine-1", 2500)]);
    expect(later.trend.verdict).toBe("was-getting-worse");
    expect(evidenceInWords(later)[1]).toContain("quiet since");
  });
  test("G5: the second record under watch gets a sixth of the allowance, and needs more to be said", () => {
    const steep = [700, 770, 820, 850];
    const saidOn = (entries: readonly CaseEntry[], engines: readonly WatchedEngine[]) =>
      assess(entries, engines).find(({ engineId }) => engineId === "engine-1")?.trend.saidAt;
    expect(saidOn(faultsAt(steep), [engine("engine-1", 940)])).toBe(4);
    const earlier = faultsAt([10, 300, 420, 500], { engineId: "engine-2" });
    expect(saidOn([...faultsAt(steep), ...earlier], [engine("engine-1", 940), engine("engine-2", 940)])).toBeNull();
    const later = faultsAt([10, 300, 420, 935], { engineId: "engine-2" });
    expect(saidOn([...faultsAt(steep), ...later], [engine("engine-1", 940), engine("engine-2", 940)])).toBe(4);
  });
  test("the order of the log never matters", () => {
    const entries = [...faultsAt(WORSE), ...faultsAt(STEADY, { engineId: "engine-2" })];
    const engines = [engine("engine-1", 970), engine("engine-2", 970)];
    const sorted = (found: ReturnType<typeof assess>) => [...found].sort((a, b) => (a.engineId < b.engineId ? -1 : 1));
    expect(sorted(assess([...entries].reverse(), [...engines].reverse()))).toEqual(sorted(assess(entries, engines)));
  });
});

describe("against the fleet", () => {
  test("F1: alone in its fleet an engine is compared with none", () => {
    const found = first(faultsAt(STEADY), [engine("engine-1", 900)]);
    expect(found.frequency).toMatchObject({ verdict: "no-fleet", count: 7, time: 900, expected: null, byChance: null });
    expect(evidenceInWords(found)).toContain("No other engine of this fleet to compare with.");
  });
  test("F1: the other engines' quiet hours count, this engine's own faults do not", () => {
    const others = Array.from({ length: 9 }, (_, i) => engine(`other-${i}`, 1000));
    const found = first([...faultsAt(STEADY), ...faultsAt([500], { engineId: "other-1" })], [engine("engine-1", 1000), ...others]);
    // One fault and a half added, in nine thousand hours.
    expect(found.frequency.expected).toBeCloseTo((1.5 / 9000) * 1000, 10);
    expect(found.frequency.byPoisson).toBeLessThan(1e-8);
    expect(found.frequency.byChance).toBeGreaterThan(found.frequency.byPoisson ?? 1);
  });
  test("F3: forty where nine others had one each are said to be oftener", () => {
    const many = Array.from({ length: 40 }, (_, i) => 20 * (i + 1));
    const others = Array.from({ length: 9 }, (_, i) => engine(`other-${i}`, 1000));
    const few = others.flatMap(({ id }, i) => faultsAt([100 * (i + 1)], { engineId: id }));
    const found = assess([...faultsAt(many), ...few], [engine("engine-1", 1000), ...others]).find(
      ({ engineId }) => engineId === "engine-1",
    );
    expect(found?.frequency.verdict).toBe("oftener");
    expect(
      found && evidenceInWords(found).some((words) => words.startsWith("Oftener here than on the fleet's other engines: 40 in 1000 h")),
    ).toBe(true);
  });
});

test("chances are said as counts", () => {
  expect([0.5, 0.2, 1 / 300, 1 / 1234, 1e-9].map(oneIn)).toEqual([
    "more often than 2 in 5",
    "1 in 5",
    "1 in 300",
    "1 in 1200",
    "less than 1 in a million",
  ]);
  expect(FALSE_ALARM_LEVEL).toBe(0.05);
});
