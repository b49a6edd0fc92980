"use client";

import "@xyflow/react/dist/style.css";
import "@/components/tree/tree-map.css";
import {
  Controls,
  ReactFlow,
  ReactFlowProvider,
  useReactFlow,
  type Connection,
  type Edge,
  type Node,
  type NodeChange,
} from "@xyflow/react";
import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import { drawnPart } from "@/components/tree/drawn-part";
import { Lanes } from "@/components/tree/lanes";
import { edgesOf, nodesOf } from "@/components/tree/flow-parts";
import { nodeTypes } from "@/components/tree/tree-nodes";
import type { TreeGraph } from "@/components/tree/tree-graph";
import { placesOf } from "@/components/tree/tree-layout";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { copyNodes, pasteNodes, type Fragment } from "@/lib/core/tree/edits/paste-nodes";
import { removeNode } from "@/lib/core/tree/edits/remove-node";
import { linkStrength, setLink } from "@/lib/core/tree/edits/set-link";
import type { ListName } from "@/lib/core/tree/flaw";
import { isTyping } from "../use-undo-keys";
import type { Place } from "../place";
import { handPlaces, keepHandPlaces } from "./hand-places";
import { linkBetween, linkId, linkOfId } from "./link-of";
import { LinkPicker } from "./link-picker";

type Props = { bench: Workbench; graph: TreeGraph; symptom: string; node: Place["node"]; onOpen: (node: Place["node"]) => void };

const LIST_OF: Readonly<Record<string, ListName>> = { symptom: "symptoms", check: "checks", cause: "causes", remedy: "remedies" };

/** The picture one edits in: drag from a finding to a cause, from a cause to a remedy; delete, copy, paste; move what stands badly. */
export function EditMap(props: Props) {
  return (
    <ReactFlowProvider>
      <Canvas {...props} />
    </ReactFlowProvider>
  );
}

function Canvas({ bench, graph, symptom, node: open, onOpen }: Props) {
  const { fitView } = useReactFlow();
  const draftId = bench.session.get().saved.id;
  const [moved, setMoved] = useState(() => handPlaces(draftId, symptom));
  const [chosenLink, setChosenLink] = useState<string | null>(null);
  const clipboard = useRef<Fragment | null>(null);
  const part = useMemo(() => drawnPart(graph), [graph]);
  const places = useMemo(() => placesOf(part), [part]);
  const [picked, setPicked] = useState<ReadonlySet<string>>(new Set());
  const idOfOpen = open === null ? null : idOf(open, symptom);
  const nodes = useMemo(
    () =>
      nodesOf(part, places, true).map((node): Node => ({
        ...node,
        position: moved[node.id] ?? node.position,
        selected: picked.has(node.id) || (picked.size === 0 && node.id === idOfOpen),
      })),
    [part, places, moved, picked, idOfOpen],
  );
  const edges = useMemo(
    () =>
      edgesOf(part).map((edge): Edge => {
        const id = linkId(edge.source, edge.sourceHandle ?? null, edge.target);
        return { ...edge, id, selected: chosenLink === id, focusable: true };
      }),
    [part, chosenLink],
  );
  useEffect(() => {
    if (idOfOpen !== null) void fitView({ nodes: [{ id: idOfOpen }], minZoom: 0.5, maxZoom: 1, duration: 200 });
  }, [idOfOpen, fitView]);

  // Nodes are the tree's: of what the picture says of them only choosing and moving is taken.
  const onNodesChange = useCallback(
    (changes: NodeChange[]) => {
      const selects = changes.filter((change) => change.type === "select");
      if (selects.length > 0)
        setPicked((now) => {
          const next = new Set(now);
          for (const { id, selected } of selects)
            if (selected) next.add(id);
            else next.delete(id);
          return next;
        });
      const positions = changes.flatMap((change) =>
        change.type === "position" && change.position ? [[change.id, change.position] as const] : [],
      );
      if (positions.length > 0)
        setMoved((now) => {
          const next = { ...now, ...Object.fromEntries(positions) };
          keepHandPlaces(draftId, symptom, next);
          return next;
        });
    },
    [draftId, symptom],
  );

  const connect = useCallback(
    ({ source, sourceHandle, target }: Connection) => {
      const made = linkBetween(source, sourceHandle ?? null, target, symptom);
      if (!made) return;
      const { tree } = bench.session.get();
      const cause = tree.causes.find(({ key }) => key === made.cause);
      if (cause && linkStrength(cause, made.link) === null)
        bench.edit(setLink(tree, made.cause, made.link, "gives" in made.link ? "x20" : "often"), "Linked");
      setChosenLink(linkId(source, sourceHandle ?? null, target));
    },
    [bench, symptom],
  );

  const removeChosen = () => {
    const link = chosenLink === null ? null : linkOfId(chosenLink, symptom);
    const { tree } = bench.session.get();
    if (link) {
      bench.edit(setLink(tree, link.cause, link.link, null), "Link taken out");
      return setChosenLink(null);
    }
    let without = tree;
    const chosen = nodes.filter(({ selected }) => selected).map(({ id }) => refOf(id, symptom));
    for (const { list, key } of chosen) {
      const removed = removeNode(without, list, key);
      if ("refused" in removed) return bench.refused.set(removed.refused);
      without = removed.tree;
    }
    bench.edit(without, chosen.length === 1 ? `${chosen[0]?.key ?? ""} taken out` : `${chosen.length} nodes taken out`);
    onOpen(null);
  };
  const copyChosen = () => {
    const keys = new Set(nodes.filter(({ selected }) => selected).map(({ id }) => refOf(id, symptom).key));
    clipboard.current = copyNodes(bench.session.get().tree, keys);
    return keys.size;
  };
  const paste = () => {
    if (!clipboard.current) return;
    const pasted = pasteNodes(bench.session.get().tree, clipboard.current);
    bench.edit(pasted.tree, `${pasted.keys.length} pasted`);
  };

  return (
    <div
      className="tree-map relative min-h-96 flex-1 overflow-hidden rounded-xl border border-rule bg-paper text-sm leading-[22px]"
      onKeyDown={(event) => {
        if (isTyping(event.target)) return;
        const key = event.key.toLowerCase();
        if (key === "delete" || key === "backspace") removeChosen();
        else if ((event.ctrlKey || event.metaKey) && key === "c") copyChosen();
        else if ((event.ctrlKey || event.metaKey) && key === "v") paste();
        else if ((event.ctrlKey || event.metaKey) && key === "d") {
          if (copyChosen() > 0) paste();
        } else return;
        event.preventDefault();
        event.stopPropagation();
      }}
    >
      <ReactFlow
        nodes={nodes}
        edges={edges}
        nodeTypes={nodeTypes}
        onNodesChange={onNodesChange}
        onConnect={connect}
        onNodeClick={(_, { id }) => {
          setChosenLink(null);
          onOpen(refOf(id, symptom));
        }}
        onEdgeClick={(_, { id }) => setChosenLink(id)}
        onPaneClick={() => setChosenLink(null)}
        defaultViewport={{ x: 0, y: 0, zoom: 0.9 }}
        minZoom={0.05}
        maxZoom={2}
        onlyRenderVisibleElements
        selectionOnDrag={false}
        deleteKeyCode={null}
        multiSelectionKeyCode={["Shift", "Control", "Meta"]}
        ariaLabelConfig={{
          "controls.zoomIn.ariaLabel": "Nearer",
          "controls.zoomOut.ariaLabel": "Farther",
          "controls.fitView.ariaLabel": "Show all",
        }}
      >
        <Lanes places={places} />
        <Controls showInteractive={false} />
      </ReactFlow>
      {chosenLink !== null && <LinkPicker bench={bench} symptom={symptom} id={chosenLink} onClose={() => setChosenLink(null)} />}
    </div>
  );
}

function refOf(id: string, symptom: string): { list: ListName; key: string } {
  const [kind = "", key = symptom] = id.split(":");
  return { list: LIST_OF[kind] ?? "symptoms", key };
}

function idOf({ list, key }: { list: ListName; key: string }, symptom: string): string | null {
  if (list === "symptoms") return key === symptom ? "symptom" : null;
  const kind = Object.entries(LIST_OF).find(([, of]) => of === list)?.[0];
  return kind ? `${kind}:${key}` : null;
}
