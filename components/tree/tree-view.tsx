"use client";

import { X } from "lucide-react";
import dynamic from "next/dynamic";
import { useState } from "react";
import { SelectedNode } from "./selected-node";
import { TreeOutline } from "./tree-outline";
import type { TreePart } from "./tree-part";

// Large, and nothing of it can be drawn without a browser.
const TreeMap = dynamic(() => import("./tree-map").then((module) => module.TreeMap), {
  ssr: false,
  loading: () => (
    <p role="status" className="h-[75vh] min-h-96 rounded-xl border border-rule p-4">
      Loading the picture…
    </p>
  ),
});

/** Of the panel over the picture, in pixels: w-96. */
const PANEL_WIDTH = 384;

/** One symptom's part of the tree: the picture, over its edge what the chosen node says, and the same as a list. */
export function TreeView({ part }: { part: TreePart }) {
  const [selected, setSelected] = useState<string | null>(null);
  return (
    <div className="grid gap-5">
      <div className="no-print relative hidden md:block">
        <TreeMap graph={part.graph} onSelect={setSelected} panelWidth={PANEL_WIDTH} />
        {selected && (
          <aside
            aria-label="What the chosen one says"
            tabIndex={0}
            className="absolute inset-y-0 right-0 w-96 max-w-full overflow-y-auto rounded-r-xl border border-rule bg-sheet px-4 py-4"
          >
            <button
              type="button"
              onClick={() => setSelected(null)}
              className="float-right ml-2 inline-flex min-h-12 min-w-12 items-center justify-center rounded-lg border-[1.5px] border-edge bg-sheet"
            >
              <X aria-hidden size={22} />
              <span className="visually-hidden">Close</span>
            </button>
            <SelectedNode id={selected} part={part} />
          </aside>
        )}
      </div>
      <p className="no-print hidden text-sm text-ink-2 md:block">
        Choose one to read what it asks, its steps and its sources. The same as a list:
      </p>
      <TreeOutline part={part} />
    </div>
  );
}
