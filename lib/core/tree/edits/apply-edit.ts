import { LIST_KINDS } from "../flaw";
import { mergeValues } from "../merge-values";
import type { FaultTree } from "../schema";
import { findNode, nameOf, type Edit, type HeadChange, type NodeChange, type TreeNode } from "./edit";

export type Applied = { tree: FaultTree } | { refused: string };

/**
 * The tree with an edit made. The edit may have been meant for a slightly
 * older or newer tree (an undo after somebody else's save): fields that the
 * edit did not touch are kept as they are now.
 *
 * Refused, in words, where what the edit changes has been changed to something
 * else since, has gone, or is there already; then nothing is changed.
 */
export function applyEdit(tree: FaultTree, edit: Edit): Applied {
  let edited = tree;
  for (const change of edit.changes) {
    const applied = "head" in change ? applyHead(edited, change) : applyNode(edited, change);
    if ("refused" in applied) return applied;
    edited = applied.tree;
  }
  return { tree: edited };
}

function applyHead(tree: FaultTree, { head, before, after }: HeadChange): Applied {
  const { value, clashes } = mergeValues(before, after, tree[head]);
  if (clashes.length > 0) return { refused: `The tree's ${head} has been changed since.` };
  return { tree: { ...tree, [head]: value } };
}

function applyNode(tree: FaultTree, change: NodeChange): Applied {
  const now = findNode(tree, change.list, change.key);
  const node = change.after ?? change.before ?? now;
  const called = `The ${LIST_KINDS[change.list]} "${node === null ? change.key : nameOf(node)}"`;
  if (now === null && change.before !== null) return { refused: `${called} is no longer there.` };
  if (now !== null && change.before === null) return { refused: `${called} is there already.` };
  const { value, clashes } = mergeValues(change.before ?? undefined, change.after ?? undefined, now ?? undefined);
  const clash = clashes[0];
  if (clash !== undefined)
    return {
      refused: `${called} has been changed since${clash.path.length === 0 ? "" : `: ${clash.path.join(" > ")} is not what it was`}.`,
    };
  return { tree: withNodeAt(tree, change, (value as TreeNode | undefined) ?? null) };
}

function withNodeAt(tree: FaultTree, { list, key, place }: NodeChange, node: TreeNode | null): FaultTree {
  const nodes = tree[list] as readonly TreeNode[];
  const at = nodes.findIndex((other) => other.key === key);
  const without = nodes.filter((other) => other.key !== key);
  if (node !== null) without.splice(at === -1 ? place : at, 0, node);
  return { ...tree, [list]: without };
}
