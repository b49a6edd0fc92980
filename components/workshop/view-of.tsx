"use client";

import type { Workbench } from "@/lib/client/workshop/workbench";
import type { FaultTree } from "@/lib/core/tree/schema";
import { GraphView } from "./graph/graph-view";
import type { Place, View } from "./place";
import { TableView } from "./table/table-view";
import { LearnView } from "./learn/learn-view";
import { ProveView } from "./prove/prove-view";
import { TryView } from "./try/try-view";

export type ViewProps = {
  fleetId: string;
  bench: Workbench;
  tree: FaultTree;
  symptom: string;
  node: Place["node"];
  currentId: string;
  onOpen: (node: Place["node"]) => void;
};

/** The draft in the way that was chosen. */
export function ViewOf({ view, ...props }: ViewProps & { view: View }) {
  switch (view) {
    case "table":
      return <TableView {...props} />;
    case "try":
      return <TryView key={props.symptom} {...props} />;
    case "prove":
      return <ProveView {...props} />;
    case "learn":
      return <LearnView {...props} />;
    case "graph":
      return <GraphView {...props} />;
  }
}
