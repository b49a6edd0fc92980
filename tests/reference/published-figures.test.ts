import { beforeAll, expect, test } from "vitest";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";
import { BAND_FIGURES, LIES_IN } from "./band-figures";
import { PUBLISHED_FIGURES } from "./published-figures";

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

/** All that a node of the tree says, as one text. */
function wordsOf(name: string): string {
  const key = name.split(" ").at(-1);
  const lists = { check: tree.checks, remedy: tree.remedies, rule: tree.stopRules, source: tree.sources };
  const kind = name.split(" ").at(-2) as keyof typeof lists;
  const node = lists[kind].find((one) => one.key === key);
  if (node === undefined) throw new Error(`the tree has no ${name}`);
  return JSON.stringify(node);
}

test.each(PUBLISHED_FIGURES)("$figure ($source, $standing): used where it is said to be, or left out with the reason", (published) => {
  const { edges = [], liesIn = [], words = [], leftOut, source } = published;
  expect(edges.length + liesIn.length + words.length > 0).toBe(leftOut === undefined);
  const key = source.split(/[ ,]/)[0] ?? "";
  for (const edge of edges) {
    const found = BAND_FIGURES.find((one) => one.edge === edge);
    expect(found?.source.split(/[ ,]/)[0], edge).toBe(key);
    expect(found?.standing, edge).toBe(published.standing === "read" ? "published" : "from-memory");
  }
  for (const check of liesIn) expect(LIES_IN.filter((one) => one.check === check).map((one) => one.source.split(/[ ,]/)[0])).toContain(key);
  for (const { node, say } of words) expect(wordsOf(node)).toMatch(say);
});

test("what is used as read cites a source that was read, and what is recalled none that was", () => {
  const standing = new Map(tree.sources.map((source) => [source.key, source.standing]));
  for (const { source, standing: said, leftOut } of PUBLISHED_FIGURES.filter((one) => one.leftOut === undefined)) {
    const key = source.split(/[ ,]/)[0] ?? "";
    expect(leftOut).toBeUndefined();
    if (said === "read") expect(standing.get(key), source).toBe("read");
    else expect(standing.get(key), source).not.toBe("read");
  }
});

test("every published or recalled edge of the bands stands in this list", () => {
  const listed = new Set(PUBLISHED_FIGURES.flatMap(({ edges = [] }) => edges));
  const OTHER = /^(fuel-density|fuel-temperature|oil-pressure-gauge|oil-pressure-cruise)/;
  const missing = BAND_FIGURES.filter(({ standing, edge }) => standing !== "common-practice" && !OTHER.test(edge) && !listed.has(edge));
  expect(missing.map(({ edge }) => edge)).toEqual([]);
});
