"use client";

import { useState } from "react";
import { useTicking } from "@/lib/client/screen/use-ticking";
import { Button } from "@/components/ui/button";

/** Takes a time: tap, wait, tap. The figure is then typed as the reading, so that a slip can be put right. */
export function Stopwatch() {
  const [from, setFrom] = useState<number | null>(null);
  const [taken, setTaken] = useState<number | null>(null);
  const running = useTicking(from);
  return (
    <section aria-label="Stopwatch" className="rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
      <div className="flex items-center justify-between gap-3">
        <p className="font-semibold">Take the time</p>
        <p className="dial text-xl">{(running ?? taken ?? 0).toFixed(1)} s</p>
      </div>
      <Button
        wide
        className="mt-2"
        onClick={() => {
          if (from === null) return setFrom(Date.now());
          setTaken((Date.now() - from) / 1000);
          setFrom(null);
        }}
      >
        {from === null ? (taken === null ? "Start" : "Start again") : "Stop"}
      </Button>
    </section>
  );
}
