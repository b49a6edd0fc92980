"use client";

import dynamic from "next/dynamic";
import { useMemo, useState } from "react";
import { graphOf, type TreeGraph } from "@/components/tree/tree-graph";
import { Button } from "@/components/ui/button";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { MapKeys } from "./map-keys";
import { AddNode } from "./add-node";

// React Flow is large; the shell stands before it comes.
const EditMap = dynamic(() => import("./edit-map").then((module) => module.EditMap), {
  ssr: false,
  loading: () => (
    <p role="status" className="min-h-96 flex-1 rounded-xl border border-rule p-4">
      Drawing…
    </p>
  ),
});

/** More are hard to take in at once; the rest is folded until asked for. */
const LIKELIEST = 12;

type Props = { bench: Workbench; tree: FaultTree; symptom: string; node: Place["node"]; onOpen: (node: Place["node"]) => void };

/** One symptom's part of the draft: the likeliest causes, what tells them, what cures them. */
export function GraphView({ bench, tree, symptom, node, onOpen }: Props) {
  const [all, setAll] = useState(false);
  const openCause = node?.list === "causes" ? node.key : null;
  const graph = useMemo(() => graphWith(tree, symptom, all ? Infinity : LIKELIEST, openCause), [tree, symptom, all, openCause]);
  if (!graph) return <p className="py-6">This symptom is no longer in the draft. Choose another at the left.</p>;
  const total = graph.causes.length + graph.folded;
  return (
    <div className="flex min-h-0 flex-1 flex-col gap-3">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <h2>{graph.symptom.title}</h2>
        <p className="text-sm text-ink-2">
          {graph.folded > 0 ? `The likeliest ${graph.causes.length} of ${total} causes.` : `${total} causes.`}
        </p>
        {total > LIKELIEST && <Button onClick={() => setAll(!all)}>{all ? `Only the likeliest ${LIKELIEST}` : "Show all"}</Button>}
        <MapKeys />
        <AddNode bench={bench} tree={tree} symptom={symptom} onOpen={onOpen} />
      </div>
      <EditMap key={`${symptom} ${all}`} bench={bench} graph={graph} symptom={symptom} node={node} onOpen={onOpen} />
    </div>
  );
}

/** The likeliest causes; all of them where the one that is open would be folded. */
function graphWith(tree: FaultTree, symptom: string, limit: number, openCause: string | null): TreeGraph | null {
  const graph = graphOf(tree, symptom, limit);
  const hangsHere = openCause !== null && tree.causes.find(({ key }) => key === openCause)?.shows[symptom] !== undefined;
  return hangsHere && graph && !graph.causes.some(({ key }) => key === openCause) ? graphOf(tree, symptom, Infinity) : graph;
}
