import { clsx } from "clsx";

/** Shares are told apart by pattern first; by night there is one colour only. */
export type Pattern = "solid" | "hatched" | "barred" | "pale" | "empty";

export const PATTERN_LOOK: Record<Pattern, string> = {
  solid: "bg-fill",
  hatched: "hatched",
  barred: "barred",
  pale: "bg-shoal ring-1 ring-edge ring-inset",
  empty: "bg-sheet ring-1 ring-edge ring-inset",
};

export function Swatch({ pattern }: { pattern: Pattern }) {
  return <i aria-hidden className={clsx("mr-2.5 inline-block size-3.5 rounded-xs align-[-1px]", PATTERN_LOOK[pattern])} />;
}
