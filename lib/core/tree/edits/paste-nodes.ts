import type { Cause, Check, FaultTree, Remedy, Symptom } from "../schema";
import { newKey, putNode } from "./put-node";

/** Nodes taken from a tree to be put into it, or into another, once more. */
export type Fragment = { symptoms: Symptom[]; checks: Check[]; causes: Cause[]; remedies: Remedy[] };
type Listed = keyof Fragment;
const LISTS: readonly Listed[] = ["symptoms", "checks", "causes", "remedies"];

/** The nodes with these keys, of the kinds that can be copied. */
export function copyNodes(tree: FaultTree, keys: ReadonlySet<string>): Fragment {
  const picked = <T extends { key: string }>(list: readonly T[]): T[] => list.filter(({ key }) => keys.has(key));
  return { symptoms: picked(tree.symptoms), checks: picked(tree.checks), causes: picked(tree.causes), remedies: picked(tree.remedies) };
}

/**
 * The tree with copied nodes put in under new keys, and those keys. Links
 * among the copied nodes lead to the copies; other links stay where this tree
 * has the node they lead to, and are left behind where it has not.
 */
export function pasteNodes(tree: FaultTree, fragment: Fragment): { tree: FaultTree; keys: string[] } {
  const names = new Map<string, string>();
  const taken = new Set(LISTS.flatMap((list) => tree[list].map(({ key }) => key)));
  for (const list of LISTS)
    for (const { key, title } of fragment[list]) {
      const fresh = newKey(tree, title, taken);
      taken.add(fresh);
      names.set(`${list} ${key}`, fresh);
    }
  const here = new Set(LISTS.flatMap((list) => tree[list].map(({ key }) => `${list} ${key}`)));
  const named = (list: Listed, key: string): string | null => names.get(`${list} ${key}`) ?? (here.has(`${list} ${key}`) ? key : null);

  const pasted: Fragment = {
    symptoms: fragment.symptoms,
    checks: fragment.checks.map((check) => pastedCheck(check, named)),
    causes: fragment.causes.map((cause) => pastedCause(cause, named)),
    remedies: fragment.remedies.map((remedy) => pastedRemedy(remedy, named, (key) => names.get(`causes ${key}`))),
  };
  const joined = LISTS.reduce(
    (now, list) =>
      pasted[list].reduce((into, node) => putNode(into, list, { ...node, key: names.get(`${list} ${node.key}`) ?? node.key }), now),
    tree,
  );
  return { tree: joined, keys: [...names.values()] };
}

type Named = (list: Listed, key: string) => string | null;

function pastedCheck(check: Check, named: Named): Check {
  return {
    ...check,
    after: pastedAfter(check.after, named),
    firstFor: renamed(check.firstFor, (key) => named("symptoms", key)),
    findings: check.findings.map((finding) =>
      finding.restates === undefined ? finding : { ...finding, restates: named("symptoms", finding.restates) ?? undefined },
    ),
  };
}

function pastedCause(cause: Cause, named: Named): Cause {
  return {
    ...cause,
    shows: renamed(cause.shows, (key) => named("symptoms", key)),
    gives: renamed(cause.gives, (key) => named("checks", key)),
    curedBy: renamed(cause.curedBy, (key) => named("remedies", key)),
    broughtOnBy: renamed(cause.broughtOnBy, (key) => named("causes", key)),
  };
}

/** A cause is guarded once: a copy guards the causes that were copied with it, and no other. */
function pastedRemedy({ upkeep, ...remedy }: Remedy, named: Named, copied: (cause: string) => string | undefined): Remedy {
  const guards = upkeep?.guards.flatMap((key) => copied(key) ?? []) ?? [];
  return {
    ...remedy,
    after: pastedAfter(remedy.after, named),
    ...(upkeep === undefined || guards.length === 0 ? {} : { upkeep: { ...upkeep, guards } }),
  };
}

function pastedAfter(after: Check["after"], named: Named): Check["after"] {
  return after.flatMap((before) => {
    const key = "check" in before ? named("checks", before.check) : named("remedies", before.remedy);
    if (key === null) return [];
    return ["check" in before ? { ...before, check: key } : { remedy: key }];
  });
}

function renamed<T>(map: Readonly<Record<string, T>>, name: (key: string) => string | null): Record<string, T> {
  return Object.fromEntries(
    Object.entries(map).flatMap(([key, value]) => {
      const to = name(key);
      return to === null ? [] : [[to, value]];
    }),
  );
}
