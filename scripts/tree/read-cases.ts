import { readFile } from "node:fs/promises";
import { parse } from "yaml";
import type * as z from "zod";
import { KnownCase, type FaultTree } from "@/lib/core/tree/schema";
import { findFlaws } from "@/lib/core/tree/soundness";
import { Refusal } from "./read-tree";

/** Known cases from a file: JSON lines, a YAML list, or a YAML map with "knownCases". Refuses what the tree cannot answer for. */
export async function readCases(file: string, tree: FaultTree): Promise<KnownCase[]> {
  const text = await readFile(file, "utf8").catch(() => {
    throw new Refusal(`There is no file ${file}.`);
  });
  const raw = file.endsWith(".jsonl") ? jsonLines(text, file) : yamlList(text, file);
  const cases = raw.map((one, index) => {
    const parsed = KnownCase.safeParse(one);
    if (!parsed.success) throw new Refusal(`${file}, case ${nameOf(one) ?? index + 1}: ${issuesOf(parsed.error)}`);
    return parsed.data;
  });
  if (cases.length === 0) throw new Refusal(`There are no cases in ${file}.`);
  const flaws = findFlaws({ ...tree, knownCases: cases }).filter(
    ({ node, severity }) => node.kind === "known case" && severity === "error",
  );
  if (flaws.length > 0)
    throw new Refusal(flaws.map(({ node, says, mend }) => `${file}, case ${node.key}: ${says} ${mend ?? ""}`).join("\n"));
  return cases;
}

function jsonLines(text: string, file: string): unknown[] {
  return text.split("\n").flatMap((line, index) => {
    if (line.trim() === "") return [];
    try {
      return [JSON.parse(line) as unknown];
    } catch (error) {
      throw new Refusal(`${file}:${index + 1} is not JSON: ${error instanceof Error ? error.message : String(error)}`);
    }
  });
}

function yamlList(text: string, file: string): unknown[] {
  let read: unknown;
  try {
    read = parse(text);
  } catch (error) {
    throw new Refusal(`${file} is not valid YAML: ${error instanceof Error ? error.message : String(error)}`);
  }
  const list = typeof read === "object" && read !== null && "knownCases" in read ? read.knownCases : read;
  if (!Array.isArray(list)) throw new Refusal(`${file} has to be a list of cases, or a map with "knownCases".`);
  return list;
}

const nameOf = (one: unknown): string | null => (typeof one === "object" && one !== null && "key" in one ? String(one.key) : null);
const issuesOf = (error: z.ZodError): string => error.issues.map(({ path, message }) => `${path.join(" > ")}: ${message}`).join("; ");
