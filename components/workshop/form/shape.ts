import type * as z from "zod";

type Def = {
  type: string;
  innerType?: z.ZodType;
  element?: z.ZodType;
  shape?: Record<string, z.ZodType>;
  valueType?: z.ZodType;
  keyType?: z.ZodType;
  options?: z.ZodType[];
  values?: unknown[];
  entries?: Record<string, string>;
  items?: z.ZodType[];
};

/** What a field of the document holds, for the control that edits it. */
export type Shape =
  | { is: "text"; long: boolean }
  | { is: "number"; whole: boolean }
  | { is: "one-of"; values: readonly string[] }
  | { is: "mark" }
  | { is: "group"; fields: readonly Field[] }
  | { is: "list"; of: Shape }
  | { is: "map"; of: Shape }
  /** Anything that has an editor of its own, or none. */
  | { is: "other" };

/** `must`: the node is no node without it. */
export type Field = { name: string; shape: Shape; must: boolean };

/** A line is at most so long; what may be longer gets a box of several lines. */
const LINE = 200;

/** How a field is edited follows from the document's own schema, so that a field that is new there can be edited here at once. */
export function shapeOf(schema: z.ZodType): Shape {
  const inner = unwrapped(schema);
  const def = defOf(inner);
  switch (def.type) {
    case "string":
      return { is: "text", long: ((inner as z.ZodString).maxLength ?? LINE) > LINE };
    case "number":
      return { is: "number", whole: (inner as z.ZodNumber).format === "safeint" };
    case "enum":
      return { is: "one-of", values: Object.values(def.entries ?? {}) };
    case "literal":
    case "boolean":
      return { is: "mark" };
    case "object":
      return { is: "group", fields: fieldsOf(inner) };
    case "array":
      return def.element ? { is: "list", of: shapeOf(def.element) } : { is: "other" };
    case "record":
      return def.valueType ? { is: "map", of: shapeOf(def.valueType) } : { is: "other" };
    default:
      return { is: "other" };
  }
}

/** The fields of an object's schema, in its order. */
export function fieldsOf(schema: z.ZodType): Field[] {
  return Object.entries(defOf(unwrapped(schema)).shape ?? {}).map(([name, field]) => ({
    name,
    shape: shapeOf(field),
    must: isMust(field),
  }));
}

function isMust(schema: z.ZodType): boolean {
  return !["optional", "default"].includes(defOf(schema).type);
}

function unwrapped(schema: z.ZodType): z.ZodType {
  let inner = schema;
  for (let next = defOf(inner).innerType; next !== undefined; next = defOf(inner).innerType) inner = next;
  return inner;
}

const defOf = (schema: z.ZodType): Def => schema.def as unknown as Def;
