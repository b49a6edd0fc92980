import type { FaultTree } from "../tree/schema";
import { compile } from "./compile";
import type { Model, Setting } from "./model";

export type Compile = (tree: FaultTree, setting: Setting) => Model;

/**
 * A compile() that remembers its last models, for whoever asks again and again
 * (a phone, a bench). It lives as long as its owner keeps it; nothing is global.
 *
 * @param most how many models to keep.
 */
export function keepModels(most = 4): Compile {
  const kept: { tree: FaultTree; setting: string; model: Model }[] = [];
  return (tree, setting) => {
    const asked = JSON.stringify(setting);
    const found = kept.find((one) => one.tree === tree && one.setting === asked);
    if (found) return found.model;
    const model = compile(tree, setting);
    kept.unshift({ tree, setting: asked, model });
    kept.length = Math.min(kept.length, most);
    return model;
  };
}
