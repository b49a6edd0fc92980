import path from "node:path";
import Ajv from "ajv/dist/2020";
import { expect, test, vi } from "vitest";
import { jsonSchema } from "@/lib/core/tree/json-schema";
import { parseTree } from "@/lib/core/tree/parse-tree";
import { findFlaws } from "@/lib/core/tree/soundness";
import { readTreeFolder } from "@/lib/server/trees/read-tree-folder";

const folder = path.resolve(import.meta.dirname, "../../trees/small-marine-diesel");

async function shippedDocument() {
  const read = await readTreeFolder(folder);
  if ("faults" in read) throw new Error(JSON.stringify(read.faults, null, 2));
  return read.document;
}

// Thousands of lines of YAML: seconds, on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

test("the shipped tree is sound", async () => {
  const parsed = parseTree(await shippedDocument());
  const flaws = "tree" in parsed ? findFlaws(parsed.tree) : parsed.flaws;
  expect(
    flaws.filter(({ severity }) => severity === "error").map(({ rule, node, says }) => `${rule}: ${node.kind} ${node.key}: ${says}`),
  ).toEqual([]);
});

test("the shipped tree fits its JSON Schema", async () => {
  const valid = new Ajv({ allErrors: true }).compile(jsonSchema());
  const fits = valid(await shippedDocument());
  expect(valid.errors ?? []).toEqual([]);
  expect(fits).toBe(true);
});
