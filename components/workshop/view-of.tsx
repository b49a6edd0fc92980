"use client";

import type { Workbench } from "@/lib/client/workshop/workbench";
import type { FaultTree } from "@/lib/core/tree/schema";
import { GraphView } from "./graph/graph-view";
import type { Place, View } from "./place";
import { TableView } from "./table/table-view";
import type { Checked } from "./use-checked";

export type ViewProps = {
  fleetId: string;
  bench: Workbench;
  tree: FaultTree;
  symptom: string;
  node: Place["node"];
  checked: Checked;
  onOpen: (node: Place["node"]) => void;
};

/** The draft in the way that was chosen. */
export function ViewOf({ view, ...props }: ViewProps & { view: View }) {
  switch (view) {
    case "table":
      return <TableView {...props} />;
    default:
      return <GraphView {...props} />;
  }
}
