import { describe, expect, it } from "vitest";
import { believe } from "../../../lib/core/diagnosis/believe";
import { compile } from "../../../lib/core/diagnosis/compile";
import { lostTopEnd } from "./lost-top-end";

const setting = { profile: { features: {}, figures: {}, healthy: {} }, situation: "alongside", person: "skipper-in-port" } as const;
const model = compile(lostTopEnd(), setting);
const oneFault = compile(lostTopEnd(), { ...setting, faults: "one" });
const symptoms = [{ symptom: "lost-top-end-rpm", present: true }];

/** How many of 100 such engines have a blocked filter, alone or beside another fault. */
function percent(findings: Record<string, string>, of = model) {
  const told = Object.entries(findings).map(([check, finding]) => ({ check, finding }));
  const { marginals } = believe(of, { symptoms, findings: told, remedies: [] });
  const at = (index: number | undefined) => 100 * (marginals[index ?? -1] ?? NaN);
  return { filter: at(of.causeAt.get("primary-filter-blocked")), unknown: at(of.unknownAt) };
}
const within = (value: number, least: number, most: number) => {
  expect(value).toBeGreaterThanOrEqual(least);
  expect(value).toBeLessThanOrEqual(most);
};

describe("the first proof: a blocked primary filter among 42 causes of lost top revs", () => {
  // Taken alone it is 5.6; with pairs 6.1, since an engine with two faults is likelier to be one that is complained of.
  it("[S1] [S4] stands at about 5.5 % on the symptom alone where one fault is taken to be there, at 6 % with pairs; the unknown at its 5 %", () => {
    expect(model.causes).toHaveLength(42);
    within(percent({}, oneFault).filter, 5.3, 5.8);
    within(percent({}).filter, 5.8, 6.3);
    expect(percent({}).unknown).toBeCloseTo(5, 10);
  });

  it("[L2] stands at about 35 % with a high vacuum", () => {
    for (const of of [oneFault, model]) within(percent({ "filter-vacuum": "high" }, of).filter, 33, 39);
  });

  // With the unknown read as 0.8 mean + 0.2 even it would be 85 %; [K3] gives the unknown a little less of an odd finding.
  it("[L2] [K3] stands at 80 to 88 % with a high vacuum and slime in the bowl", () => {
    for (const of of [oneFault, model]) within(percent({ "filter-vacuum": "high", "bowl-look": "slime" }, of).filter, 80, 88);
  });

  it("[L2] stands at 12 to 23 % with a high vacuum and a bright bowl", () => {
    for (const of of [oneFault, model]) within(percent({ "filter-vacuum": "high", "bowl-look": "bright" }, of).filter, 12, 23);
  });

  // Read as 0.8 mean + 0.2 even these would be 6.5, 2.6 and 7 %: an odd finding would feed the unknown.
  it("[K3] one odd finding does not make the unknown explode", () => {
    within(percent({ "filter-vacuum": "high" }).unknown, 3, 5);
    within(percent({ "filter-vacuum": "high", "bowl-look": "slime" }).unknown, 0.7, 2.6);
    within(percent({ "filter-vacuum": "high", "bowl-look": "bright" }).unknown, 4, 7);
  });

  // Read as 0.8 mean + 0.2 even it would fall to 1.5 % after eight usual findings, although nothing in the tree has been found.
  it("[K3] the unknown grows with every usual finding", () => {
    let before = percent({}).unknown;
    const findings: Record<string, string> = {};
    for (let look = 1; look <= 8; look++) {
      findings[`look-${look}`] = "fine";
      const now = percent(findings).unknown;
      expect(now).toBeGreaterThan(before);
      before = now;
    }
    within(before, 6.5, 9);
  });
});
