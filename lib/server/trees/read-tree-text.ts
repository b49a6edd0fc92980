import "server-only";
import { Problem } from "@/lib/core/contract/problem";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import { readTreeFiles } from "./read-tree-folder";

/** Nobody mends more at a time, and a file of rubbish is not answered with as much again. */
const MOST_TOLD = 100;

/**
 * Reads a tree that somebody brings along as one YAML or JSON file. It may be
 * unsound; a draft may be, too.
 *
 * @throws Problem 422, one error a fault, each with its line and its node
 */
export function readTreeText(text: string): FaultTree {
  const read = readPlain(text);
  if ("faults" in read)
    throw Problem.invalid(
      read.faults.slice(0, MOST_TOLD).map(({ line, says, mend }) => ({ path: `line ${line}`, says: `${says} ${mend}` })),
    );
  const parsed = parseTree(read.document);
  if ("tree" in parsed) return parsed.tree;
  throw Problem.invalid(
    parsed.flaws.slice(0, MOST_TOLD).map(({ node, says, mend, path }) => {
      const line = read.placeOf(path ?? [])?.line;
      return { path: `${line === undefined ? "" : `line ${line}, `}${node.kind} ${node.key}`, says: `${says} ${mend ?? ""}`.trim() };
    }),
  );
}

function readPlain(text: string): ReturnType<typeof readTreeFiles> {
  try {
    return readTreeFiles([{ file: "the file", text }]);
  } catch (error) {
    // The reader of YAML gives up on what is nested thousands deep, and on names that unfold into more than they say.
    if (!(error instanceof RangeError || error instanceof ReferenceError)) throw error;
    throw Problem.invalid([{ path: "line 1", says: "It is nested too deep, or repeats itself by name too often. Write it out plainly." }]);
  }
}
