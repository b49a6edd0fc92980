"use client";

import { Copy, Trash2, X } from "lucide-react";
import { useEffect, useMemo, useRef } from "react";
import { Button } from "@/components/ui/button";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { findNode, nameOf, type TreeNode } from "@/lib/core/tree/edits/edit";
import { duplicateNode } from "@/lib/core/tree/edits/put-node";
import { removeNode } from "@/lib/core/tree/edits/remove-node";
import { LIST_KINDS, type ListName } from "@/lib/core/tree/flaw";
import type { FaultTree } from "@/lib/core/tree/schema";
import { NodeForm } from "./node-form";
import { NodeLinks } from "./node-links";
import type { Place } from "./place";

type Props = {
  bench: Workbench;
  tree: FaultTree;
  node: NonNullable<Place["node"]>;
  onChange: (list: ListName) => (node: TreeNode, says: string) => void;
  onOpen: (node: Place["node"]) => void;
};

/** The chosen node at the side: every field of it, and what leads to it. */
export function NodeSheet({ bench, tree, node: open, onChange, onOpen }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  const node = open === null ? null : findNode(tree, open.list, open.key);
  const list = open?.list;
  const key = open?.key;
  useEffect(() => {
    if (key !== undefined) heading.current?.focus({ preventScroll: true });
  }, [list, key]);
  const change = useMemo(() => (list === undefined ? null : onChange(list)), [onChange, list]);
  if (open === null || node === null || change === null)
    return (
      <aside aria-label="The chosen node" className="rounded-xl border border-rule p-4 text-ink-2">
        {open === null
          ? "Choose a node in the picture, or find one by its name, to change it here."
          : "This node is no longer in the draft."}
      </aside>
    );
  const name = nameOf(node);
  const takeOut = () => {
    const removed = removeNode(tree, open.list, open.key);
    if ("refused" in removed) return bench.refused.set(removed.refused);
    bench.edit(removed.tree, `“${name}” taken out`);
    onOpen(null);
  };
  const duplicate = () => {
    const copy = duplicateNode(tree, open.list, open.key);
    if (!copy) return;
    bench.edit(copy.tree, `“${name}” duplicated`);
    onOpen({ list: open.list, key: copy.key });
  };
  return (
    <aside aria-label="The chosen node" tabIndex={0} className="min-h-0 overflow-y-auto border-l border-rule bg-sheet p-4">
      <button
        type="button"
        aria-label="Close"
        onClick={() => onOpen(null)}
        className="float-right inline-flex min-h-12 min-w-12 items-center justify-center rounded-lg border-[1.5px] border-edge bg-sheet"
      >
        <X aria-hidden size={22} />
      </button>
      <p className="text-sm text-ink-2 first-letter:uppercase">{LIST_KINDS[open.list]}</p>
      <h2 ref={heading} tabIndex={-1}>
        {name}
      </h2>
      <div className="my-3 flex flex-wrap gap-2">
        <Button onClick={duplicate}>
          <Copy aria-hidden size={18} /> Duplicate
        </Button>
        <Button tone="grave" onClick={takeOut}>
          <Trash2 aria-hidden size={18} /> Take out
        </Button>
      </div>
      <NodeLinks tree={tree} list={open.list} node={node} onOpen={onOpen} />
      <NodeForm
        key={`${open.list}:${open.key}`}
        tree={tree}
        list={open.list}
        node={node}
        draftId={bench.session.get().saved.id}
        onChange={change}
      />
    </aside>
  );
}
