import { createContext, useContext, type ComponentType } from "react";
import type { TreeNode } from "@/lib/core/tree/edits/edit";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Shape } from "./shape";

/** The node that is edited, as it stands in the form, and the tree round it: what its fields may name. */
export const Edited = createContext<{ tree: FaultTree; node: Partial<TreeNode> } | null>(null);

export function useEdited(): { tree: FaultTree; node: Partial<TreeNode> } {
  const edited = useContext(Edited);
  if (!edited) throw new Error("a field of a node is edited outside a tree");
  return edited;
}

export const useEditedTree = (): FaultTree => useEdited().tree;

/** What every editor of a value takes. undefined: the field is left out. */
export type Editing<T = unknown> = {
  /** The field's name in the document; its label and what it may name follow from it. */
  name: string;
  /** Where in the node it stands: makes ids, and finds its error. */
  path: string;
  value: T | undefined;
  onChange: (value: T | undefined) => void;
  /** The label is said by what stands round it. */
  bare?: boolean;
};

/** The editor of a field by its shape: handed to lists and groups, which hold fields in their turn. */
export type FieldEditor = ComponentType<Editing & { shape: Shape; must: boolean }>;
