"use client";

import { useEffect, useRef, useState } from "react";
import type { CheckAsk, CheckTold } from "@/lib/client/workshop/check-protocol";
import type { Flaw } from "@/lib/core/tree/flaw";
import type { FaultTree } from "@/lib/core/tree/schema";

/** What is wrong with the draft, as far as it has been looked at. `proved` is null while its known cases are replayed. */
export type Checked = { flaws: readonly Flaw[] | null; proved: { failing: readonly string[]; cases: number } | null };

const QUIET_MS = 150;

/** Looks the draft over off the screen's thread, after each change. */
export function useChecked(tree: FaultTree): Checked {
  const [checked, setChecked] = useState<Checked>({ flaws: null, proved: null });
  const worker = useRef<Worker | null>(null);
  const asked = useRef(0);
  useEffect(() => {
    const made = new Worker(new URL("../../lib/client/workshop/check-worker.ts", import.meta.url), { type: "module" });
    made.onmessage = ({ data }: MessageEvent<CheckTold>) => {
      if (data.id !== asked.current) return;
      setChecked((now) => ("flaws" in data ? { flaws: data.flaws, proved: null } : { ...now, proved: data }));
    };
    worker.current = made;
    return () => made.terminate();
  }, []);
  useEffect(() => {
    const timer = setTimeout(() => worker.current?.postMessage({ id: ++asked.current, tree } satisfies CheckAsk), QUIET_MS);
    return () => clearTimeout(timer);
  }, [tree]);
  return checked;
}
