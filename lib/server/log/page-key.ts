import "server-only";
import * as z from "zod";

/** Where a page ends, for the next one to go on after: opaque to whoever holds it. */
export const pageKey = (at: Date, id: string): string => Buffer.from(`${at.toISOString()} ${id}`).toString("base64url");

/** null for what no page ever ended with. */
export function readPageKey(key: string): { at: Date; id: string } | null {
  const [at, id] = Buffer.from(key, "base64url").toString().split(" ");
  return z.iso.datetime().safeParse(at).success && z.uuid().safeParse(id).success ? { at: new Date(at as string), id: id as string } : null;
}
