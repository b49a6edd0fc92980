import "server-only";
import { readdir, readFile } from "node:fs/promises";
import path from "node:path";
import { isMap, isScalar, isSeq, LineCounter, parseDocument, type Document } from "yaml";
import { didYouMean } from "@/lib/core/tree/nearest";
import { typographicAll } from "@/lib/core/tree/typographic";
import { LIST_KINDS } from "@/lib/core/tree/flaw";

/** A place in a tree's files, for messages: file relative to the folder, line from 1. */
export type Place = { file: string; line: number };

export type FileFault = Place & { says: string; mend: string };

export type TreeFolder = {
  /** All files joined, of unknown shape still: parseTree reads it. */
  document: Record<string, unknown>;
  /** Where a path of the document was written; the nearest parent where the end of the path is missing. */
  placeOf: (documentPath: readonly (string | number)[]) => Place | null;
};

type Source = { file: string; yaml: Document.Parsed; lines: LineCounter };

/** Lists that are joined; "inseparable" holds no nodes, and a tree may do without it. */
const LISTS = [...Object.keys(LIST_KINDS), "inseparable"];
const SCALARS = ["format", "key", "title", "about"];

/**
 * Reads a tree that is written as a folder of YAML files. Every file is a map
 * of some of the tree's lists, which are joined in the order of their paths,
 * or of its few single values, which may stand once.
 */
export async function readTreeFolder(folder: string): Promise<TreeFolder | { faults: FileFault[] }> {
  const files = await yamlFiles(folder);
  if (files.length === 0)
    return {
      faults: [{ file: ".", line: 1, says: `There are no YAML files in ${folder}.`, mend: "Name the folder that holds tree.yaml." }],
    };
  return readTreeFiles(await Promise.all(files.map(async (file) => ({ file, text: await readFile(path.join(folder, file), "utf8") }))));
}

/** As readTreeFolder, of files that have been read; a tree may stand in one. JSON is YAML too. */
export function readTreeFiles(files: readonly { file: string; text: string }[]): TreeFolder | { faults: FileFault[] } {
  return joinSources(
    files.map(({ file, text }) => {
      const lines = new LineCounter();
      return { file, lines, yaml: parseDocument(text, { lineCounter: lines, prettyErrors: false }) };
    }),
  );
}

async function yamlFiles(folder: string): Promise<string[]> {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true }).catch(() => []);
  return entries
    .filter((entry) => entry.isFile() && /\.ya?ml$/.test(entry.name))
    .map((entry) => path.relative(folder, path.join(entry.parentPath, entry.name)).replaceAll(path.sep, "/"))
    .sort();
}

function joinSources(sources: Source[]): TreeFolder | { faults: FileFault[] } {
  const faults: FileFault[] = [];
  const document: Record<string, unknown> = Object.fromEntries(Object.keys(LIST_KINDS).map((list) => [list, []]));
  /** Where each value, and each item of each list, came from. */
  const origins = new Map<string, { source: Source; inFile: (string | number)[] }>();

  for (const source of sources) {
    const { yaml } = source;
    const fault = (offset: number, says: string, mend: string) =>
      faults.push({ file: source.file, line: source.lines.linePos(offset).line, says, mend });
    for (const error of yaml.errors) fault(error.pos[0], `This is not valid YAML: ${error.message}`, yamlMend(error.code));
    if (yaml.errors.length > 0 || yaml.contents === null) continue;
    if (!isMap(yaml.contents)) {
      if (!isScalar(yaml.contents) || yaml.contents.value !== null)
        fault(yaml.contents.range[0], "A tree's file has to be a map.", `Begin it with one of ${[...SCALARS, ...LISTS].join(", ")}.`);
      continue;
    }
    const values = yaml.toJS() as Record<string, unknown[]>;
    for (const { key: keyNode, value } of yaml.contents.items) {
      const offset = isScalar(keyNode) ? (keyNode.range?.[0] ?? 0) : 0;
      const key = String(isScalar(keyNode) ? keyNode.value : keyNode);
      if (LISTS.includes(key)) {
        if (value === null || (isScalar(value) && value.value === null)) continue;
        if (!isSeq(value)) {
          fault(offset, `"${key}" has to be a list.`, 'Begin each item with "- ".');
          continue;
        }
        const joined = (document[key] ??= []) as unknown[];
        value.items.forEach((_item, index) => {
          origins.set(`${key}/${joined.length}`, { source, inFile: [key, index] });
          joined.push(values[key]?.[index]);
        });
      } else if (SCALARS.includes(key)) {
        const before = origins.get(key);
        if (before !== undefined) fault(offset, `"${key}" stands in ${before.source.file} already.`, "Keep one of the two.");
        origins.set(key, { source, inFile: [key] });
        document[key] = values[key];
      } else
        fault(
          offset,
          `"${key}" is not a part of a tree.`,
          didYouMean(key, [...SCALARS, ...LISTS], `Use one of ${[...SCALARS, ...LISTS].join(", ")}.`),
        );
    }
  }
  if (faults.length > 0) return { faults };

  const placeOf = (documentPath: readonly (string | number)[]): Place | null => {
    const [first, second, ...rest] = documentPath;
    const origin = origins.get(`${first}/${second}`) ?? origins.get(String(first));
    if (origin === undefined) return null;
    const inFile = origin.inFile.length === 2 ? [...origin.inFile, ...rest] : origin.inFile;
    return { file: origin.source.file, line: origin.source.lines.linePos(offsetOf(origin.source.yaml, inFile)).line };
  };
  return { document: typographicAll(document) as TreeFolder["document"], placeOf };
}

/** Where the deepest part of the path that exists begins: its key in a map, itself in a list. */
function offsetOf(yaml: Document.Parsed, inFile: readonly (string | number)[]): number {
  let node: unknown = yaml.contents;
  let offset = 0;
  for (const step of inFile) {
    if (isMap(node)) {
      const pair = node.items.find((item) => isScalar(item.key) && String(item.key.value) === String(step));
      if (pair === undefined) break;
      if (isScalar(pair.key)) offset = pair.key.range?.[0] ?? offset;
      node = pair.value;
    } else if (isSeq(node) && typeof step === "number") {
      node = node.items[step];
      if (typeof node !== "object" || node === null || !("range" in node)) break;
      offset = (node.range as [number, number, number] | undefined)?.[0] ?? offset;
    } else break;
  }
  return offset;
}

function yamlMend(code: string): string {
  if (code === "DUPLICATE_KEY") return "Keep one of the two lines with the same key.";
  if (code === "TAB_AS_INDENT") return "Indent with spaces.";
  if (code === "BAD_INDENT" || code === "BLOCK_AS_IMPLICIT_KEY")
    return 'Check indent and brackets here; text with a colon and a space, or that begins with a sign such as "*" or "@", needs quotes.';
  return "Check this line and the one before it: indent, quotes, brackets.";
}
