import "server-only";
import { Problem } from "@/lib/core/contract/problem";

/** A phone's clock may be off, and a boat's day begins elsewhere. */
const GRACE_MS = 24 * 3600 * 1000;

/** The moment of something that has been done; 422 where it lies ahead. */
export function notAhead(field: string, moment: string): Date {
  const at = new Date(moment);
  if (at.getTime() > Date.now() + GRACE_MS) throw Problem.invalid([{ path: field, says: "That day is still to come." }]);
  return at;
}
