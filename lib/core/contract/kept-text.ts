import * as z from "zod";

/** The character NUL, which PostgreSQL keeps in no text. */
const NUL = /\u0000/g;

/** Can it be kept? Without the character NUL, and without halves of characters, such as a pasted or cut-off emoji leaves. */
export const isKeepable = (text: string): boolean => !text.includes("\0") && text.isWellFormed();

/** What somebody wrote in their own words, as it is kept: a character that cannot be kept is no reason to refuse the rest. */
export const KeptText = z.string().overwrite((text) => (isKeepable(text) ? text : text.replace(NUL, "").toWellFormed()));

/** Whether every text in it can be kept, keys included, however deep. */
export function allKeepable(value: unknown): boolean {
  if (typeof value === "string") return isKeepable(value);
  if (typeof value !== "object" || value === null) return true;
  return Object.entries(value).every(([key, inner]) => isKeepable(key) && allKeepable(inner));
}
