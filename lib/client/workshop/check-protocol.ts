import type { Flaw } from "@/lib/core/tree/flaw";
import type { FaultTree } from "@/lib/core/tree/schema";

/** What the workshop asks of its worker, and what comes back; an answer carries the number of its question. */
export type CheckAsk = { id: number; tree: FaultTree };
/** `failing`: known cases whose cause is not among the first three. */
export type CheckTold = { id: number; flaws: readonly Flaw[] } | { id: number; failing: readonly string[]; cases: number };
