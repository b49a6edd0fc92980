import { expect, test } from "vitest";
import { STARTER_ITEMS } from "@/lib/core/upkeep/starter-items";
import { shippedTree } from "../support/shipped-tree";

test("the starter plan speaks of causes, systems, features and parts that the shipped tree has", async () => {
  const { causes, systems, remedies, features } = await shippedTree();
  const has = (list: readonly { key: string }[]) => (key: string) => list.some((one) => one.key === key);
  const missing = STARTER_ITEMS.flatMap((item) => [
    ...[...item.guards, ...item.mayBring].filter((key) => !has(causes)(key)),
    ...[item.system].filter((key) => !has(systems)(key)),
    ...Object.keys(item.appliesTo?.features ?? {}).filter((key) => !has(features)(key)),
    ...item.parts.map(({ key }) => key).filter((key) => !remedies.some(({ parts }) => has(parts)(key))),
  ]);
  expect(missing).toEqual([]);
});
