import { beforeAll, describe, expect, test } from "vitest";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";
import { allWordsOf, clausesOf, FORBIDDEN, isForbidden, OBSERVED, STEP_RULES, stepsOf, type Rule, type Step } from "./step-rules";
import { STEP_EXCEPTIONS } from "./step-exceptions";
import { typographic } from "@/lib/core/tree/typographic";

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

type Hit = { node: string; clause: string };

/** Clauses that ask for something the step does not have, those that forbid it left out. */
const hitsOf = ({ speaks, holds }: Rule): Hit[] =>
  stepsOf(tree)
    .filter((step: Step) => !holds(step))
    .flatMap((step) =>
      clausesOf(step.step)
        .filter((clause) => speaks(clause, step) && !isForbidden(clause))
        .map((clause) => ({ node: step.node, clause })),
    );

describe("what the steps say agrees with what the step carries", () => {
  test.each(STEP_RULES)("$key: $wants", (rule) => {
    const excused = ({ node, clause }: Hit) =>
      STEP_EXCEPTIONS.some((one) => one.rule === rule.key && one.node === node && clause.includes(typographic(one.words)));
    expect(hitsOf(rule).filter((hit) => !excused(hit))).toEqual([]);
  });

  test("every exception is still needed", () => {
    const idle = STEP_EXCEPTIONS.filter(({ rule, node, words }) => {
      const of = STEP_RULES.find(({ key }) => key === rule);
      return of === undefined || !hitsOf(of).some((hit) => hit.node === node && hit.clause.includes(typographic(words)));
    });
    expect(idle).toEqual([]);
  });
});

describe("words that nobody may be told", () => {
  test.each(FORBIDDEN)("$key", ({ word, unless }) => {
    const texts = [
      ...stepsOf(tree).flatMap(({ node, step }) => allWordsOf(step).map((says) => ({ node, says }))),
      ...tree.stopRules.flatMap((rule) => [...rule.says, rule.because].map((says) => ({ node: rule.key, says }))),
      ...tree.cautions.map(({ key, says }) => ({ node: key, says })),
    ];
    const told = texts.filter(({ says }) => says.split(/(?<=[.;])\s+/).some((clause) => word.test(clause) && !unless.test(clause)));
    expect(told).toEqual([]);
  });
});

test("no check or remedy that a skipper may do opens high-pressure fuel", () => {
  const open = stepsOf(tree).filter(({ step }) => step.flags.opensHighPressureFuel === true && step.who.startsWith("skipper"));
  expect(open.map(({ node }) => node)).toEqual([]);
});

test("every remedy says how it is proved, by something seen, read or counted", () => {
  const vague = tree.remedies.filter(({ proof }) => proof.split(/\s+/).length < 3 || !OBSERVED.test(proof));
  expect(vague.map(({ key, proof }) => `${key}: ${proof}`)).toEqual([]);
});
