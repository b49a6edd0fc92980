/**
 * Straight quotes and apostrophes as print has them: people type them straight,
 * in files and in forms, and screens show them round. A sign behind a figure
 * stays: it is minutes, feet or inches.
 */
export function typographic(text: string): string {
  return text
    .replace(/(?<=^|[\s(\[])"(?=\S)/g, "\u201c")
    .replace(/(?<![\d\s])"/g, "\u201d")
    .replace(/(?<=[\p{L}\p{N}.])'(?=\p{L})|(?<=\p{L})'(?!\p{L})/gu, "\u2019");
}

/** The same for every text in a document, keys aside. */
export function typographicAll(value: unknown): unknown {
  if (typeof value === "string") return typographic(value);
  if (Array.isArray(value)) return value.map(typographicAll);
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, typographicAll(inner)]));
}
