import type { Replayed } from "./protocol";

/** What a change of the tree did to a known case. */
export type Verdict = "broke" | "worse" | "same" | "better";

const FIRST_FEW = 3;

/** Broke: its cause was among the first three on all that is told, and is no longer. Else by the place on all but the look that settled it, then by all, then by the minutes. */
export function verdictOf(before: Replayed, after: Replayed): Verdict {
  const holds = ({ all }: Replayed): boolean => (all ?? Infinity) <= FIRST_FEW;
  if (holds(before) && !holds(after)) return "broke";
  const gain =
    place(before.butConfirming) - place(after.butConfirming) ||
    place(before.all) - place(after.all) ||
    place(before.start) - place(after.start) ||
    (before.minutes ?? 0) - (after.minutes ?? 0);
  return gain > 0 ? "better" : gain < 0 ? "worse" : "same";
}

/** Not in the tree is worse than any place. */
const place = (at: number | null): number => at ?? 10_000;
