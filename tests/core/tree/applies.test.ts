import { describe, expect, test } from "vitest";
import { shareOfEngines } from "@/lib/core/tree/applies";
import type { Feature } from "@/lib/core/tree/schema";
import { treatedAsRail } from "@/lib/core/tree/treated-as-rail";

const feature = (key: string, options: Feature["options"]): Feature => ({ key, title: key, ask: `${key}?`, options });
const features = [
  feature("turbo", [
    { key: "turbo", title: "Turbo", share: 0.3 },
    { key: "none", title: "None", share: 0.7 },
  ]),
  feature("gearbox", [
    { key: "mechanical", title: "Mechanical", share: 0.5 },
    { key: "hydraulic", title: "Hydraulic" },
    { key: "saildrive", title: "Saildrive" },
  ]),
];
const nothingKnown = { features: {} };

describe("the share of engines a node applies to", () => {
  test("all, where it asks for nothing", () => expect(shareOfEngines(undefined, nothingKnown, "alongside", features)).toBe(1));

  test("all or none, where the profile knows", () => {
    const turbo = { features: { turbo: ["turbo"] } };
    expect(shareOfEngines(turbo, { features: { turbo: "turbo" } }, "alongside", features)).toBe(1);
    expect(shareOfEngines(turbo, { features: { turbo: "none" } }, "alongside", features)).toBe(0);
  });

  test("by the options' shares, where the profile does not know", () => {
    expect(shareOfEngines({ features: { turbo: ["turbo"] } }, nothingKnown, "alongside", features)).toBeCloseTo(0.3, 12);
    // The two options without a share part the half that is left.
    expect(shareOfEngines({ features: { gearbox: ["saildrive"] } }, nothingKnown, "alongside", features)).toBeCloseTo(0.25, 12);
    expect(shareOfEngines({ features: { gearbox: ["mechanical", "saildrive"] } }, nothingKnown, "alongside", features)).toBeCloseTo(
      0.75,
      12,
    );
  });

  test("the product, where it asks for several", () => {
    const both = { features: { turbo: ["turbo"], gearbox: ["mechanical"] } };
    expect(shareOfEngines(both, nothingKnown, "alongside", features)).toBeCloseTo(0.15, 12);
    expect(shareOfEngines(both, { features: { turbo: "none" } }, "alongside", features)).toBe(0);
  });

  test("half, where the tree does not know the feature itself", () =>
    expect(shareOfEngines({ features: { paint: ["red"] } }, nothingKnown, "alongside", features)).toBe(0.5));

  test("none, in another situation than it asks for", () => {
    const moored = { situations: ["alongside" as const] };
    expect(shareOfEngines(moored, nothingKnown, "under-way", features)).toBe(0);
    expect(shareOfEngines(moored, nothingKnown, "alongside", features)).toBe(1);
  });
});

test.each([
  ["in-line-pump", false],
  ["rotary-pump", false],
  ["unit-injectors", true],
  ["common-rail", true],
  [undefined, true],
])("injection %s: treated as a rail, %s", (injection, rail) => {
  expect(treatedAsRail({ features: injection === undefined ? {} : { injection } })).toBe(rail);
});
