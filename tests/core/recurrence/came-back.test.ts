import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cameBack } from "../../../lib/core/recurrence/came-back";
import { aCase, inWords } from "./a-case";

describe("cameBack", () => {
  it("[B1] says nothing of one case", () => {
    expect(cameBack([aCase(1, 100)])).toEqual([]);
  });

  it("[B1][B2][B3] says it from the second, with hours, gaps and days", () => {
    const [fault, ...others] = cameBack([aCase(1, 100), aCase(31, 160), aCase(51, 190.5)]);
    expect(others).toEqual([]);
    expect(fault).toMatchObject({ cause: "primary-filter-blocked", title: "Primary filter blocked", system: "fuel-supply", count: 3 });
    expect(fault?.hours).toEqual([100, 160, 190.5]);
    expect(fault?.gapsHours).toEqual([60, 30.5]);
    expect(fault?.gapsDays).toEqual([30, 20]);
    expect(fault?.unprovedBefore).toBe(0);
  });

  it("[B1] keeps engines and causes apart", () => {
    const impeller = { key: "impeller-worn", title: "Impeller worn", system: "raw-water" };
    expect(cameBack([aCase(1, 1), aCase(2, 2, { engineId: "engine-2" }), aCase(3, 3, { cause: impeller })])).toEqual([]);
  });

  it.each(["by-itself", "broken-off", null] as const)("[C1] does not count what ended %s", (outcome) => {
    expect(cameBack([aCase(1, 100), aCase(2, 110, { outcome })])).toEqual([]);
  });

  it("[C1] does not count a cure whose cause nobody named", () => {
    expect(cameBack([aCase(1, 100, { cause: null }), aCase(2, 110, { cause: null })])).toEqual([]);
  });

  it("[C2] takes words that differ in case, spaces and stops for one cause", () => {
    const [fault] = cameBack([
      aCase(1, 10, { cause: inWords("Impeller vanes  torn.") }),
      aCase(9, 20, { cause: inWords("impeller VANES torn") }),
    ]);
    expect(fault).toMatchObject({ count: 2, title: "impeller VANES torn", system: null });
    expect(fault?.cause).toMatch(/^in-words-impellervanestorn-[a-z0-9]+$/);
  });

  it("[C2] keeps apart words of other alphabets that leave no Latin letter", () => {
    expect(cameBack([aCase(1, 10, { cause: inWords("крыльчатка") }), aCase(9, 20, { cause: inWords("ремень") })])).toEqual([]);
    expect(cameBack([aCase(1, 10, { cause: inWords("крыльчатка") }), aCase(9, 20, { cause: inWords("Крыльчатка") })])).toHaveLength(1);
  });

  it("[C2] takes words that say a keyed cause's title for that cause", () => {
    const [fault] = cameBack([aCase(1, 10, { cause: inWords("primary FILTER blocked") }), aCase(9, 20)]);
    expect(fault).toMatchObject({ cause: "primary-filter-blocked", title: "Primary filter blocked", count: 2 });
  });

  it("[C4] does not take the next look at a fault that was only nursed home for a return", () => {
    const nursed = aCase(1, 100, { outcome: "held", temporary: true, proof: null });
    const towed = aCase(2, 101, { outcome: "handed-over", proof: null });
    expect(cameBack([nursed, towed, aCase(3, 101)])).toEqual([]);
    const [fault] = cameBack([nursed, aCase(3, 101), aCase(30, 151)]);
    // The spell began at 100 h, its cure stands at 101 h: the gap runs from the cure.
    expect(fault).toMatchObject({ count: 2, hours: [100, 151], gapsHours: [50] });
  });

  it("[C3][B4] marks returns after a cure that nobody proved", () => {
    const [fault] = cameBack([
      aCase(1, 1, { outcome: "held", proof: null }),
      aCase(2, 2, { proof: " " }),
      aCase(3, 3),
      aCase(4, 4, { proof: null }),
    ]);
    expect(fault).toMatchObject({ count: 4, unprovedBefore: 2 });
  });

  it("[B3] gives days alone where a case has no hours", () => {
    const [fault] = cameBack([aCase(1, 100), aCase(11, null), aCase(21, 130)]);
    expect(fault).toMatchObject({ hours: [100, null, 130], gapsHours: [], gapsDays: [10, 10] });
  });

  it("[H7] passes on that hours are estimated", () => {
    expect(cameBack([aCase(1, 1), aCase(2, 2, { hoursAreEstimated: true })])[0]?.hoursAreEstimated).toBe(true);
  });

  it("[B5] offers what lies upstream, as it is told", () => {
    const upstream = [{ cause: "growth-in-tank", title: "Growth in the tank", share: 0.66 }];
    expect(cameBack([aCase(1, 1), aCase(2, 2)], (cause) => (cause === "primary-filter-blocked" ? upstream : []))[0]?.upstream).toEqual(
      upstream,
    );
  });

  it("[B6] puts the most spells first", () => {
    const other = { key: "belt-slack", title: "Belt slack", system: "charging" };
    const faults = cameBack([aCase(1, 1, { cause: other }), aCase(2, 2, { cause: other }), aCase(3, 3), aCase(4, 4), aCase(5, 5)]);
    expect(faults.map((f) => [f.cause, f.count])).toEqual([
      ["primary-filter-blocked", 3],
      ["belt-slack", 2],
    ]);
  });

  it("[C5] does not hang on the order of the entries", () => {
    const entries = Array.from({ length: 12 }, (_, i) =>
      aCase(
        1 + (i % 7),
        i * 10,
        i % 3 ? {} : { outcome: "held", temporary: i % 2 === 0, cause: inWords(i % 2 ? "Torn impeller" : "torn  impeller") },
      ),
    );
    const expected = cameBack(entries);
    expect(expected).toHaveLength(2);
    fc.assert(
      fc.property(fc.shuffledSubarray(entries, { minLength: entries.length }), (shuffled) => {
        expect(cameBack(shuffled)).toEqual(expected);
      }),
      { seed: 7 },
    );
  });
});
