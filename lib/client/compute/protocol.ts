import type { DiagnosisEvent } from "@/lib/core/contract/event";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { FaultTree } from "@/lib/core/tree/schema";

/** What the screen asks of the worker. A tree is sent once; it is large. */
export type Ask =
  { ask: "keep-tree"; version: string; tree: FaultTree } | { ask: "view"; id: number; version: string; events: readonly DiagnosisEvent[] };

export type Told = { id: number; view: DiagnosisView } | { id: number; failure: string };
