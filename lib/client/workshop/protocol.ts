import type { Learned } from "@/lib/core/diagnosis/learn";
import type { LearnedBase } from "@/lib/core/diagnosis/learn-base-rates";
import type { Flaw } from "@/lib/core/tree/flaw";
import type { FaultTree, KnownCase } from "@/lib/core/tree/schema";

/** What the workshop asks of its worker. A newer question of a kind puts an older one aside. */
export type Ask =
  | { ask: "check"; id: number; tree: FaultTree }
  /** Each case replayed on both trees; `play`: the planner's way to the end too, which takes a while. */
  | { ask: "prove"; id: number; before: FaultTree; tree: FaultTree; cases: readonly KnownCase[]; play: boolean }
  | { ask: "learn"; id: number; tree: FaultTree; cases: readonly KnownCase[] };

/** Where the right cause stands, from 1 (null: not in the tree), and the minutes of the planner's way where it was played. */
export type Replayed = { start: number | null; butConfirming: number | null; all: number | null; minutes: number | null };

/** What comes back; it carries the number of its question. */
export type Told =
  | { id: number; told: "flaws"; flaws: readonly Flaw[] }
  | { id: number; told: "failing"; failing: readonly string[]; cases: number }
  | { id: number; told: "case"; key: string; before: Replayed; after: Replayed }
  | { id: number; told: "proved" }
  | { id: number; told: "learned"; links: readonly Learned[]; bases: readonly LearnedBase[] };
