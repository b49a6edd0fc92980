import { readFile, writeFile } from "node:fs/promises";
import path from "node:path";
import { format } from "prettier";
import { jsonSchema } from "@/lib/core/tree/json-schema";

const file = path.resolve(import.meta.dirname, "../../trees/fault-tree.schema.json");

/** The schema file as it should read. */
export const schemaText = (): Promise<string> => format(JSON.stringify(jsonSchema()), { parser: "json", printWidth: 140 });

/** Writes trees/fault-tree.schema.json anew from the zod schema. */
export async function schema(): Promise<number> {
  const text = await schemaText();
  const before = await readFile(file, "utf8").catch(() => null);
  await writeFile(file, text);
  console.log(`${path.relative(process.cwd(), file)}: ${before === text ? "unchanged" : "written"}`);
  return 0;
}
