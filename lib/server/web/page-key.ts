import "server-only";
import * as z from "zod";
import { Problem } from "@/lib/core/contract/problem";

/** Where a page ends, for the next one to go on after: opaque to whoever holds it. */
export const pageKey = (at: Date, id: string): string => Buffer.from(`${at.toISOString()} ${id}`).toString("base64url");

/** Where to go on; undefined on the first page. @throws Problem 422 for what no page ever ended with */
export function readPageKey(key: string | undefined): { at: Date; id: string } | undefined {
  if (key === undefined) return undefined;
  const [at, id] = Buffer.from(key, "base64url").toString().split(" ");
  if (!z.iso.datetime().safeParse(at).success || !z.uuid().safeParse(id).success)
    throw Problem.invalid([{ path: "after", says: "This is not the next of a page." }]);
  return { at: new Date(at as string), id: id as string };
}
