"use client";

import "@xyflow/react/dist/style.css";
import "./tree-map.css";
import {
  Controls,
  Position,
  type OnSelectionChangeFunc,
  type ReactFlowInstance,
  type Viewport,
  ReactFlow,
  ReactFlowProvider,
  ViewportPortal,
  type Edge,
  type Node,
} from "@xyflow/react";
import { useCallback, useMemo, useRef, useState } from "react";
import { drawnPart, type DrawnPart } from "./drawn-part";
import { heightOf, LANES, placesOf, type Places } from "./tree-layout";
import { nodeTypes } from "./tree-nodes";
import type { TreeGraph } from "./tree-graph";

type Props = {
  graph: TreeGraph;
  onSelect: (id: string | null) => void;
  /** Pixels at the right that are covered while a node is chosen. */ panelWidth: number;
};

/** One symptom's part of the tree, drawn in four ruled lanes. Read only: to look, to pan, to zoom. */
export function TreeMap({ graph, onSelect, panelWidth }: Props) {
  const [flow, setFlow] = useState<ReactFlowInstance | null>(null);
  const box = useRef<HTMLDivElement>(null);
  const chosen = useCallback<OnSelectionChangeFunc>(
    ({ nodes }) => {
      const node = nodes[0];
      onSelect(node?.id ?? null);
      if (node && flow && box.current) flow.setViewport(clearOfPanel(node, flow.getViewport(), box.current.clientWidth - panelWidth));
    },
    [onSelect, flow, panelWidth],
  );
  const { part, places } = useMemo(() => {
    const drawn = drawnPart(graph);
    return { part: drawn, places: placesOf(drawn) };
  }, [graph]);
  return (
    <div ref={box} className="tree-map h-[75vh] min-h-96 overflow-hidden rounded-xl border border-rule bg-paper text-sm leading-[22px]">
      <ReactFlowProvider key={graph.symptom.key + graph.causes.length}>
        <ReactFlow
          defaultNodes={nodesOf(part, places)}
          defaultEdges={edgesOf(part)}
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
          onInit={setFlow}
        >
          <Lanes places={places} />
          <Controls showInteractive={false} />
        </ReactFlow>
      </ReactFlowProvider>
    </div>
  );
}

/** The view moved left as far as the chosen node needs to be seen beside the panel. */
function clearOfPanel(node: Node, { x, y, zoom }: Viewport, freeWidth: number): Viewport {
  const rightEdge = (node.position.x + (node.width ?? 0)) * zoom + x;
  return { x: x - Math.max(0, rightEdge + 16 - freeWidth), y, zoom };
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
function nodesOf(graph: DrawnPart, places: Places): Node[] {
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
    ...graph.checks.map((drawn) => {
      let y = heightOf.checkHead(drawn.check.title);
      const handles = drawn.findings.map((f) => {
        const h = heightOf.findingRow(f.title);
        y += h;
        return right(LANES.check.width, y - h / 2, f.key);
      });
      return node(`check:${drawn.check.key}`, "check", { drawn }, handles);
    }),
    ...graph.causes.map((cause) => {
      const height = heightOf.cause(cause.title);
      const base = typeof cause.base === "number" ? `weight ${cause.base}` : cause.base;
      return node(`cause:${cause.key}`, "cause", { cause, base }, [left(height), right(LANES.cause.width, height / 2)]);
    }),
    ...graph.remedies.map((remedy) => node(`remedy:${remedy.key}`, "remedy", { remedy }, [left(heightOf.remedy(remedy.title))])),
  ];
}

function edgesOf(graph: DrawnPart): Edge[] {
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
