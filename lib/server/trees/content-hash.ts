import "server-only";
import { createHash } from "node:crypto";

/** SHA-256 of a document's content: the same whatever the order of its keys. */
export function contentHash(document: unknown): string {
  return createHash("sha256").update(canonical(document)).digest("hex");
}

/** JSON with sorted keys and without undefined values. */
export function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonical(item ?? null)).join(",")}]`;
  if (typeof value !== "object" || value === null) return JSON.stringify(value) ?? "null";
  const entries = Object.entries(value)
    .filter(([, item]) => item !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
  return `{${entries.map(([key, item]) => `${JSON.stringify(key)}:${canonical(item)}`).join(",")}}`;
}
