"use client";

import dynamic from "next/dynamic";
import { useState } from "react";
import { SelectedNode } from "./selected-node";
import { TreeOutline } from "./tree-outline";
import type { TreePart } from "./tree-part";

// Large, and nothing of it can be drawn without a browser.
const TreeMap = dynamic(() => import("./tree-map").then((module) => module.TreeMap), {
  ssr: false,
  loading: () => <p role="status">Loading the picture…</p>,
});

/** One symptom's part of the tree: the picture, the same as a list, and beside them what the chosen node says. */
export function TreeView({ part }: { part: TreePart }) {
  const [selected, setSelected] = useState<string | null>(null);
  const panel = selected && <SelectedNode id={selected} part={part} />;
  return (
    <div className="grid gap-5">
      <div className="no-print hidden gap-5 md:grid xl:grid-cols-[minmax(0,1fr)_22rem]">
        <TreeMap graph={part.graph} onSelect={setSelected} />
        <aside
          aria-label="What the chosen node says"
          className="max-h-[70vh] overflow-y-auto rounded-xl border border-rule bg-sheet px-4 py-4"
          tabIndex={0}
        >
          {panel || <p className="text-ink-2">Choose a node to read what it asks, its steps and its sources.</p>}
        </aside>
      </div>
      <TreeOutline part={part} />
    </div>
  );
}
