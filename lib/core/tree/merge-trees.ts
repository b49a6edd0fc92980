import { isListName, LIST_KINDS, type Flaw } from "./flaw";
import { mergeValues, type Clash } from "./merge-values";
import type { FaultTree } from "./schema";

/** A field of a node that both sides changed, each to something else: a person has to choose. */
export type Collision = {
  node: Flaw["node"];
  /** Below the node, outermost first; empty where one side changed the node and the other took it out. */
  field: readonly string[];
  /** From the root of the document; steps into lists of nodes are keys. */
  path: readonly string[];
  base: unknown;
  mine: unknown;
  theirs: unknown;
};

/**
 * Joins two trees that grew from one: what only one side changed is taken,
 * what both changed alike is taken once, and where both changed the same field
 * differently the merged tree holds theirs and the collision is listed.
 *
 * A removal against a change collides too; the changed node stays until somebody chooses.
 * The result may be unsound (one took out a check that the other linked to):
 * that is findFlaws' part to say.
 */
export function mergeTrees(base: FaultTree, mine: FaultTree, theirs: FaultTree): { tree: FaultTree; collisions: Collision[] } {
  const { value, clashes } = mergeValues(base, mine, theirs);
  const tree = clashes
    .filter(isRemoval)
    .reduce<unknown>((merged, clash) => putAt(merged, clash.path, clash.theirs ?? clash.mine), value) as FaultTree;
  return { tree, collisions: clashes.map((clash) => collisionOf(clash, theirs.key)) };
}

/**
 * The merged tree with one collision settled: `choice` is written where the
 * collision is (undefined takes it out).
 */
export function settle(tree: FaultTree, collision: Pick<Collision, "path">, choice: unknown): FaultTree {
  return putAt(tree, collision.path, choice) as FaultTree;
}

const isRemoval = ({ mine, theirs }: Clash): boolean => mine === undefined || theirs === undefined;

function collisionOf({ path, ...sides }: Clash, treeKey: string): Collision {
  const [list, key, ...field] = path;
  const inNode = list !== undefined && key !== undefined && isListName(list);
  return {
    node: inNode ? { kind: LIST_KINDS[list], key } : { kind: "tree", key: treeKey },
    field: inNode ? field : path,
    path,
    ...sides,
  };
}

/** A copy of a document with one value replaced, put in, or (undefined) taken out. */
function putAt(value: unknown, path: readonly string[], put: unknown): unknown {
  const [step, ...rest] = path;
  if (step === undefined) return put;
  if (Array.isArray(value)) {
    const items = value as readonly { key: string }[];
    const index = items.findIndex(({ key }) => key === step);
    const inner = putAt(items[index], rest, put);
    if (index === -1) return inner === undefined ? items : [...items, inner];
    return items.flatMap((item, at) => (at !== index ? [item] : inner === undefined ? [] : [inner]));
  }
  const map = (value ?? {}) as Readonly<Record<string, unknown>>;
  const inner = putAt(map[step], rest, put);
  if (inner !== undefined) return { ...map, [step]: inner };
  return Object.fromEntries(Object.entries(map).filter(([field]) => field !== step));
}
