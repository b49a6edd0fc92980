import type { Flaw } from "./flaw";
import { bandRules } from "./rules/bands";
import { causeRules } from "./rules/causes";
import { drawingRules } from "./rules/drawings";
import { findingRules } from "./rules/findings";
import { keyRules } from "./rules/keys";
import { knownCaseRules } from "./rules/known-cases";
import { orderRules } from "./rules/order";
import { reachRules } from "./rules/reach";
import { rivalRules } from "./rules/rivals";
import type { Once, Rule } from "./rules/rule";
import { safetyRules } from "./rules/safety";
import { stopRuleRules } from "./rules/stop-rules";
import { symptomRules } from "./rules/symptoms";
import { upkeepRules } from "./rules/upkeep";
import type { FaultTree } from "./schema";

/** All that a sound tree keeps to beyond its shape. */
export const RULES: readonly Rule[] = [
  ...keyRules,
  ...reachRules,
  ...findingRules,
  ...bandRules,
  ...causeRules,
  ...rivalRules,
  ...orderRules,
  ...symptomRules,
  ...safetyRules,
  ...drawingRules,
  ...stopRuleRules,
  ...upkeepRules,
  ...knownCaseRules,
];

/** Everything wrong with a tree that its shape alone does not show: errors first, then in the order of the rules. */
export function findFlaws(tree: FaultTree): Flaw[] {
  const once = onceFor(tree);
  const flaws = RULES.flatMap(({ name, severity, find }) => find(tree, once).map((found): Flaw => ({ severity, rule: name, ...found })));
  return [...flaws.filter(({ severity }) => severity === "error"), ...flaws.filter(({ severity }) => severity === "look-at")];
}

/** Kept for one run only: a tree may be changed before the next. */
function onceFor(tree: FaultTree): Once {
  const done = new Map<unknown, unknown>();
  return <T>(work: (tree: FaultTree) => T): T => {
    if (!done.has(work)) done.set(work, work(tree));
    return done.get(work) as T;
  };
}
