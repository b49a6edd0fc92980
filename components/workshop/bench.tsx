"use client";

import { useCallback, useDeferredValue } from "react";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import type { TreeNode } from "@/lib/core/tree/edits/edit";
import { putNode } from "@/lib/core/tree/edits/put-node";
import { Collisions } from "./collisions";
import { FindNode } from "./find-node";
import { GraphView } from "./graph/graph-view";
import { Head } from "./head";
import { NodeSheet } from "./node-sheet";
import { usePlace, type Place } from "./place";
import { SoundBar } from "./sound-bar";
import { SymptomList } from "./symptom-list";
import { useChecked } from "./use-checked";
import { useUndoKeys } from "./use-undo-keys";

type Props = {
  fleetId: string;
  bench: Workbench;
  current: TreeVersionInfo;
  newestShipped: TreeVersionInfo | null;
  /** The draft this bench worked on is no more. */
  onGone: () => void;
};

/** Everything round the draft that is open: what is edited, what it is edited with, and what is wrong with it. */
export function Bench({ fleetId, bench, current, newestShipped, onGone }: Props) {
  const session = useObservable(bench.session);
  const [place, go] = usePlace();
  const { tree } = session;
  const checked = useChecked(useDeferredValue(tree));
  useUndoKeys(bench);
  const symptom = place.symptom ?? tree.symptoms[0]?.key ?? "";
  const openNode = useCallback((node: Place["node"]) => go({ node }), [go]);
  const change = useCallback(
    (list: NonNullable<Place["node"]>["list"]) => (node: TreeNode, says: string) =>
      bench.edit(putNode(bench.session.get().tree, list, node), says),
    [bench],
  );
  return (
    <div className="grid gap-3">
      <Head
        fleetId={fleetId}
        bench={bench}
        current={current}
        newestShipped={newestShipped}
        place={place}
        go={go}
        checked={checked}
        onGone={onGone}
      />
      <Collisions bench={bench} />
      <div className="grid gap-4 lg:grid-cols-[15rem_minmax(0,1fr)_24rem]">
        <aside className="no-print grid content-start gap-3" aria-label="Find and choose">
          <FindNode tree={tree} onOpen={openNode} />
          <SymptomList tree={tree} here={symptom} onChoose={(key) => go({ symptom: key, node: null })} />
        </aside>
        <section aria-label="The tree" className="min-w-0">
          <GraphView bench={bench} tree={tree} symptom={symptom} node={place.node} onOpen={openNode} />
          <SoundBar checked={checked} onOpen={openNode} />
        </section>
        <NodeSheet bench={bench} tree={tree} node={place.node} symptom={symptom} onChange={change} onOpen={openNode} />
      </div>
    </div>
  );
}
