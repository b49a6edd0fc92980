import { describe, expect, it } from "vitest";
import { unit as mathUnit } from "mathjs";
import fc from "fast-check";
import { Quantity } from "../../../lib/core/tree/schema";
import { convert, findUnit, UnitRefused, unitsOf } from "../../../lib/core/units/units";

const close = (a: number, b: number, relative: number) =>
  expect(Math.abs(a - b)).toBeLessThanOrEqual(relative * Math.max(Math.abs(a), Math.abs(b), 1e-300));

describe("units", () => {
  it("[U1] agrees with the definitions to the last digits", () => {
    close(convert(1, "psi", "kPa"), 6.894757293168361, 1e-14);
    close(convert(1, "inHg", "kPa"), 3.386388640341, 1e-12);
    close(convert(1, "mmHg", "kPa"), 0.133322387415, 1e-14);
    close(convert(1, "inH2O", "kPa"), 0.24908891, 1e-14);
    close(convert(100, "mmH2O", "kPa"), 0.980665, 1e-14);
    close(convert(1, "inH2O", "mmH2O"), 25.4, 1e-14);
    close(convert(2.6, "MPa", "bar"), 26, 1e-14);
    close(convert(30, "kgf/cm2", "bar"), 29.41995, 1e-14);
    close(convert(1, "gal-us", "L"), 3.785411784, 1e-14);
    close(convert(1, "gal-imp", "L"), 4.54609, 1e-15);
    close(convert(212, "F", "C"), 100, 1e-14);
    close(convert(-40, "C", "F"), -40, 1e-14);
    close(convert(2.5, "bar", "kPa"), 250, 1e-15);
    close(convert(0.02, "%-weight", "mg/kg"), 200, 1e-14);
    close(convert(35, "ppm", "%-weight"), 0.0035, 1e-14);
    close(convert(1.5, "in", "mm"), 38.1, 1e-15);
  });

  it("[U1] turns a difference of temperatures over without the offset of the scales, and never as a temperature", () => {
    close(convert(9, "F-diff", "C-diff"), 5, 1e-14);
    close(convert(20, "C-diff", "F-diff"), 36, 1e-14);
    close(convert(-50, "K", "F-diff"), -90, 1e-14);
    expect(convert(0, "F-diff", "C-diff")).toBe(0);
    expect(() => convert(9, "F-diff", "C")).toThrow(/measures temperature-difference/);
    expect(() => convert(9, "F", "K")).toThrow(UnitRefused);
  });

  it("[U1] agrees with a general unit library to the digits that it keeps", () => {
    const pairs: [string, string, string, string][] = [
      ["psi", "psi", "kPa", "kPa"],
      ["bar", "bar", "kPa", "kPa"],
      ["mmHg", "mmHg", "kPa", "kPa"],
      ["F", "degF", "C", "degC"],
      ["mV", "mV", "V", "V"],
      ["min", "minute", "s", "second"],
      ["gal-us", "gallon", "L", "liter"],
      ["in", "inch", "mm", "mm"],
      ["mA", "mA", "A", "A"],
    ];
    for (const [ours, theirs, ourTarget, theirTarget] of pairs)
      for (const value of [-3.7, 0.001, 1, 12.5, 4321])
        close(convert(value, ours, ourTarget), mathUnit(value, theirs).toNumber(theirTarget), 1e-5);
  });

  it("[U1] comes back to where it started", () => {
    for (const quantity of Quantity.options)
      for (const a of unitsOf(quantity))
        for (const b of unitsOf(quantity))
          fc.assert(
            fc.property(fc.double({ min: -1e5, max: 1e5, noNaN: true }), (value) => {
              expect(Math.abs(convert(convert(value, a.symbol, b.symbol), b.symbol, a.symbol) - value)).toBeLessThanOrEqual(
                1e-9 + Math.abs(value) * 1e-12,
              );
            }),
            { seed: 7, numRuns: 30 },
          );
  });

  it("[U2] refuses an unknown unit and a unit of another quantity", () => {
    expect(() => convert(1, "furlong", "mm")).toThrow(UnitRefused);
    expect(() => convert(1, "furlong", "mm")).toThrow(/"furlong" is not a unit/);
    expect(() => convert(1, "kPa", "V")).toThrow(/measures pressure/);
    expect(findUnit("toString")).toBeNull();
  });

  it("has units for every quantity of the schema, and knows other spellings", () => {
    for (const quantity of Quantity.options) expect(unitsOf(quantity).length, quantity).toBeGreaterThan(0);
    expect(findUnit("°C")?.symbol).toBe("C");
    expect(findUnit("Ω")?.symbol).toBe("ohm");
  });
});
