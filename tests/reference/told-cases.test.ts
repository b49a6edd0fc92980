import { beforeAll, expect, test } from "vitest";
import type { FaultTree, KnownCase } from "@/lib/core/tree/schema";
import { readCases } from "@/scripts/tree/read-cases";
import { shippedTree } from "../support/shipped-tree";

/** Told accounts beside the tree's own; what is in the held-out ones is for `tree prove` alone. */
const FILES = ["held-out-cases", "more-cases-development", "more-cases-unread"].map((name) => `tests/reference/${name}.yaml`);

let tree: FaultTree;
const told: Record<string, KnownCase[]> = {};
beforeAll(async () => {
  tree = await shippedTree();
  for (const file of FILES) told[file] = await readCases(file, tree);
});

test.each(FILES)("%s speaks of symptoms, checks, findings and causes the shipped tree has", (file) => {
  expect(told[file]!.length).toBeGreaterThanOrEqual(20);
});

test("no account stands in two files: what is free to read is not in what is held out", () => {
  const all = [...tree.knownCases, ...Object.values(told).flat()];
  const twice = (of: string[]) => of.filter((one, at) => of.indexOf(one) !== at);
  expect(twice(all.map(({ key }) => key))).toEqual([]);
  const accounts = [
    ...new Set(tree.knownCases.map(({ source }) => source)),
    ...Object.values(told)
      .flat()
      .map(({ source }) => source),
  ];
  expect(twice(accounts)).toEqual([]);
});
