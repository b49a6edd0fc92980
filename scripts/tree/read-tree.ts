import { parseTree } from "@/lib/core/tree/parse-tree";
import { LIST_KINDS, type Flaw } from "@/lib/core/tree/flaw";
import { findFlaws } from "@/lib/core/tree/soundness";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readTreeFolder, type Place } from "@/lib/server/trees/read-tree-folder";

/** The tree that is meant where none is named; npm runs its scripts at the root. */
export const SHIPPED = "trees/small-marine-diesel";

export type TreeRead = {
  /** null: the files or the shape are at fault, and nothing more can be said. */
  tree: FaultTree | null;
  flaws: (Omit<Flaw, "node"> & { node: Flaw["node"] | null; place: Place | null })[];
};

/** Reads a tree's folder and everything wrong with it, each fault with its file and line. */
export async function readTree(folder: string): Promise<TreeRead> {
  const read = await readTreeFolder(folder);
  if ("faults" in read) {
    return {
      tree: null,
      flaws: read.faults.map(({ file, line, says, mend }) => ({
        severity: "error",
        rule: "file",
        node: null,
        says,
        mend,
        place: { file, line },
      })),
    };
  }
  const parsed = parseTree(read.document);
  const flaws = "tree" in parsed ? findFlaws(parsed.tree) : parsed.flaws;
  const placeOf = (flaw: Flaw) => read.placeOf(flaw.path ?? pathOf(read.document, flaw.node));
  return { tree: "tree" in parsed ? parsed.tree : null, flaws: flaws.map((flaw) => ({ ...flaw, place: placeOf(flaw) })) };
}

function pathOf(document: Record<string, unknown>, node: Flaw["node"]): (string | number)[] {
  for (const [list, kind] of Object.entries(LIST_KINDS)) {
    if (kind !== node.kind) continue;
    const index = (document[list] as { key?: unknown }[]).findIndex((item) => item.key === node.key);
    if (index >= 0) return [list, index];
  }
  return ["key"];
}

/** Something to say to the person who typed the command; no fault of the program. */
export class Refusal extends Error {}

/** The tree, where it is sound enough to reason with. */
export async function readTreeOrSay(folder: string = SHIPPED): Promise<FaultTree> {
  const { tree, flaws } = await readTree(folder);
  const errors = flaws.filter(({ severity }) => severity === "error").length;
  if (tree === null || errors > 0)
    throw new Refusal(`The tree in ${folder} has ${errors} ${errors === 1 ? "error" : "errors"}: see npm run tree -- check ${folder}`);
  return tree;
}

/** The choice a person typed, or a refusal that lists them all. */
export function chosen<T extends string>(choices: readonly T[], value: string, what: string): T {
  const found = choices.find((choice) => choice === value);
  if (found === undefined) throw new Refusal(`"${value}" is no ${what}: choose one of ${choices.join(", ")}.`);
  return found;
}
