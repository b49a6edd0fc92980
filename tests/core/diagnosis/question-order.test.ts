import { describe, expect, it } from "vitest";
import { questionOrder, type OrderedStep } from "../../../lib/core/diagnosis/question-order";
import { smallTree } from "../../support/small-tree";
import { setting } from "./random-trees";

const tree = smallTree();
const begin = { profile: setting.profile, situation: setting.situation, person: setting.person, symptoms: [tree.symptoms[0]!.key] };
const order = (over: Partial<{ depth: number; chance: number; steps: number }> = {}) =>
  questionOrder(tree, begin, { depth: 6, chance: 0.02, steps: 100, ...over });

const below = (step: OrderedStep): readonly OrderedStep[] => [step, ...step.branches.flatMap(({ then }) => (then ? below(then) : []))];
const deepest = (step: OrderedStep): number => 1 + Math.max(0, ...step.branches.map(({ then }) => (then ? deepest(then) : 0)));

describe("the order of questions", () => {
  it("[Q1] lists every answer to every step once, with chances that sum to 1, and never the same step twice on one way", () => {
    const walk = (step: OrderedStep, before: readonly string[]): void => {
      expect(before).not.toContain(step.key);
      const chances = [...step.branches, ...step.rare].map(({ chance }) => chance);
      if (step.kind !== "call") expect(chances.reduce((sum, one) => sum + one, 0)).toBeCloseTo(1, 9);
      for (const { then } of step.branches) if (then) walk(then, [...before, step.key]);
    };
    const { first, possible } = order();
    expect(below(first).length).toBeGreaterThan(1);
    expect(possible.length).toBeGreaterThan(0);
    walk(first, []);
  });

  it("[Q2] folds what is rare, but for the likeliest answer", () => {
    for (const step of below(order({ chance: 0.3 }).first)) {
      expect(step.branches.slice(1).every(({ chance }) => chance >= 0.3)).toBe(true);
      expect(step.rare.every(({ chance }) => chance < 0.3)).toBe(true);
    }
  });

  it("[Q3] keeps within its depth and its size", () => {
    expect(deepest(order({ depth: 2 }).first)).toBe(2);
    expect(below(order({ steps: 3 }).first)).toHaveLength(3);
    expect(below(order({ steps: 1 }).first)).toHaveLength(1);
  });
});
