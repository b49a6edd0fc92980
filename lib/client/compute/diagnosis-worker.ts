import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { view } from "@/lib/core/diagnosis/show";
import { whatIf } from "@/lib/core/diagnosis/what-if";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Ask, Told } from "./protocol";

/** The diagnosis core off the screen's thread: a tap is drawn at once, whatever the next step costs to find. */
const trees = new Map<string, FaultTree>();
const models = keepModels();
const tell = (told: Told): void => self.postMessage(told);

self.onmessage = ({ data }: MessageEvent<Ask>) => {
  if (data.ask === "keep-tree") {
    trees.set(data.version, data.tree);
    return;
  }
  const tree = trees.get(data.version);
  if (!tree) return tell({ id: data.id, failure: "the tree is not on this phone" });
  try {
    if (data.ask === "what-if") tell({ id: data.id, whatIf: whatIf(tree, data.events, models) });
    else tell({ id: data.id, view: view(tree, data.events, models) });
  } catch (failure) {
    tell({ id: data.id, failure: failure instanceof Error ? failure.message : String(failure) });
  }
};
