import type * as z from "zod";

/**
 * Reads what a newer server says with an older phone's shapes: keys that it does
 * not know are left out, and of a list whatever cannot be read at all, so that one
 * entry of a kind invented since does not take the whole fleet off the phone.
 *
 * @throws z.ZodError where something outside of a list cannot be read
 */
export function readLoosely<T>(shape: z.ZodType<T>, answer: unknown): T {
  const copy: unknown = structuredClone(answer);
  for (;;) {
    const read = shape.safeParse(copy);
    if (read.success) return read.data;
    const { issues } = read.error;
    const strange = issues.filter((issue) => issue.code === "unrecognized_keys");
    for (const { path, keys } of strange) for (const key of keys) Reflect.deleteProperty(Object(at(copy, path)), key);
    if (strange.length > 0) continue;
    const entries = issues.map((issue) => entryOf(copy, issue.path));
    if (entries.some((entry) => entry === null)) throw read.error;
    dropAll(entries.filter((entry) => entry !== null));
  }
}

type Entry = { list: unknown[]; place: number };

/** The innermost entry of a list that a path leads through. */
function entryOf(copy: unknown, path: readonly PropertyKey[]): Entry | null {
  for (let depth = path.length - 1; depth >= 0; depth -= 1) {
    const list = at(copy, path.slice(0, depth));
    const place = path[depth];
    if (Array.isArray(list) && typeof place === "number") return { list, place };
  }
  return null;
}

/** The last first, so that those before keep their places; one that is wrong in two ways goes once. */
function dropAll(entries: readonly Entry[]): void {
  const gone = new Map<unknown[], Set<number>>();
  for (const { list, place } of entries) gone.set(list, (gone.get(list) ?? new Set()).add(place));
  for (const [list, places] of gone) for (const place of [...places].sort((a, b) => b - a)) list.splice(place, 1);
}

const at = (from: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>((thing, key) => (typeof thing === "object" && thing !== null ? Reflect.get(thing, key) : undefined), from);
