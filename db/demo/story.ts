import type { EngineProfile } from "@/lib/core/contract/engine";

/** The demo fleet: a scenario of our own. People, boats and what happened to them are invented. */
export const PASSWORD = "three dry matches";

export type Who = "owner" | "mechanic" | "skipper" | "stranger";

export const PEOPLE = [
  { who: "owner", name: "Hanne Vestergard", email: "owner@example.test", roles: ["owner", "skipper"] },
  { who: "mechanic", name: "Tomas Quill", email: "mechanic@example.test", roles: ["mechanic"] },
  { who: "skipper", name: "Wren Ashdown", email: "skipper@example.test", roles: ["skipper"] },
] as const;

/** Of another fleet: sees nothing of the first. */
export const STRANGER = {
  who: "stranger",
  name: "Odile Marsh",
  email: "stranger@example.test",
  fleet: "Marsh and daughter",
  boat: "Late Breakfast",
} as const;

export const FLEET = "Saltmarsh Boats";

const features = {
  cooling: "heat-exchanger",
  exhaust: "wet",
  injection: "in-line-pump",
  "pre-heat": "glow-plugs",
  "mechanical-lift-pump": "fitted",
  "primary-filter": "fitted",
  "vacuum-gauge": "fitted",
  turbo: "none",
  governor: "mechanical",
  voltage: "v12",
};
const figures = { ratedRpm: 3000, noLoadRpm: 3200, idleRpm: 850 };

export type DemoEngine = {
  key: string;
  boat: string;
  name: string;
  profile: EngineProfile;
  /** Without a meter: hours run in a usual year. */
  hoursPerYear?: number;
  /** What the meter showed, or somebody reckoned, so many days before today: [days before, hours], oldest first. */
  meter: readonly (readonly [number, number])[];
};

// Little in winter, much in summer.
export const ENGINES: readonly DemoEngine[] = [
  {
    key: "marrowfat",
    boat: "Marrowfat",
    name: "main engine",
    profile: { features, figures, healthy: { filterVacuumKpa: 5, topRpmInGear: 2900 }, cylinders: 4, ratedKw: 38 },
    meter: [
      [548, 1204],
      [480, 1268],
      [410, 1349],
      [340, 1430],
      [270, 1472],
      [200, 1498],
      [140, 1561],
      [80, 1632],
      [30, 1679],
      [3, 1702],
    ],
  },
  {
    key: "candlewick",
    boat: "Candlewick",
    name: "main engine",
    profile: {
      features: { ...features, cooling: "raw-water", "vacuum-gauge": "not-fitted" },
      figures: { ratedRpm: 3600 },
      healthy: {},
      cylinders: 2,
      ratedKw: 14,
    },
    meter: [
      [540, 640],
      [430, 742],
      [330, 845],
      [220, 898],
      [120, 985],
      [8, 1064],
    ],
  },
  {
    key: "whistle-port",
    boat: "Tin Whistle",
    name: "port",
    profile: { features, figures, healthy: {}, cylinders: 4, ratedKw: 55 },
    meter: twin(0),
  },
  // Simply well: nothing in its log but hours.
  {
    key: "whistle-starboard",
    boat: "Tin Whistle",
    name: "starboard",
    profile: { features, figures, healthy: {}, cylinders: 4, ratedKw: 55 },
    meter: twin(6),
  },
  {
    key: "supper",
    boat: "Late Supper",
    name: "main engine",
    profile: { features: {}, figures: {}, healthy: {} },
    hoursPerYear: 90,
    // What the last owner reckoned.
    meter: [[545, 1100]],
  },
];

function twin(offset: number): readonly (readonly [number, number])[] {
  return [
    [545, 2310 + offset],
    [450, 2395 + offset],
    [350, 2502 + offset],
    [250, 2548 + offset],
    [150, 2633 + offset],
    [60, 2731 + offset],
    [2, 2790 + offset],
  ];
}
