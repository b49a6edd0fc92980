import type * as z from "zod";
import { isListName, LIST_KINDS, type Flaw } from "./flaw";
import { didYouMean } from "./nearest";
import { FaultTree } from "./schema";

type Issue = z.core.$ZodIssue;
type Path = (string | number)[];

/**
 * Reads a document of unknown shape as a fault tree. Faults of shape come back
 * as flaws that name the node by its key and say what to do; what only the
 * whole tree can show is findFlaws' part.
 */
export function parseTree(input: unknown): { tree: FaultTree } | { flaws: Flaw[] } {
  const parsed = FaultTree.safeParse(input, { reportInput: true });
  if (parsed.success) return { tree: parsed.data };
  return { flaws: parsed.error.issues.flatMap((issue) => shapeFlaws(issue, input, [])) };
}

function shapeFlaws(issue: Issue, input: unknown, base: Path): Flaw[] {
  const path = [...base, ...issue.path.map((step) => (typeof step === "symbol" ? String(step) : step))];
  const at = { node: nodeAt(input, path), path, severity: "error" as const, rule: "shape" };
  const field = fieldName(path);
  if (issue.code === "unrecognized_keys") {
    return issue.keys.map((key) => ({
      ...at,
      path: [...path, key],
      says: `"${key}" is not something ${field === "" ? "this" : `"${field}"`} can have.`,
      mend: didYouMean(key, fieldsNear(path), "Take it out, or see trees/fault-tree.schema.json for what may stand here."),
    }));
  }
  if (issue.code === "invalid_union") return [{ ...at, ...unionSays(issue, field) }];
  if (issue.code === "invalid_key")
    return [
      {
        ...at,
        says: `"${String(path.at(-1))}" cannot stand as a key here: ${firstReason(issue.issues)}.`,
        mend: "Write the key of a node: lower-case words joined by hyphens.",
      },
    ];
  return [{ ...at, ...plainSays(issue, field) }];
}

function plainSays(issue: Issue, field: string): Pick<Flaw, "says" | "mend"> {
  if (issue.code === "invalid_type" && issue.input === undefined)
    return { says: `"${field}" is missing.`, mend: `Add "${field}" (${expected(issue.expected)}).` };
  if (issue.code === "invalid_type") {
    const quotes = issue.expected === "string" && typeof issue.input !== "object";
    return {
      says: `"${field}" is ${shown(issue.input)}; it has to be ${expected(issue.expected)}.`,
      mend: quotes ? "Put it in quotes." : `Write ${expected(issue.expected)}.`,
    };
  }
  if (issue.code === "invalid_value") {
    const values = issue.values.map(String);
    const list = values.map((value) => `"${value}"`).join(", ");
    if (issue.input === undefined) return { says: `"${field}" is missing.`, mend: `Add it: one of ${list}.` };
    return {
      says: `"${field}" is ${shown(issue.input)}; it has to be ${values.length === 1 ? list : `one of ${list}`}.`,
      mend: didYouMean(String(issue.input), values, `Choose ${values.length === 1 ? list : "one of them"}.`),
    };
  }
  if (issue.code === "too_small" || issue.code === "too_big")
    return {
      says: `"${field}" is ${sizeSays(issue)}.`,
      mend:
        typeof issue.input === "number"
          ? "Write a number in that range."
          : issue.code === "too_small"
            ? "Add what is missing."
            : "Shorten it, or split it.",
    };
  return { says: `"${field}" is ${shown(issue.input)}: ${issue.message}.`, mend: "Write it in that form." };
}

function unionSays(issue: Extract<Issue, { code: "invalid_union" }>, field: string): Pick<Flaw, "says" | "mend"> {
  const last = field.split(" > ").at(-1) ?? field;
  const values = issue.errors
    .flat()
    .flatMap((inner) => (inner.code === "invalid_value" && inner.path.length === 0 ? inner.values.map(String) : []));
  const says = issue.input === undefined ? `"${field}" is missing.` : `"${field}" is ${shown(issue.input)}, which does not fit.`;
  if (values.length > 0) {
    const choice = `Write one of ${values.map((value) => `"${value}"`).join(", ")}, or a number in its range.`;
    return { says, mend: typeof issue.input === "string" ? didYouMean(issue.input, values, choice) : choice };
  }
  const reasons = issue.errors.map((inner) => firstReason(inner)).filter((reason) => reason !== "");
  return { says, mend: `"${last}" can be written in ${issue.errors.length} ways; none fits: ${[...new Set(reasons)].join("; or ")}.` };
}

const firstReason = (issues: readonly Issue[]): string => {
  const first = issues[0];
  if (first === undefined) return "";
  return `${first.path.length > 0 ? `"${first.path.map(String).join(" > ")}": ` : ""}${first.message.replace(/\.$/, "")}`;
};

function sizeSays(issue: Extract<Issue, { code: "too_small" | "too_big" }>): string {
  const small = issue.code === "too_small";
  const limit = String(small ? issue.minimum : issue.maximum);
  if (issue.origin === "string") return small ? "empty" : `too long: ${limit} characters at most`;
  if (issue.origin === "array") return small ? `too short a list: ${limit} at least` : `too long a list: ${limit} at most`;
  const edge = issue.inclusive === true ? limit : `${small ? "more" : "less"} than ${limit}`;
  return `${shown(issue.input)}; it has to be ${issue.inclusive === true ? `${edge} or ${small ? "more" : "less"}` : edge}`;
}

const TYPE_WORDS: Record<string, string> = {
  string: "text",
  number: "a number",
  int: "a whole number",
  array: "a list",
  object: "a map",
  record: "a map",
  boolean: "true or false",
};
const expected = (type: string): string => TYPE_WORDS[type] ?? type;

function shown(value: unknown): string {
  if (value === undefined) return "missing";
  if (value === null) return "empty";
  if (Array.isArray(value)) return "a list";
  if (typeof value === "object") return "a map";
  const text = JSON.stringify(value);
  return text.length > 60 ? `${text.slice(0, 57)}..."` : text;
}

/** The path below the node, as one reads it: 'findings 2 > title'. */
function fieldName(path: Path): string {
  const inNode = typeof path[0] === "string" && isListName(path[0]) && typeof path[1] === "number" ? path.slice(2) : path;
  return inNode
    .map((step) => (typeof step === "number" ? String(step + 1) : step))
    .join(" > ")
    .replaceAll(/ > (\d+)/g, " $1");
}

function nodeAt(input: unknown, path: Path): Flaw["node"] {
  const [list, index] = path;
  if (typeof list !== "string" || !isListName(list) || typeof index !== "number") return { kind: "tree", key: keyOf(input) ?? "tree" };
  const nodes = (input as Record<string, unknown>)[list];
  const key = Array.isArray(nodes) ? keyOf(nodes[index]) : null;
  return { kind: LIST_KINDS[list], key: key ?? `number ${index + 1}` };
}

function keyOf(node: unknown): string | null {
  if (typeof node !== "object" || node === null || !("key" in node)) return null;
  return typeof node.key === "string" ? node.key : null;
}

/** The fields a map at this path may have, as far as the path stays in plain shapes. */
function fieldsNear(path: Path): string[] {
  let shape: unknown = FaultTree;
  for (const step of path) {
    const inner = plain(shape);
    shape =
      typeof step === "number"
        ? (inner as { element?: unknown } | undefined)?.element
        : (inner as { shape?: Record<string, unknown> } | undefined)?.shape?.[step];
  }
  return Object.keys((plain(shape) as { shape?: object } | undefined)?.shape ?? {});
}

/** Without the wrappers that optional and default put round a shape. */
function plain(shape: unknown): unknown {
  let inner = shape as { def?: { innerType?: unknown } } | undefined;
  while (inner?.def?.innerType !== undefined) inner = inner.def.innerType as typeof inner;
  return inner;
}
