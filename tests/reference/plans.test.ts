import { describe, expect, it } from "vitest";
import { believe } from "../../lib/core/diagnosis/believe";
import { callingMinutes } from "../../lib/core/diagnosis/calling-minutes";
import { compile } from "../../lib/core/diagnosis/compile";
import { NO_EVIDENCE, type Evidence } from "../../lib/core/diagnosis/evidence";
import type { Model } from "../../lib/core/diagnosis/model";
import { nextStep } from "../../lib/core/diagnosis/next-step";
import type { FaultTree } from "../../lib/core/tree/schema";
import { setting } from "../core/diagnosis/random-trees";
import { cause, check, finding, remedy, tree } from "../core/diagnosis/small-trees";
import { leastMinutes } from "./oracle";

/** Mulberry32. */
function dice(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Seven causes in systems, system checks and component checks, a remedy a cause of which some help another cause too. */
function randomTree(roll: () => number): FaultTree {
  const between = (least: number, most: number) => least + (most - least) * roll();
  const normal = () => Math.sqrt(-2 * Math.log(1 - roll())) * Math.cos(2 * Math.PI * roll());
  const indices = (count: number) => Array.from({ length: count }, (_, index) => index);
  const causes = 7;
  const checks = indices(5).map((index) => {
    const target = Math.floor(roll() * causes);
    const hits = indices(causes).filter((one) => (index < 3 ? one % 3 === target % 3 : one === target));
    return {
      key: `check-${index}`,
      hits,
      positive: between(0.75, 0.98),
      falsely: between(0.01, 0.2),
      minutes: (index < 3 ? 4.5 : 12) * Math.exp(0.5 * normal()),
    };
  });
  return tree({
    causes: indices(causes).map((index) =>
      cause(`cause-${index}`, {
        base: Math.exp(1.1 * normal()),
        gives: Object.fromEntries(checks.filter(({ hits }) => hits.includes(index)).map(({ key, positive }) => [key, { yes: positive }])),
        curedBy: {
          [`mend-${index}`]: between(0.85, 0.99),
          ...(roll() < 0.25 ? { [`mend-${(index + 1) % causes}`]: between(0.5, 0.99) } : {}),
        },
      }),
    ),
    checks: checks.map(({ key, falsely, minutes }) =>
      check(key, [finding("no", { usual: true, sound: 1 - falsely }), finding("yes", { sound: falsely })], { minutes }),
    ),
    remedies: indices(causes).map((index) => remedy(`mend-${index}`, { minutes: 25 * Math.exp(0.5 * normal()), tryOut: { minutes: 0 } })),
  });
}

/** What the planner's own plan costs, exactly: every answer followed, weighed by its chance. */
function plannedMinutes(model: Model, evidence: Evidence = NO_EVIDENCE): number {
  const step = nextStep(model, evidence);
  const { shares } = believe(model, evidence);
  if (step.kind === "call") return callingMinutes(model, shares);
  if (step.kind === "remedy") {
    const tried = model.remedies[model.remedyAt.get(step.key)!]!;
    const fails = 1 - shares.reduce((sum, share, index) => sum + share * tried.cure[index]!, 0);
    return (
      tried.minutes +
      fails * plannedMinutes(model, { ...evidence, remedies: [...evidence.remedies, { remedy: step.key, result: "no-change" }] })
    );
  }
  const asked = model.checks[model.checkAt.get(step.key)!]!;
  return asked.check.findings.reduce((sum, { key }, at) => {
    const chance = shares.reduce((all, share, index) => all + share * asked.rows[at]![index]!, 0);
    return sum + chance * plannedMinutes(model, { ...evidence, findings: [...evidence.findings, { check: step.key, finding: key }] });
  }, asked.minutes);
}

describe("plans", () => {
  it("cost at most 1 % over the exact optimum on average, and 5 % at worst, on 60 small models", () => {
    const roll = dice(8_1);
    const over = Array.from({ length: 60 }, () => {
      const model = compile(randomTree(roll), { ...setting, callMinutes: 400 });
      const least = leastMinutes(model);
      return plannedMinutes(model) / least - 1;
    });
    const mean = over.reduce((sum, one) => sum + one, 0) / over.length;
    expect(Math.min(...over)).toBeGreaterThan(-1e-9);
    expect(mean).toBeLessThan(0.01);
    expect(Math.max(...over)).toBeLessThan(0.05);
  }, 150_000);
});
