"use client";

import { useSyncExternalStore } from "react";
import { drawingsOpen, keepDrawingsOpen, onDrawingsOpen } from "@/lib/client/drawings-open";
import { DRAWINGS, isDrawing } from "@/lib/core/tree/drawings";
import { Drawing } from "./drawing";

/** A step's drawing in a fold; whether folds of drawings stand open is one wish for all, kept on this device. */
export function StepDrawing({ drawing }: { drawing: string }) {
  const open = useSyncExternalStore(onDrawingsOpen, drawingsOpen, () => true);
  return (
    <details
      open={open}
      onToggle={(event) => {
        if (event.currentTarget.open !== open) keepDrawingsOpen(event.currentTarget.open);
      }}
      className="mb-3.5 max-w-lg overflow-hidden rounded-[10px] border-[1.5px] border-edge bg-sheet"
    >
      <summary className="flex min-h-12 items-center px-3 py-1.5 text-sm font-semibold">
        {isDrawing(drawing) ? DRAWINGS[drawing].title : "Drawing"}
      </summary>
      {open && <Drawing of={drawing} />}
    </details>
  );
}
