"use client";

import "@xyflow/react/dist/style.css";
import "./tree-map.css";
import {
  Controls,
  Position,
  type OnSelectionChangeFunc,
  ReactFlow,
  ReactFlowProvider,
  ViewportPortal,
  type Edge,
  type Node,
} from "@xyflow/react";
import { useCallback, useEffect, useState } from "react";
import { LANES, placesOf, heightOf, type Places } from "./tree-layout";
import { nodeTypes } from "./tree-nodes";
import type { TreeGraph } from "./tree-graph";

/** One symptom's part of the tree, drawn in four ruled lanes. Read only: to look, to pan, to zoom. */
export function TreeMap({ graph, onSelect }: { graph: TreeGraph; onSelect: (id: string | null) => void }) {
  const chosen = useCallback<OnSelectionChangeFunc>(({ nodes }) => onSelect(nodes[0]?.id ?? null), [onSelect]);
  const [laid, setLaid] = useState<{ graph: TreeGraph; places: Places } | "failed" | null>(null);
  useEffect(() => {
    let wanted = true;
    placesOf(graph).then(
      (places) => wanted && setLaid({ graph, places }),
      () => wanted && setLaid("failed"),
    );
    return () => {
      wanted = false;
    };
  }, [graph]);
  if (laid === "failed") return <p role="alert">The picture could not be laid out in this browser. The same is in the list below.</p>;
  if (laid === null || laid.graph !== graph)
    return (
      <p role="status" className="h-[70vh] min-h-96 rounded-xl border border-rule p-4">
        Laying out…
      </p>
    );
  return (
    <div className="tree-map h-[70vh] min-h-96 overflow-hidden rounded-xl border border-rule bg-paper text-sm leading-[22px]">
      <ReactFlowProvider key={graph.symptom.key + graph.causes.length}>
        <ReactFlow
          defaultNodes={nodesOf(graph, laid.places)}
          defaultEdges={edgesOf(graph)}
          nodeTypes={nodeTypes}
          defaultViewport={{ x: 0, y: 0, zoom: 0.9 }}
          minZoom={0.1}
          maxZoom={2}
          nodesDraggable={false}
          nodesConnectable={false}
          edgesFocusable={false}
          onlyRenderVisibleElements
          preventScrolling={false}
          multiSelectionKeyCode={null}
          deleteKeyCode={null}
          onSelectionChange={chosen}
        >
          <Lanes places={laid.places} />
          <Controls showInteractive={false} />
        </ReactFlow>
      </ReactFlowProvider>
    </div>
  );
}

const LANE_TITLES = [
  ["symptom", "Symptom"],
  ["check", "Checks and their findings"],
  ["cause", "Likely causes"],
  ["remedy", "Remedies"],
] as const;

function Lanes({ places }: { places: Places }) {
  const bottom = Math.max(...[...places.values()].map((p) => p.y + p.height)) + 40;
  return (
    <ViewportPortal>
      {LANE_TITLES.map(([lane, title]) => (
        <div key={lane} className="absolute text-ink-2" style={{ left: LANES[lane].x, top: 8 }}>
          {title}
        </div>
      ))}
      {(["check", "cause", "remedy"] as const).map((lane) => (
        <div key={lane} className="absolute w-px bg-rule" style={{ left: LANES[lane].x - 24, top: 0, height: bottom }} />
      ))}
    </ViewportPortal>
  );
}

type Handles = NonNullable<Node["handles"]>;

/** Sizes and handles are given, so that nothing is measured and links to nodes outside the view are drawn. */
function nodesOf(graph: TreeGraph, places: Places): Node[] {
  const node = (id: string, type: keyof typeof LANES, data: Record<string, unknown>, handles: Handles): Node => {
    const { x, y, height } = places.get(id)!;
    const { width } = LANES[type];
    return { id, type, data, position: { x, y }, width, height, measured: { width, height }, handles, draggable: false };
  };
  const left = (height: number): Handles[number] => ({ type: "target", position: Position.Left, x: 0, y: height / 2, width: 1, height: 1 });
  const right = (width: number, y: number, id?: string): Handles[number] => ({
    id,
    type: "source",
    position: Position.Right,
    x: width,
    y,
    width: 1,
    height: 1,
  });
  return [
    node("symptom", "symptom", { symptom: graph.symptom }, []),
    ...graph.checks.map((check) => {
      let y = heightOf.checkHead(check.title);
      const handles = check.findings.map((f) => {
        const h = heightOf.findingRow(f.title);
        y += h;
        return right(LANES.check.width, y - h / 2, f.key);
      });
      return node(`check:${check.key}`, "check", { check }, handles);
    }),
    ...graph.causes.map((cause) => {
      const height = heightOf.cause(cause.title);
      const base = typeof cause.base === "number" ? `weight ${cause.base}` : cause.base;
      return node(`cause:${cause.key}`, "cause", { cause, base }, [left(height), right(LANES.cause.width, height / 2)]);
    }),
    ...graph.remedies.map((remedy) => node(`remedy:${remedy.key}`, "remedy", { remedy }, [left(heightOf.remedy(remedy.title))])),
  ];
}

function edgesOf(graph: TreeGraph): Edge[] {
  return [
    ...graph.tells.map((t) => ({
      id: `${t.check}/${t.finding}/${t.cause}`,
      source: `check:${t.check}`,
      sourceHandle: t.finding,
      target: `cause:${t.cause}`,
      style: { stroke: "var(--fill)", strokeWidth: Math.min(5, 1 + Math.log2(t.ratio) / 1.4) },
    })),
    ...graph.cures.map((c) => ({
      id: `${c.cause}/${c.remedy}`,
      source: `cause:${c.cause}`,
      target: `remedy:${c.remedy}`,
      style: { stroke: "var(--sound)", strokeWidth: 1 + 2 * c.strength },
    })),
  ];
}
