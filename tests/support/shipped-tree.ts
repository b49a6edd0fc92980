import path from "node:path";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readTreeFolder } from "@/lib/server/trees/read-tree-folder";

/** The tree that is shipped, read from its YAML files as the server reads it. */
export async function shippedTree(): Promise<FaultTree> {
  const read = await readTreeFolder(path.resolve(import.meta.dirname, "../../trees/small-marine-diesel"));
  if ("faults" in read) throw new Error(JSON.stringify(read.faults, null, 2));
  const parsed = parseTree(read.document);
  if ("flaws" in parsed) throw new Error(JSON.stringify(parsed.flaws, null, 2));
  return parsed.tree;
}
