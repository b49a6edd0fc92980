import "server-only";
import { Problem } from "@/lib/core/contract/problem";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readTreeFiles } from "./read-tree-folder";

/**
 * Reads a tree that somebody brings along as one YAML or JSON file. It may be
 * unsound; a draft may be, too.
 *
 * @throws Problem 422, one error a fault, each with its line and its node
 */
export function readTreeText(text: string): FaultTree {
  const read = readTreeFiles([{ file: "the file", text }]);
  if ("faults" in read)
    throw Problem.invalid(read.faults.map(({ line, says, mend }) => ({ path: `line ${line}`, says: `${says} ${mend}` })));
  const parsed = parseTree(read.document);
  if ("tree" in parsed) return parsed.tree;
  throw Problem.invalid(
    parsed.flaws.map(({ node, says, mend, path }) => {
      const line = read.placeOf(path ?? [])?.line;
      return { path: `${line === undefined ? "" : `line ${line}, `}${node.kind} ${node.key}`, says: `${says} ${mend ?? ""}`.trim() };
    }),
  );
}
