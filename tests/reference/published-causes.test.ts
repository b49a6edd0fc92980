import { beforeAll, expect, test } from "vitest";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";
import { PUBLISHED_LISTS } from "./published-lists";

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

test.each(PUBLISHED_LISTS)("$key ($source): the tree reaches every item from $symptom, or says why not", ({ items, symptom }) => {
  expect(tree.symptoms.map(({ key }) => key)).toContain(symptom);
  for (const { item, causes = [], leftOut } of items) {
    expect(causes.length > 0 || (leftOut ?? "").length > 20, `${item}: neither a cause nor a reason`).toBe(true);
    expect(causes.length > 0 && leftOut !== undefined, `${item}: both a cause and a reason to leave it out`).toBe(false);
    for (const key of causes) {
      const cause = tree.causes.find((one) => one.key === key);
      expect(cause, `${item}: the tree has no cause "${key}"`).toBeDefined();
      expect(Object.keys(cause?.shows ?? {}), `${item}: "${key}" does not show ${symptom}`).toContain(symptom);
    }
  }
});

test("every list cites a source of the tree that was read", () => {
  for (const { key, source } of PUBLISHED_LISTS) {
    const cited = tree.sources.find((one) => one.key === source.split(/[ ,]/)[0]);
    expect(cited?.standing, key).toBe("read");
  }
});

test("every list that was read stands here, for each symptom it is about", () => {
  const taken = new Set(PUBLISHED_LISTS.map(({ source, symptom }) => `${source.split(/[ ,]/)[0]} ${symptom}`));
  const read = {
    en3: ["smoke-black", "smoke-blue"],
    cmb: ["smoke-black", "smoke-white", "smoke-blue"],
    tm383: ["no-crank-silent", "no-crank-click", "runs-cold"],
    en2: ["misfire-rough", "hunting-surging", "wont-stop", "runaway"],
    en1c: ["low-oil-pressure", "hard-start-cold", "crankcase-fumes"],
    tm272: ["low-oil-pressure", "oil-level-rising", "oil-milky"],
    tr0656: ["knock-combustion"],
    "tm209-21": ["not-charging"],
    ase: ["misfire-rough", "cranks-no-start-no-smoke"],
    ens: ["misfire-rough", "smoke-black"],
  };
  const missing = Object.entries(read).flatMap(([source, symptoms]) =>
    symptoms.map((one) => `${source} ${one}`).filter((one) => !taken.has(one)),
  );
  expect(missing).toEqual([]);
});

test("no item stands twice in a list", () => {
  for (const { key, items } of PUBLISHED_LISTS) expect(new Set(items.map(({ item }) => item)).size, key).toBe(items.length);
});

test("counts, for the record", () => {
  const items = PUBLISHED_LISTS.flatMap((list) => list.items);
  const covered = items.filter(({ causes }) => causes !== undefined);
  const reached = new Set(covered.flatMap(({ causes = [] }) => causes));
  console.info(
    `published lists: ${PUBLISHED_LISTS.length}; items ${items.length}, of which left out ${items.length - covered.length}; causes reached ${reached.size} of ${tree.causes.length}`,
  );
  expect(covered.length).toBeGreaterThan(items.length / 2);
});
