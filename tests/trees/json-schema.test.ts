import { readFile } from "node:fs/promises";
import path from "node:path";
import Ajv from "ajv/dist/2020";
import { expect, test } from "vitest";
import { schemaText } from "@/scripts/tree/schema";
import { smallDocument } from "../support/small-tree";

const file = path.resolve(import.meta.dirname, "../../trees/fault-tree.schema.json");
const validate = async () => new Ajv({ allErrors: true }).compile(JSON.parse(await readFile(file, "utf8")) as object);

test("trees/fault-tree.schema.json is up to date (npm run tree -- schema writes it)", async () => {
  expect(await readFile(file, "utf8")).toBe(await schemaText());
});

test("it takes a tree as it is written", async () => {
  const valid = await validate();
  expect(valid(smallDocument()), JSON.stringify(valid.errors)).toBe(true);
});

test("it refuses what the tree's own shape refuses", async () => {
  const valid = await validate();
  expect(valid({ ...smallDocument(), extra: 1 })).toBe(false);
  expect(valid({ ...smallDocument(), symptoms: [] })).toBe(false);
  const strong = smallDocument();
  Object.assign(strong.causes[0]!.shows, { "lost-rpm": "mostly" });
  expect(valid(strong)).toBe(false);
});
