import type { FaultTree, KnownCase } from "../tree/schema";
import { placeOf } from "./prove";

/** With all that a known case tells, does a right cause stand among the first three? */
export function caseHolds(tree: FaultTree, known: KnownCase): boolean {
  const { place } = placeOf(tree, known, "all");
  return place !== null && place <= 3;
}
