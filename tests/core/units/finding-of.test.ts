import { describe, expect, it } from "vitest";
import type { Feature, Reading } from "../../../lib/core/tree/schema";
import { bandsOf } from "../../../lib/core/units/bands";
import { findingOf } from "../../../lib/core/units/finding-of";

const engine = { features: {}, figures: {}, healthy: {} };
const vacuum: Reading = {
  quantity: "pressure",
  unit: "inHg",
  from: 0,
  to: 30,
  bands: [
    { finding: "low", from: 0, to: { healthy: "filterVacuumKpa", plus: 3, otherwise: 5 } },
    { finding: "high", from: { healthy: "filterVacuumKpa", plus: 3, otherwise: 5 }, to: 30 },
  ],
};
const rpm: Reading = {
  quantity: "speed",
  unit: "rpm",
  from: 0,
  to: 6000,
  bands: [
    { finding: "short", from: 0, to: { of: "ratedRpm", times: 0.95 } },
    { finding: "full", from: { of: "ratedRpm", times: 0.95 }, to: 6000 },
  ],
};
const volts: Reading = {
  quantity: "voltage",
  unit: "V",
  from: 0,
  to: 32,
  bands: [
    { finding: "low", from: 0, to: 9.6, when: { features: { voltage: ["v12"] } } },
    { finding: "good", from: 9.6, to: 32, when: { features: { voltage: ["v12"] } } },
    { finding: "low", from: 0, to: 19.2, when: { features: { voltage: ["v24"] } } },
    { finding: "good", from: 19.2, to: 32, when: { features: { voltage: ["v24"] } } },
  ],
};
const features: Feature[] = [
  {
    key: "voltage",
    title: "Voltage",
    ask: "?",
    options: [
      { key: "v24", title: "24 V", share: 0.05 },
      { key: "v12", title: "12 V", share: 0.95 },
    ],
  },
];

describe("findingOf", () => {
  it("[U4] holds the lower edge and not the upper one", () => {
    expect(findingOf(vacuum, 4.999, engine)).toBe("low");
    expect(findingOf(vacuum, 5, engine)).toBe("high");
  });

  it("[U5] moves an edge with this engine's healthy reading, in its own unit", () => {
    const healthy = { ...engine, healthy: { filterVacuumKpa: 3.386388640341 } };
    expect(findingOf(vacuum, 3.9, healthy)).toBe("low");
    expect(findingOf(vacuum, 4.1, healthy)).toBe("high");
  });

  it("[U5] cannot judge against a figure that nobody has told", () => {
    expect(bandsOf(rpm, engine)).toBeNull();
    expect(findingOf(rpm, 2800, engine)).toBeNull();
    expect(findingOf(rpm, 2800, { ...engine, figures: { ratedRpm: 3000 } })).toBe("short");
    expect(findingOf(rpm, 2850, { ...engine, figures: { ratedRpm: 3000 } })).toBe("full");
  });

  it("[U5] takes the rows of this engine, and of the likeliest kind where nobody knows", () => {
    expect(findingOf(volts, 18, { ...engine, features: { voltage: "v24" } }, features)).toBe("low");
    expect(findingOf(volts, 18, { ...engine, features: { voltage: "v12" } }, features)).toBe("good");
    expect(findingOf(volts, 18, engine, features)).toBe("good");
  });

  it("[U6] counts what lies beyond the scale as its end", () => {
    expect(findingOf(vacuum, 45, engine)).toBe("high");
    expect(findingOf(vacuum, -2, engine)).toBe("low");
  });
});
