import type { Cause, FaultTree } from "../../../lib/core/tree/schema";
import { cause, check, finding, symptom, tree } from "./small-trees";

/**
 * The causes of lost top revs as the trade grades them: the grade within this
 * symptom, then the highest grade anywhere. C common, O occasional, R rare.
 */
const GRADES = `tank-vent-blocked:RO pickup-blocked:OC fuel-line-restricted:OO primary-filter-blocked:CC secondary-filter-blocked:CC
lift-pump-failed:OO lift-pump-strainer-blocked:OO return-line-blocked:RO fuel-antisiphon-stuck:RR microbial-growth:OC wrong-fuel:RR
injector-nozzle-blocked:OC injection-pump-worn:OC injection-timing-late:OO common-rail-pressure-low:OO speed-sensor-or-ecu-fault:OO
air-filter-blocked:OC intake-obstructed:OO engine-space-airless:OO exhaust-elbow-coked:CC exhaust-hose-delaminated:OO
exhaust-outlet-blocked:OO exhaust-manifold-coked:RR rings-worn:OC valves-leaking:OC valve-clearance-wide:RC throttle-cable-slipped:CC
max-stop-misadjusted:RO governor-worn:RO turbo-fouled:CC turbo-bearing-failed:OO wastegate-stuck-open:RO charge-air-leak:CC
charge-cooler-fouled:OO hull-fouled:CC prop-fouled-growth:CC prop-rope:OC prop-damaged:OC prop-oversized:CC prop-folding-stuck:OC
stern-gland-tight:RO accessory-load:OO`;

const BASE = { C: "common", O: "occasional", R: "rare" } as const;
const WEIGHT = { C: 10, O: 3, R: 1 } as const;
type Grade = keyof typeof BASE;

/** +++ 60, ++ 20, + 5, - 1/3: odds against a sound engine's. */
const GIVES: Record<string, Cause["gives"]> = {
  "primary-filter-blocked": { "filter-vacuum": { high: "x60" }, "bowl-look": { slime: "x20", bright: "x1/3" } },
  "pickup-blocked": { "filter-vacuum": { high: "x20" } },
  "fuel-line-restricted": { "filter-vacuum": { high: "x20" } },
  "lift-pump-failed": { "filter-vacuum": { "near-none": "x20" } },
  "secondary-filter-blocked": { "filter-vacuum": { "near-none": "x5" } },
  "microbial-growth": { "bowl-look": { slime: "x60" } },
};

const vacuum = check(
  "filter-vacuum",
  [
    finding("near-none", { sound: 0.03 }),
    finding("normal", { usual: true }),
    finding("raised", { sound: 0.12 }),
    finding("high", { sound: 0.05 }),
  ],
  {
    reading: {
      quantity: "pressure",
      unit: "kPa",
      from: 0,
      to: 100,
      bands: [
        { finding: "near-none", from: 0, to: 2 },
        { finding: "normal", from: 2, to: 13 },
        { finding: "raised", from: 13, to: 25 },
        { finding: "high", from: 25, to: 100 },
      ],
    },
  },
);

const bowl = check("bowl-look", ["bright", "water", "slime", "grit", "bubbles", "haze"]);

/** Eight plain looks at other parts, each with an unusual finding that three causes give. */
const others = Array.from({ length: 8 }, (_, index) => check(`look-${index + 1}`, ["fine", "not-fine"]));

/** The first proof's tree: one symptom, its 42 causes, two checks worked out by hand, and eight more. */
export function lostTopEnd(): FaultTree {
  const causes = GRADES.split(/\s+/).map((line, index) => {
    const [key = "", grades = ""] = line.split(":");
    const [here, highest] = grades as unknown as [Grade, Grade];
    const look = index % 14 < 8 ? { [`look-${(index % 14) + 1}`]: { "not-fine": "x20" as const } } : {};
    return cause(key, {
      base: BASE[highest],
      shows: { "lost-top-end-rpm": (0.8 * WEIGHT[here]) / WEIGHT[highest] },
      gives: { ...GIVES[key], ...look },
    });
  });
  return tree({ symptoms: [symptom("lost-top-end-rpm")], causes, checks: [vacuum, bowl, ...others] });
}
