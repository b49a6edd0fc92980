import type { ListName } from "../flaw";
import type { FaultTree } from "../schema";
import { findNode, nameOf, type TreeNode } from "./edit";

/** The tree with a node put in: in place of the one with its key, or at the end of its list. */
export function putNode(tree: FaultTree, list: ListName, node: TreeNode): FaultTree {
  const nodes = tree[list] as readonly TreeNode[];
  const there = nodes.some(({ key }) => key === node.key);
  return { ...tree, [list]: there ? nodes.map((other) => (other.key === node.key ? node : other)) : [...nodes, node] };
}

/** A key for a new node made from its title, which no node of any list has: "Filter blocked" -> "filter-blocked", "filter-blocked-2". */
export function newKey(tree: FaultTree, title: string, taken: ReadonlySet<string> = allKeys(tree)): string {
  const words = title
    .normalize("NFKD")
    .toLowerCase()
    .replaceAll(/\p{M}|['’]/gu, "")
    .split(/[^a-z0-9]+/)
    .filter((word) => word !== "");
  const stem = words.join("-").slice(0, 70).replace(/-$/, "") || "new";
  let key = stem;
  for (let number = 2; taken.has(key); number++) key = `${stem}-${number}`;
  return key;
}

function allKeys(tree: FaultTree): Set<string> {
  return new Set(
    Object.values(tree).flatMap((list) => (Array.isArray(list) ? (list as { key?: string }[]).flatMap(({ key }) => key ?? []) : [])),
  );
}

/** The tree with a copy of a node under a new key, and that key; null where there is no such node. Links to the node stay with the original; its own links are copied. */
export function duplicateNode(tree: FaultTree, list: ListName, key: string): { tree: FaultTree; key: string } | null {
  const node = findNode(tree, list, key);
  if (node === null) return null;
  const fresh = newKey(tree, `${nameOf(node)} copy`);
  const copy = { ...node, key: fresh, ...("title" in node ? { title: `${node.title} (copy)`.slice(0, 200) } : {}) };
  return { tree: putNode(tree, list, copy), key: fresh };
}
