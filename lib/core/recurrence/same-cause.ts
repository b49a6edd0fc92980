import type { LogEntry } from "../contract/log";

type Named = { key: string | null; title: string };

/** A cause's words reduced to their letters and figures: "Impeller, worn" and "impeller WORN" are one. */
function plainWords(words: string): string {
  const plain = words
    .normalize("NFKC")
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, "");
  return plain || words.trim();
}

/**
 * A function that gives every cause of a log its identity (rule C2): its key,
 * or for a cause in words the key whose title they say, or else a key made of the words.
 */
export function causeIdentity(causes: Iterable<Named>): (cause: Named) => string {
  const keyOfTitle = new Map<string, string>();
  for (const cause of causes) if (cause.key) keyOfTitle.set(plainWords(cause.title), cause.key);
  return (cause) => cause.key ?? keyOfTitle.get(plainWords(cause.title)) ?? keyOfWords(cause.title);
}

/** A key for a cause that only words name. The prefix keeps it apart from the keys of trees; the figures after it keep two alphabets apart. */
function keyOfWords(words: string): string {
  const plain = plainWords(words);
  let mix = 0x811c9dc5; // FNV-1a, 32 bits: a fingerprint, not a secret
  for (const char of plain) mix = Math.imul(mix ^ (char.codePointAt(0) ?? 0), 0x01000193) >>> 0;
  const latin = plain.replace(/[^a-z0-9]/g, "").slice(0, 48);
  return `in-words-${latin ? `${latin}-` : ""}${mix.toString(36)}`;
}

export const causesOf = (entries: readonly Pick<LogEntry, "cause">[]): Named[] =>
  entries.flatMap((entry) => (entry.cause ? [entry.cause] : []));
