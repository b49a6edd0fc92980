import { LIST_KINDS, type NodeKind } from "../flaw";
import { didYouMean } from "../nearest";
import { referencesOf, type Reference } from "../references";
import type { FaultTree } from "../schema";
import { twice, type Found, type Rule } from "./rule";

/** Kinds that share one space of keys: evidence and events name them by key alone. */
const SPACES: readonly (readonly NodeKind[])[] = [
  ["symptom", "check", "cause", "remedy"],
  ["caution", "stop rule"],
  ["system"],
  ["feature"],
  ["source"],
  ["known case"],
];

function nodesOf(tree: FaultTree): { kind: NodeKind; key: string }[] {
  return Object.entries(LIST_KINDS).flatMap(([list, kind]) => tree[list as keyof typeof LIST_KINDS].map(({ key }) => ({ kind, key })));
}

function keysTwice(tree: FaultTree): Found[] {
  const nodes = nodesOf(tree);
  return SPACES.flatMap((space) => {
    const inSpace = nodes.filter(({ kind }) => space.includes(kind));
    return twice(inSpace.map(({ key }) => key)).flatMap((key) => {
      const [first, ...others] = inSpace.filter((node) => node.key === key);
      return others.map((node) => ({
        node,
        says: `a ${first?.kind ?? "node"} has this key already.`,
        mend: "Give one of them another key.",
      }));
    });
  });
}

function partsTwice(tree: FaultTree): Found[] {
  return [
    ...tree.checks.flatMap((check) =>
      twice(check.findings.map(({ key }) => key)).map((key) => ({
        node: { kind: "check" as const, key: check.key },
        says: `two findings have the key "${key}".`,
        mend: "Give one of them another key.",
      })),
    ),
    ...tree.features.flatMap((feature) =>
      twice(feature.options.map(({ key }) => key)).map((key) => ({
        node: { kind: "feature" as const, key: feature.key },
        says: `two options have the key "${key}".`,
        mend: "Give one of them another key.",
      })),
    ),
  ];
}

function unknownKeys(tree: FaultTree): Found[] {
  const known = new Map<string, Set<string>>();
  const add = (space: string, key: string) => known.set(space, (known.get(space) ?? new Set()).add(key));
  for (const { kind, key } of nodesOf(tree)) add(kind, key);
  for (const check of tree.checks) for (const { key } of check.findings) add(`finding of ${check.key}`, key);
  for (const feature of tree.features) for (const { key } of feature.options) add(`option of ${feature.key}`, key);

  const unknown = (reference: Reference): Found[] => {
    const { to, of, key, field, from } = reference;
    // Its owner is unknown: said once, of the owner.
    if (of !== undefined && !known.get(to === "finding" ? "check" : "feature")?.has(of)) return [];
    const space = known.get(of === undefined ? to : `${to} of ${of}`) ?? new Set<string>();
    if (space.has(key)) return [];
    const owner = of === undefined ? "" : ` of ${to === "finding" ? "check" : "feature"} ${of}`;
    return [
      {
        node: from,
        says: `"${field}" names the ${to} "${key}"${owner}, which the tree does not have.`,
        mend: didYouMean(key, space, `Write that ${to}, or take the name out.`),
      },
    ];
  };
  const all = referencesOf(tree).flatMap(unknown);
  return all.filter(
    (found, index) =>
      all.findIndex((other) => other.node.kind === found.node.kind && other.node.key === found.node.key && other.says === found.says) ===
      index,
  );
}

export const keyRules: readonly Rule[] = [
  { name: "key-twice", severity: "error", find: keysTwice },
  { name: "part-twice", severity: "error", find: partsTwice },
  { name: "unknown-key", severity: "error", find: unknownKeys },
];
