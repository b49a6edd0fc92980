import type { ListName } from "@/lib/core/tree/flaw";

const nameOf = (draftId: string, list: ListName, key: string): string => `gudgeon.unfinished.${draftId}.${list}.${key}`;

/** What was typed into a node's form and is not a whole node yet; null: nothing. */
export function unfinished(draftId: string, list: ListName, key: string): Record<string, unknown> | null {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(nameOf(draftId, list, key)) ?? "null");
    return typeof kept === "object" && kept !== null ? (kept as Record<string, unknown>) : null;
  } catch {
    return null;
  }
}

export function keepUnfinished(draftId: string, list: ListName, key: string, values: unknown): void {
  try {
    if (values === null) localStorage.removeItem(nameOf(draftId, list, key));
    else localStorage.setItem(nameOf(draftId, list, key), JSON.stringify(values));
  } catch {
    // A device that keeps nothing still edits.
  }
}
