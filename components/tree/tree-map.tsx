"use client";

import "@xyflow/react/dist/style.css";
import "./tree-map.css";
import {
  Controls,
  type OnSelectionChangeFunc,
  type ReactFlowInstance,
  type Viewport,
  ReactFlow,
  ReactFlowProvider,
  type Node,
} from "@xyflow/react";
import { useCallback, useMemo, useRef, useState } from "react";
import { drawnPart } from "./drawn-part";
import { edgesOf, nodesOf } from "./flow-parts";
import { Lanes } from "./lanes";
import { placesOf } from "./tree-layout";
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
