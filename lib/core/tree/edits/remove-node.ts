import { LIST_KINDS, type ListName } from "../flaw";
import { referencesOf } from "../references";
import type { Cause, Check, FaultTree, Finding, KnownCase, Remedy, StopRule } from "../schema";

/**
 * The tree without a node and without the links to it. What would be left
 * meaningless goes with its link (a stop rule's finding of a removed check),
 * never a node on its own: the soundness rules then say what is missing.
 *
 * Refused, in words, for what other nodes have to have one of: a system, a feature, a source or a caution that is in use.
 */
export function removeNode(tree: FaultTree, list: ListName, key: string): { tree: FaultTree } | { refused: string } {
  const users = usersOf(tree, list, key);
  const first = users[0];
  if (first !== undefined && !UNLINKED[list])
    return {
      refused: `${users.length === 1 ? "One node uses" : `${users.length} nodes use`} this, first the ${first.kind} "${first.key}". Take it out there first.`,
    };
  const without = { ...tree, [list]: tree[list].filter((node) => node.key !== key) } as FaultTree;
  return { tree: UNLINKED[list]?.(without, key) ?? without };
}

/** The nodes that name this one, each once. */
export function usersOf(tree: FaultTree, list: ListName, key: string): { kind: string; key: string }[] {
  const kind = LIST_KINDS[list];
  const users = referencesOf(tree).filter((reference) => reference.to === kind && reference.key === key);
  return [...new Map(users.map(({ from }) => [`${from.kind} ${from.key}`, from])).values()];
}

const UNLINKED: Readonly<Partial<Record<ListName, (tree: FaultTree, key: string) => FaultTree>>> = {
  symptoms: (tree, key) => ({
    ...tree,
    causes: tree.causes.map((cause): Cause => ({ ...cause, shows: without(cause.shows, key) })),
    checks: tree.checks.map((check): Check => ({
      ...check,
      firstFor: without(check.firstFor, key),
      findings: check.findings.map((finding): Finding => (finding.restates === key ? { ...finding, restates: undefined } : finding)),
    })),
    stopRules: tree.stopRules.map((rule): StopRule => ({
      ...rule,
      when: { ...rule.when, symptoms: rule.when.symptoms === "*" ? "*" : rule.when.symptoms.filter((other) => other !== key) },
    })),
    knownCases: tree.knownCases.map((known): KnownCase => ({ ...known, symptoms: known.symptoms.filter((other) => other !== key) })),
  }),
  checks: (tree, key) => ({
    ...tree,
    causes: tree.causes.map((cause): Cause => ({ ...cause, gives: without(cause.gives, key) })),
    checks: tree.checks.map((check): Check => ({
      ...check,
      after: check.after.filter((before) => !("check" in before) || before.check !== key),
    })),
    remedies: tree.remedies.map((remedy): Remedy => ({
      ...remedy,
      after: remedy.after.filter((before) => !("check" in before) || before.check !== key),
    })),
    stopRules: tree.stopRules.map((rule): StopRule => ({
      ...rule,
      when: { ...rule.when, findings: rule.when.findings.filter(({ check }) => check !== key) },
      clearedBy: rule.clearedBy.filter(({ check }) => check !== key),
    })),
    knownCases: tree.knownCases.map((known): KnownCase => ({ ...known, findings: known.findings.filter(({ check }) => check !== key) })),
  }),
  causes: (tree, key) => ({
    ...tree,
    causes: tree.causes.map((cause): Cause => ({ ...cause, broughtOnBy: without(cause.broughtOnBy, key) })),
    remedies: tree.remedies.map((remedy) => notGuarding(remedy, key)),
    knownCases: tree.knownCases.map((known): KnownCase => ({
      ...known,
      causes: known.causes.filter((cause) => cause !== key),
      alsoAccept: known.alsoAccept.filter(({ cause }) => cause !== key),
    })),
    ...(tree.inseparable === undefined ? {} : { inseparable: tree.inseparable.filter(({ causes }) => !causes.includes(key)) }),
  }),
  remedies: (tree, key) => ({
    ...tree,
    knownCases: tree.knownCases.map((known): KnownCase => ({ ...known, tried: known.tried?.filter(({ remedy }) => remedy !== key) })),
    causes: tree.causes.map((cause): Cause => ({ ...cause, curedBy: without(cause.curedBy, key) })),
    checks: tree.checks.map((check): Check => ({
      ...check,
      after: check.after.filter((before) => !("remedy" in before) || before.remedy !== key),
    })),
    remedies: tree.remedies.map((remedy): Remedy => ({
      ...remedy,
      after: remedy.after.filter((before) => !("remedy" in before) || before.remedy !== key),
    })),
  }),
};

/** Upkeep that guards nothing any more is none. */
function notGuarding({ upkeep, ...remedy }: Remedy, cause: string): Remedy {
  const guards = upkeep?.guards.filter((key) => key !== cause) ?? [];
  return upkeep === undefined || guards.length === 0 ? remedy : { ...remedy, upkeep: { ...upkeep, guards } };
}

function without<T>(map: Readonly<Record<string, T>>, key: string): Record<string, T> {
  return Object.fromEntries(Object.entries(map).filter(([other]) => other !== key));
}
