import type { FindingLink } from "../../../lib/core/tree/finding-link";
import { describe, expect, it } from "vitest";
import { causeRow } from "../../../lib/core/diagnosis/cause-row";
import { soundRow } from "../../../lib/core/diagnosis/sound-row";
import { check, finding } from "./small-trees";

const look = check("look", ["fine", "odd", "worse"]);
const gauge = check(
  "gauge",
  [finding("none", { sound: 0.05 }), finding("low", { usual: true }), finding("raised", { sound: 0.1 }), finding("high", { sound: 0.05 })],
  {
    reading: {
      quantity: "pressure",
      unit: "kPa",
      from: 0,
      to: 40,
      bands: ["none", "low", "raised", "high"].map((key, index) => ({ finding: key, from: index * 10, to: index * 10 + 10 })),
    },
  },
);
const row = (of: typeof look, links: Record<string, FindingLink>) => [...causeRow(of, links, soundRow(of))];
const close = (actual: number[], wanted: number[]) => actual.forEach((one, index) => expect(one).toBeCloseTo(wanted[index] ?? NaN, 10));

describe("rows of findings", () => {
  it("[L1] unusual findings are seen on 1 sound engine in 20 and the usual one on the rest", () => {
    close([...soundRow(look)], [0.9, 0.05, 0.05]);
    close([...soundRow(gauge)], [0.05, 0.8, 0.1, 0.05]);
  });

  it("[L2] a factor multiplies the sound engine's odds of the finding", () => {
    const [fine = 0, odd = 0, worse = 0] = row(look, { odd: "x20" });
    expect(odd / (1 - odd)).toBeCloseTo((20 * 0.05) / 0.95, 10);
    expect(fine / worse).toBeCloseTo(18, 10);
  });

  it("[L2] several factors keep each its proportion to what is not linked", () => {
    const [fine = 0, odd = 0, worse = 0] = row(look, { odd: "x20", fine: "x1/3" });
    expect(odd / worse).toBeCloseTo(20, 10);
    expect(fine / worse).toBeCloseTo(6, 10);
  });

  it("[L3] a strength is the finding's share; the others share the rest as a sound engine would", () => {
    close(row(look, { odd: "usually" }), [(0.2 * 0.9) / 0.95, 0.8, (0.2 * 0.05) / 0.95]);
  });

  it("[L4] a span of bands is linked as one", () => {
    const [none = 0, low = 0, raised = 0, high = 0] = row(gauge, { "raised..high": 0.6 });
    expect(raised + high).toBeCloseTo(0.6, 10);
    expect(raised / high).toBeCloseTo(2, 10);
    expect(low / none).toBeCloseTo(16, 10);
    const byFactor = row(gauge, { "raised..high": "x20" });
    expect(((byFactor[2] ?? 0) + (byFactor[3] ?? 0)) / ((byFactor[0] ?? 0) + (byFactor[1] ?? 0))).toBeCloseTo((20 * 0.15) / 0.85, 10);
  });

  it("[L5] an unusual band beside a linked one gets the square root of its factor, unless a link says otherwise", () => {
    const [none = 0, low = 0, raised = 0, high = 0] = row(gauge, { high: "x60" });
    expect(raised / low).toBeCloseTo((Math.sqrt(60) * 0.1) / 0.8, 10);
    expect(high / low).toBeCloseTo((60 * 0.05) / 0.8, 10);
    expect(none / low).toBeCloseTo(0.05 / 0.8, 10);
    const told = row(gauge, { high: "x60", raised: "x5" });
    expect((told[2] ?? 0) / (told[1] ?? 1)).toBeCloseTo((5 * 0.1) / 0.8, 10);
  });

  it("[L6] no finding is impossible", () => {
    expect(Math.min(...row(look, { odd: 0.999, fine: 0.0009 }))).toBeGreaterThan(0.0009);
  });
});
