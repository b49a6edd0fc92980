import { expect, test } from "vitest";
import { profileInWords } from "@/components/engine/profile-in-words";
import type { Feature } from "@/lib/core/tree/schema";

const features: Feature[] = [
  {
    key: "exhaust",
    title: "Exhaust",
    ask: "?",
    options: [
      { key: "wet", title: "Wet: water comes out with it" },
      { key: "dry", title: "Dry" },
    ],
  },
  {
    key: "pre-heat",
    title: "Pre-heat",
    ask: "?",
    options: [
      { key: "glow-plugs", title: "Glow plugs" },
      { key: "none", title: "None" },
    ],
  },
  {
    key: "lift-pump",
    title: "Mechanical lift pump",
    ask: "?",
    options: [
      { key: "fitted", title: "Fitted" },
      { key: "not-fitted", title: "Not fitted" },
    ],
  },
];
const nothing = { features: {}, figures: {}, healthy: {} };

test("says what an engine is and has, and leaves out what it has not", () => {
  const profile = {
    ...nothing,
    cylinders: 4,
    ratedKw: 33,
    figures: { ratedRpm: 3000 },
    features: { exhaust: "wet", "pre-heat": "none", "lift-pump": "fitted" },
  };
  expect(profileInWords(profile, features)).toBe("4 cylinders, 33 kW at 3000 rpm, wet exhaust, mechanical lift pump");
});
test("says nothing of an engine of which nothing is known", () => {
  expect(profileInWords(nothing, features)).toBe("");
});
