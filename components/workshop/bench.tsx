"use client";

import { clsx } from "clsx";
import { useCallback, useDeferredValue } from "react";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { findNode, type TreeNode } from "@/lib/core/tree/edits/edit";
import { putNode } from "@/lib/core/tree/edits/put-node";
import type { ListName } from "@/lib/core/tree/flaw";
import { FindNode } from "./find-node";
import { Head } from "./head";
import { NodeSheet } from "./node-sheet";
import { Notices } from "./notices";
import { symptomToShow } from "./symptom-to-show";
import { usePlace, type Place } from "./place";
import { SoundBar } from "./sound-bar";
import { SymptomList } from "./symptom-list";
import { useChecked } from "./use-checked";
import { useUndoKeys } from "./use-undo-keys";
import { ViewOf } from "./view-of";

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
  const { tree } = useObservable(bench.session);
  const [place, go] = usePlace();
  const checked = useChecked(useDeferredValue(tree));
  useUndoKeys(bench);
  const symptom = place.symptom ?? tree.symptoms[0]?.key ?? "";
  const openNode = useCallback(
    (node: Place["node"]) => {
      const elsewhere = node === null ? null : symptomToShow(bench.session.get().tree, node, symptom);
      go(elsewhere === null ? { node } : { node, symptom: elsewhere });
    },
    [go, bench, symptom],
  );
  const change = useCallback(
    (list: ListName) => (node: TreeNode, says: string) => {
      const { tree } = bench.session.get();
      // A form that closes because its node was taken out does not put it back.
      if (findNode(tree, list, node.key) !== null) bench.edit(putNode(tree, list, node), says);
    },
    [bench],
  );
  return (
    <div className="flex min-h-dvh flex-col lg:h-dvh">
      <Head fleetId={fleetId} bench={bench} current={current} place={place} go={go} checked={checked} />
      <Notices fleetId={fleetId} bench={bench} newestShipped={newestShipped} onGone={onGone} />
      <div
        className={clsx(
          "grid min-h-0 flex-1",
          place.node ? "lg:grid-cols-[15rem_minmax(0,1fr)_24rem]" : "lg:grid-cols-[15rem_minmax(0,1fr)]",
        )}
      >
        <aside className="no-print flex min-h-0 flex-col gap-2 border-r border-rule bg-sheet p-3" aria-label="Find and choose">
          <FindNode tree={tree} onOpen={openNode} />
          <SymptomList tree={tree} here={symptom} onChoose={(key) => go({ symptom: key, node: null })} />
        </aside>
        <main id="main" className="flex min-h-0 min-w-0 flex-col gap-3 overflow-y-auto p-3">
          <ViewOf
            view={place.view}
            fleetId={fleetId}
            bench={bench}
            tree={tree}
            symptom={symptom}
            node={place.node}
            currentId={current.id}
            onOpen={openNode}
          />
          <SoundBar checked={checked} onOpen={openNode} />
        </main>
        {place.node && <NodeSheet bench={bench} tree={tree} node={place.node} onChange={change} onOpen={openNode} />}
      </div>
    </div>
  );
}
