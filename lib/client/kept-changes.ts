/** What was typed into a form by hand, and what it was filled in from before. */
export type KeptChanges = { basis: string; changes: Readonly<Record<string, unknown>> };

/**
 * A form as it is filled in now, with what was typed before laid over it. Where
 * it is now filled in from something else (another repair has cured it since),
 * fields that follow from that are filled in afresh.
 *
 * @param follows fields that hang on the basis.
 */
export function withKept<T extends object>(fresh: T, kept: KeptChanges | null, basis: string, follows: readonly (keyof T)[]): T {
  if (!kept) return fresh;
  const stays = ([key, value]: [string, unknown]): boolean =>
    key in fresh && sameKind(value, fresh[key as keyof T]) && (kept.basis === basis || !follows.includes(key as keyof T));
  return { ...fresh, ...Object.fromEntries(Object.entries(kept.changes).filter(stays)) };
}

/** What an earlier version of the form kept under the same name is left out. */
const sameKind = (a: unknown, b: unknown): boolean => typeof a === typeof b && Array.isArray(a) === Array.isArray(b);

/** Reads what was kept; null: nothing that could be used. */
export function readKept(text: string | null): KeptChanges | null {
  try {
    const kept: unknown = JSON.parse(text ?? "null");
    if (typeof kept !== "object" || kept === null) return null;
    const { basis, changes } = kept as Partial<KeptChanges>;
    return typeof basis === "string" && typeof changes === "object" && changes !== null ? { basis, changes } : null;
  } catch {
    return null;
  }
}
