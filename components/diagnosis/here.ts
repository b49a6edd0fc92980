"use client";

import { createContext, useContext } from "react";
import type { Engine } from "@/lib/core/contract/engine";
import type { Phone } from "@/lib/core/contract/phone";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { WhatIf } from "@/lib/core/diagnosis/what-if";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Summary } from "@/lib/client/store/summary";
import type { Address } from "@/lib/client/screen/use-address";
import type { Recorder } from "@/lib/client/screen/use-diagnosis";
import type { Ready } from "@/lib/client/screen/surface";
import type { KeptEvent } from "@/lib/client/store/database";

/** What every screen of an open diagnosis works with. */
export type Here = {
  ready: Ready;
  phone: Phone;
  engine: Engine;
  tree: FaultTree;
  view: DiagnosisView;
  summary: Summary;
  events: readonly KeptEvent[];
  thinking: boolean;
  address: Address;
  /** Goes to another screen of this diagnosis. */
  go: (at: Address["at"], which?: string, how?: "push" | "replace") => void;
  toEngines: () => void;
  record: Recorder;
  /** Looks behind the step that is due; worked out when it is called. */
  whatIf: () => Promise<WhatIf>;
  /** Goes to the step that is due, and leaves a trail: the phone's own back leads to the answer that was just given. */
  goOnFrom: (event: string) => void;
  /** What was said last, to be undone with one tap; or, where it was many things at once, to be looked at. */
  undo: { event: string; says: string; withdraws: string | null } | { says: string; look: Address["at"] } | null;
  setUndo: (undo: Here["undo"]) => void;
};

export const HereContext = createContext<Here | null>(null);

export function useHere(): Here {
  const here = useContext(HereContext);
  if (!here) throw new Error("a screen of a diagnosis stands outside of one");
  return here;
}
