import { LIST_KINDS, type Flaw, type ListName } from "../flaw";
import { sameValue } from "../same-value";
import type { FaultTree } from "../schema";

/** Any node of a tree, as the document's lists hold it. */
export type TreeNode = FaultTree[ListName][number];

/** What a tree has beside its lists of nodes. */
export type HeadField = "title" | "about" | "inseparable";
const HEAD_FIELDS: readonly HeadField[] = ["title", "about", "inseparable"];

/**
 * One node made, changed or taken out. `before` and `after` are whole nodes;
 * null is "not there". `place` is where in its list it stands (or stood), so
 * that an undone removal puts it back where it was.
 */
export type NodeChange = { list: ListName; key: string; before: TreeNode | null; after: TreeNode | null; place: number };
export type HeadChange = { head: HeadField; before: FaultTree[HeadField]; after: FaultTree[HeadField] };
export type Change = NodeChange | HeadChange;

/** Something one person did to a tree, in words for the list of what can be undone, and the changes it came to. */
export type Edit = { says: string; changes: readonly Change[] };

/** The edit that leads from one tree to another. The order of lists is no change. */
export function editBetween(before: FaultTree, after: FaultTree, says: string): Edit {
  const lists = Object.keys(LIST_KINDS) as ListName[];
  return {
    says,
    changes: [
      ...HEAD_FIELDS.filter((head) => !sameValue(before[head], after[head])).map((head) => ({
        head,
        before: before[head],
        after: after[head],
      })),
      ...lists.flatMap((list) => nodeChanges(list, before[list], after[list])),
    ],
  };
}

function nodeChanges(list: ListName, before: readonly TreeNode[], after: readonly TreeNode[]): NodeChange[] {
  if (before === after) return [];
  const old = new Map(before.map((node, place) => [node.key, { node, place }]));
  const now = new Set(after.map(({ key }) => key));
  const gone = before.flatMap((node, place) => (now.has(node.key) ? [] : [{ list, key: node.key, before: node, after: null, place }]));
  const made = after.flatMap((node, place) => {
    const was = old.get(node.key)?.node ?? null;
    return was !== null && sameValue(was, node) ? [] : [{ list, key: node.key, before: was, after: node, place }];
  });
  return [...gone, ...made];
}

/** The edit that takes another back. */
export function undoOf(edit: Edit): Edit {
  const turned = edit.changes.map((change) => ({ ...change, before: change.after, after: change.before }) as Change);
  return { says: edit.says, changes: turned.reverse() };
}

/** The node with this key, or null. */
export function findNode(tree: FaultTree, list: ListName, key: string): TreeNode | null {
  return (tree[list] as readonly TreeNode[]).find((node) => node.key === key) ?? null;
}

/** The list that holds nodes of a kind; null for the tree itself. */
export function listOf(kind: Flaw["node"]["kind"]): ListName | null {
  return (Object.keys(LIST_KINDS) as ListName[]).find((list) => LIST_KINDS[list] === kind) ?? null;
}

/** What a person calls a node: its title, or what a caution says, or its key. */
export function nameOf(node: TreeNode): string {
  return "title" in node ? node.title : node.key;
}
