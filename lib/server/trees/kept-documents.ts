import "server-only";
import type { FaultTree } from "@/lib/core/tree/schema";

const KEPT = 8;
const kept = new Map<string, FaultTree>();

/** A published document, read once and then kept: it never changes, so no second process can know better. The eight last used stay. */
export async function keptDocument(key: string, read: () => Promise<FaultTree>): Promise<FaultTree> {
  const document = kept.get(key) ?? (await read());
  kept.delete(key);
  kept.set(key, document);
  for (const oldest of kept.keys()) {
    if (kept.size <= KEPT) break;
    kept.delete(oldest);
  }
  return document;
}
