import { describe, expect, test } from "vitest";
import { EngineValues, engineValues, NOTHING_KNOWN } from "@/components/engine/engine-values";

const features = [{ key: "turbo" }, { key: "cooling" }];
const blank = { ...engineValues(NOTHING_KNOWN, features), name: "Port" };

describe("the engine's form", () => {
  test("leaves out of the profile what is not known", () => {
    expect(EngineValues.parse(blank)).toEqual({
      name: "Port",
      hasHourMeter: true,
      estimatedHoursPerYear: null,
      profile: { features: {}, figures: {}, healthy: {} },
    });
  });
  test("converts a figure from the unit it was typed in", () => {
    const typed = { ...blank, healthy: { ...blank.healthy, oilPressureKpa: { typed: "3,5", unit: "bar" } } };
    expect(EngineValues.parse(typed).profile.healthy.oilPressureKpa).toBeCloseTo(350, 9);
  });
  test("keeps a feature that the present tree does not ask about", () => {
    const engine = { ...NOTHING_KNOWN, name: "Port", profile: { features: { "old-part": "fitted" }, figures: {}, healthy: {} } };
    expect(EngineValues.parse(engineValues(engine, features)).profile.features).toEqual({ "old-part": "fitted" });
  });
  test.each([
    ["3.000", "rpm", "This reads as 3 rpm; between 500 and 8000 rpm is likely. For 3000 leave out the sign between the thousands."],
    ["90", "rpm", "This reads as 90 rpm; between 500 and 8000 rpm is likely."],
  ])("refuses a rated speed of %s %s, and says what it understood", (typed, unit, says) => {
    const result = EngineValues.safeParse({ ...blank, figures: { ...blank.figures, ratedRpm: { typed, unit } } });
    expect(result.error?.issues).toMatchObject([{ path: ["figures", "ratedRpm", "typed"], message: says }]);
  });
  test.each([
    ["cylinders", "2.5", "A whole number."],
    ["cylinders", "13", "At most 12."],
    ["ratedKw", "a lot", "Write a number, for example 12.5."],
    ["hoursPerYear", "9000", "At most 8760."],
  ])("says what is wrong with %s of %s", (field, typed, says) => {
    const result = EngineValues.safeParse({ ...blank, [field]: typed });
    expect(result.error?.issues.map(({ path, message }) => ({ path, message }))).toEqual([{ path: [field], message: says }]);
  });
});
