import { LIST_KINDS, type Flaw, type ListName } from "./flaw";
import { isMap, sameValue } from "./same-value";
import type { FaultTree } from "./schema";

/** One thing that changed between two trees, in words that need no reading of the document. */
export type Difference = {
  node: Flaw["node"];
  what: "added" | "removed" | "changed";
  /** "Primary filter blocked: shows top revs lost, 'usually' became 'often'." */
  says: string;
};

type Named = { key: string; title?: string };
type Names = ReadonlyMap<string, string>;

/** Fields said in a mechanic's words; others go by their own names. */
const FIELD_WORDS: Readonly<Record<string, string>> = {
  shows: "shows",
  gives: "gives",
  curedBy: "cured by",
  broughtOnBy: "brought on by",
  base: "how common",
  appliesTo: "applies to",
  firstFor: "asked first for",
  forbids: "forbids",
  sound: "on a sound engine",
  clearedBy: "cleared by",
  tryOut: "try-out",
  upkeep: "upkeep",
  everyHours: "every so many hours",
  everyMonths: "every so many months",
  guards: "keeps away",
};

/**
 * What changed from one tree to another, node by node in the order of the
 * later tree, removed nodes last. The order of nodes and of fields is no
 * difference.
 */
export function compareTrees(before: FaultTree, after: FaultTree): Difference[] {
  const names = namesOf(before, after);
  const head = (["title", "about"] as const)
    .filter((field) => before[field] !== after[field])
    .map((field): Difference => ({
      node: { kind: "tree", key: after.key },
      what: "changed",
      says: `${after.title}: ${field}, ${became(before[field], after[field], names)}.`,
    }));
  return [
    ...head,
    ...Object.keys(LIST_KINDS).flatMap((list) => compareLists(list as ListName, before, after, names)),
    ...compareInseparable(before, after, names),
  ];
}

/** Pairs that checks cannot tell apart have no key: the two causes name them, in either order. */
function compareInseparable(before: FaultTree, after: FaultTree, names: Names): Difference[] {
  const byPair = ({ inseparable = [] }: FaultTree) => new Map(inseparable.map((pair) => [[...pair.causes].sort().join(" "), pair]));
  const [old, now] = [byPair(before), byPair(after)];
  return [...new Set([...now.keys(), ...old.keys()])].flatMap((name): Difference[] => {
    const [was, is] = [old.get(name), now.get(name)];
    const pair = `not told apart: ${name
      .split(" ")
      .map((key) => names.get(key) ?? key)
      .join(" and ")}`;
    if (was?.because === is?.because) return [];
    const node = { kind: "tree" as const, key: after.key };
    if (was === undefined) return [{ node, what: "added", says: `${pair}: listed.` }];
    if (is === undefined) return [{ node, what: "removed", says: `${pair}: taken out of the list.` }];
    return [{ node, what: "changed", says: `${pair}: the reason, ${became(was.because, is.because, names)}.` }];
  });
}

function compareLists(list: ListName, before: FaultTree, after: FaultTree, names: Names): Difference[] {
  const kind = LIST_KINDS[list];
  const old = new Map((before[list] as readonly Named[]).map((node) => [node.key, node]));
  const changes = (after[list] as readonly Named[]).flatMap((node): Difference[] => {
    const previous = old.get(node.key);
    old.delete(node.key);
    const at = { kind, key: node.key };
    if (previous === undefined) return [{ node: at, what: "added", says: `${titleOf(node)}: new ${kind}.` }];
    return fieldChanges(previous, node, "", names).map((says) => ({ node: at, what: "changed", says: `${titleOf(node)}: ${says}.` }));
  });
  return [
    ...changes,
    ...[...old.values()].map((node): Difference => ({
      node: { kind, key: node.key },
      what: "removed",
      says: `${titleOf(node)}: ${kind} taken out.`,
    })),
  ];
}

const titleOf = ({ key, title }: Named): string => title ?? key;

function namesOf(...trees: FaultTree[]): Names {
  const names = new Map<string, string>();
  for (const tree of trees) {
    for (const list of Object.keys(LIST_KINDS) as ListName[])
      for (const node of tree[list] as readonly Named[]) names.set(node.key, titleOf(node));
  }
  return names;
}

const isKeyed = (value: unknown): value is Named[] =>
  Array.isArray(value) && value.length > 0 && value.every((item) => isMap(item) && typeof item.key === "string");

function fieldChanges(before: unknown, after: unknown, path: string, names: Names): string[] {
  if (sameValue(before, after)) return [];
  if (isMap(before) && isMap(after)) {
    const fields = [...new Set([...Object.keys(before), ...Object.keys(after)])];
    return fields.flatMap((field) =>
      fieldChanges(before[field], after[field], join(path, FIELD_WORDS[field] ?? names.get(field) ?? field), names),
    );
  }
  if (isKeyed(before) && isKeyed(after)) {
    const [old, now] = [byKey(before), byKey(after)];
    const changes = [...new Set([...Object.keys(old), ...Object.keys(now)])].flatMap((key) =>
      fieldChanges(old[key], now[key], join(path, titleOf(now[key] ?? old[key] ?? { key })), names),
    );
    return changes.length > 0 ? changes : [`${path}, put in another order`];
  }
  return [`${path}, ${became(before, after, names)}`];
}

const byKey = (nodes: readonly Named[]): Record<string, Named> => Object.fromEntries(nodes.map((node) => [node.key, node]));
const join = (path: string, field: string): string => (path === "" ? field : `${path} ${field}`);

function became(before: unknown, after: unknown, names: Names): string {
  if (before === undefined) return `new: ${shown(after, names)}`;
  if (after === undefined) return `${shown(before, names)} taken out`;
  return `${shown(before, names)} became ${shown(after, names)}`;
}

/** A value as one says it; keys by their titles, long texts cut. */
function shown(value: unknown, names: Names): string {
  if (typeof value === "string") {
    const text = names.get(value) ?? value;
    return `'${text.length > 80 ? `${text.slice(0, 77)}...` : text}'`;
  }
  if (Array.isArray(value)) return value.length === 0 ? "nothing" : value.map((item) => shown(item, names)).join(", ");
  if (!isMap(value)) return String(value);
  if (typeof value.key === "string") return `'${titleOf(value as Named)}'`;
  const parts = Object.entries(value).map(([key, part]) => `${FIELD_WORDS[key] ?? names.get(key) ?? key} ${shown(part, names)}`);
  return parts.length === 0 ? "nothing" : parts.join(", ");
}
