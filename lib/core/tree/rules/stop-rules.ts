import type { EngineState, FaultTree, StopRule } from "../schema";
import { ruleNode, type Found, type Rule } from "./rule";

const on = (tree: FaultTree, wrong: (rule: StopRule) => boolean, says: string, mend: string): Found[] =>
  tree.stopRules.filter(wrong).map((rule) => ({ node: ruleNode(rule), says, mend }));

const withoutTrigger = (tree: FaultTree): Found[] =>
  on(
    tree,
    ({ when }) => when.symptoms.length === 0 && when.findings.length === 0 && when.crankSeconds === undefined,
    "nothing brings it into force.",
    'Say under "when" which symptoms, findings or seconds of cranking do.',
  );

const neverAsked = (tree: FaultTree): Found[] =>
  on(
    tree,
    ({ when, ask }) => when.symptoms.length > 0 && ask === undefined,
    "it goes with symptoms, but has no question to ask.",
    'Add "ask": the question whose yes brings it into force.',
  );

const neverCleared = (tree: FaultTree): Found[] =>
  on(
    tree,
    ({ clearedBy, clearedWhen }) => clearedBy.length === 0 && clearedWhen === undefined,
    "nothing clears it, so it stays for ever.",
    'Name the finding that does under "clearedBy", or what a person has to say under "clearedWhen".',
  );

/** What each kind of rule has to keep people from; a rule that names no states forbids what its kind means. */
const MUST_FORBID: Readonly<Partial<Record<StopRule["kind"], readonly EngineState[]>>> = {
  stop: ["cranking", "idling", "under-load"],
  "no-crank": ["cranking"],
};

function forbidsTooLittle(tree: FaultTree): Found[] {
  return tree.stopRules.flatMap((rule) => {
    const missing = (MUST_FORBID[rule.kind] ?? []).filter((state) => !rule.forbids.includes(state));
    return rule.forbids.length === 0 || missing.length === 0
      ? []
      : [
          {
            node: ruleNode(rule),
            says: `a rule of kind "${rule.kind}" has to forbid ${missing.join(", ")} too.`,
            mend: 'Add it under "forbids", or choose another kind.',
          },
        ];
  });
}

/** Fire, carbon monoxide, a runaway and a fuel mist kill aboard; every other stop knows the lee shore. */
const NO_EXCEPTION = /(^|-)(fire|co|carbon|monoxide|runaway|mist)(-|$)/;

const withoutException = (tree: FaultTree): Found[] =>
  on(
    tree,
    ({ kind, key, runOnIfStoppingEndangers }) => kind === "stop" && !runOnIfStoppingEndangers && !NO_EXCEPTION.test(key),
    "it knows no exception for when stopping puts people or the boat in danger.",
    'Set "runOnIfStoppingEndangers: true", unless running on is the greater danger.',
  );

const exceptionWhereNone = (tree: FaultTree): Found[] =>
  on(
    tree,
    ({ kind, key, runOnIfStoppingEndangers }) => kind === "stop" && runOnIfStoppingEndangers && NO_EXCEPTION.test(key),
    "it lets people run on through fire, exhaust gas, a runaway or a fuel mist.",
    'Set "runOnIfStoppingEndangers: false".',
  );

/** Engine states in which a check cannot have been made on a running engine. */
const AT_REST: readonly EngineState[] = ["cold", "stopped", "cranking"];

/** Does all that brings the rule into force mean that the engine stands? */
function tellsOfOneThatStands({ when }: StopRule, tree: FaultTree): boolean {
  if (when.symptoms === "*") return false;
  const dead = when.symptoms.every((key) => tree.symptoms.find((symptom) => symptom.key === key)?.rulesOut?.includes("idling") ?? false);
  const atRest = when.findings.every((ref) => AT_REST.includes(tree.checks.find(({ key }) => key === ref.check)?.engine ?? "any"));
  return dead && atRest;
}

const runsOnWhatStands = (tree: FaultTree): Found[] =>
  on(
    tree,
    (rule) => rule.kind === "no-crank" && rule.runOnIfStoppingEndangers && tellsOfOneThatStands(rule, tree),
    "it lets people run on, and nothing brings it into force but an engine that stands already.",
    'Set "runOnIfStoppingEndangers: false".',
  );

export const stopRuleRules: readonly Rule[] = [
  { name: "stop-rule-without-trigger", severity: "error", find: withoutTrigger },
  { name: "stop-rule-never-asked", severity: "error", find: neverAsked },
  { name: "stop-rule-never-cleared", severity: "error", find: neverCleared },
  { name: "stop-rule-forbids-too-little", severity: "error", find: forbidsTooLittle },
  { name: "stop-rule-without-exception", severity: "look-at", find: withoutException },
  { name: "stop-rule-runs-on-what-stands", severity: "look-at", find: runsOnWhatStands },
  { name: "stop-rule-runs-on-in-mortal-danger", severity: "error", find: exceptionWhereNone },
];
