"use client";

import { useCallback, useEffect, useState } from "react";
import type { Told } from "@/lib/client/workshop/protocol";
import type { Flaw } from "@/lib/core/tree/flaw";
import type { FaultTree } from "@/lib/core/tree/schema";
import { useWorker } from "./use-worker";

/** What is wrong with the draft, as far as it has been looked at. `proved` is null while its known cases are replayed. */
export type Checked = { flaws: readonly Flaw[] | null; proved: { failing: readonly string[]; cases: number } | null };

const QUIET_MS = 150;

/** Looks the draft over off the screen's thread, after each change. */
export function useChecked(tree: FaultTree): Checked {
  const [checked, setChecked] = useState<Checked>({ flaws: null, proved: null });
  const hear = useCallback((told: Told) => {
    if (told.told === "flaws") setChecked({ flaws: told.flaws, proved: null });
    if (told.told === "failing") setChecked((now) => ({ ...now, proved: told }));
  }, []);
  const ask = useWorker(hear);
  useEffect(() => {
    const timer = setTimeout(() => ask({ ask: "check", tree }), QUIET_MS);
    return () => clearTimeout(timer);
  }, [tree, ask]);
  return checked;
}
