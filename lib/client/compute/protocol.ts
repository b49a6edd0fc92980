import type { DiagnosisEvent } from "@/lib/core/contract/event";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { WhatIf } from "@/lib/core/diagnosis/what-if";
import type { FaultTree } from "@/lib/core/tree/schema";

/** What the screen asks of the worker. A tree is sent once; it is large. */
export type Ask =
  | { ask: "keep-tree"; version: string; tree: FaultTree }
  | { ask: "view" | "what-if"; id: number; version: string; events: readonly DiagnosisEvent[] };

export type Told = { id: number; view: DiagnosisView } | { id: number; whatIf: WhatIf } | { id: number; failure: string };
