import "server-only";
import { Problem } from "@/lib/core/contract/problem";

/** A thing whose address and whose body name the same parent; 422 where they differ. */
export function inPlace<T extends Record<F, string>, F extends string>(field: F, inAddress: string, thing: T): T {
  if (thing[field] !== inAddress) throw Problem.invalid([{ path: field, says: "The address names another." }]);
  return thing;
}
