import { describe, expect, test } from "vitest";
import { excessOverLevel, falseAlarms, HEALTHY_FLEETS, power } from "../../support/repeat-alarms";

const RUNS = 40;

describe("of healthy fleets, no more than 1 in 20 ever hears a false alarm", () => {
  test.each(HEALTHY_FLEETS)("G4, G5, F3: $name", { timeout: 120_000 }, (fleet) => {
    const { worse, oftener } = falseAlarms(fleet, RUNS, 11);
    expect(excessOverLevel(worse, RUNS)).toBeLessThanOrEqual(0);
    expect(excessOverLevel(oftener, RUNS)).toBeLessThanOrEqual(0);
  });
});

test("G2: wear that grows with the square of the hours is found on most engines with 15 faults", { timeout: 60_000 }, () => {
  expect(power({ beta: 3, expected: 15 }, 150, 4)).toBeGreaterThan(0.65);
});
