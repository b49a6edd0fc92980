import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import { parse } from "yaml";
import { drawnPart } from "@/components/tree/drawn-part";
import { graphOf } from "@/components/tree/tree-graph";
import { LANES, placesOf } from "@/components/tree/tree-layout";
import { partOf } from "@/components/tree/tree-part";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";

let tree: FaultTree;

beforeAll(() => {
  const folder = "trees/small-marine-diesel";
  const joined: Record<string, unknown> = {};
  for (const file of readdirSync(folder, { recursive: true, encoding: "utf8" }).sort()) {
    if (!file.endsWith(".yaml")) continue;
    for (const [key, value] of Object.entries(parse(readFileSync(path.join(folder, file), "utf8")) as Record<string, unknown>)) {
      const before = joined[key];
      joined[key] = Array.isArray(before) && Array.isArray(value) ? [...before, ...value] : value;
    }
  }
  const result = parseTree(joined);
  if (!("tree" in result)) throw new Error(JSON.stringify(result.flaws.slice(0, 3)));
  tree = result.tree;
});

describe("a symptom's part of the shipped tree, drawn", () => {
  test("has a place of its own for every node, and none on another", () => {
    for (const { key } of tree.symptoms) {
      const part = drawnPart(graphOf(tree, key, Infinity)!);
      const places = placesOf(part);
      const wanted = [
        "symptom",
        ...part.checks.map(({ check }) => `check:${check.key}`),
        ...part.causes.map((cause) => `cause:${cause.key}`),
        ...part.remedies.map((remedy) => `remedy:${remedy.key}`),
      ];
      expect([...places.keys()].sort()).toEqual(wanted.sort());
      for (const { x } of Object.values(LANES)) {
        const lane = [...places.values()].filter((place) => place.x === x).sort((a, b) => a.y - b.y);
        for (const [i, place] of lane.entries()) if (i > 0) expect(place.y).toBeGreaterThanOrEqual(lane[i - 1]!.y + lane[i - 1]!.height);
      }
    }
  });
  test("shows the likeliest causes and says how many it leaves out", () => {
    const key = tree.symptoms[0]!.key;
    const all = graphOf(tree, key, Infinity)!;
    const some = graphOf(tree, key, 12)!;
    expect(some.causes).toEqual(all.causes.slice(0, 12));
    expect(some.folded).toBe(all.causes.length - 12);
  });
  test("draws links only from findings that stand on their tickets", () => {
    const part = drawnPart(graphOf(tree, tree.symptoms[0]!.key, 12)!);
    const rows = new Set(part.checks.flatMap(({ check, findings }) => findings.map((f) => `${check.key}/${f.key}`)));
    expect(part.tells.length).toBeGreaterThan(0);
    expect(part.tells.filter((tell) => !rows.has(`${tell.check}/${tell.finding}`))).toEqual([]);
  });
  test("names everything its panels speak of", () => {
    const part = partOf(tree, tree.symptoms[0]!.key, 12)!;
    const named = part.graph.causes.flatMap((cause) => [
      ...Object.keys(cause.shows).map((k) => `symptom:${k}`),
      ...Object.keys(cause.curedBy).map((k) => `remedy:${k}`),
      ...Object.keys(cause.gives).map((k) => `check:${k}`),
    ]);
    expect(named.filter((id) => part.titles[id] === undefined)).toEqual([]);
  });
  test("is nothing for a symptom that the tree does not have", () => {
    expect(partOf(tree, "no-such-symptom", 12)).toBeNull();
  });
});
