"use client";

import { useDeferredValue, useMemo, useState } from "react";
import { TextField } from "@/components/ui/text-field";
import { titleFinder } from "@/lib/client/find-titles";
import { LIST_KINDS, type ListName } from "@/lib/core/tree/flaw";
import { nameOf, type TreeNode } from "@/lib/core/tree/edits/edit";
import type { FaultTree } from "@/lib/core/tree/schema";

type Props = { tree: FaultTree; onOpen: (node: { list: ListName; key: string }) => void };

/** Any node by a word of its name, misspelt or not. Enter opens the nearest. */
export function FindNode({ tree, onOpen }: Props) {
  const [typed, setTyped] = useState("");
  const asked = useDeferredValue(typed);
  const find = useMemo(() => titleFinder(allNodes(tree)), [tree]);
  const hits = useMemo(() => find(asked), [find, asked]);
  const open = (hit: Found) => {
    setTyped("");
    onOpen({ list: hit.list, key: hit.node.key });
  };
  return (
    <form
      role="search"
      onSubmit={(event) => {
        event.preventDefault();
        if (hits[0]) open(hits[0]);
      }}
    >
      <TextField
        id="find-node"
        label={<span className="visually-hidden">Find a node by its name</span>}
        placeholder="Find a symptom, check, cause…"
        type="search"
        autoComplete="off"
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
      />
      <ul aria-live="polite" className="grid gap-0.5 pt-1">
        {hits.map((hit) => (
          <li key={hit.key}>
            <button
              type="button"
              onClick={() => open(hit)}
              className="min-h-12 w-full rounded-lg px-2 py-1 text-left text-sm hover:bg-shoal"
            >
              {hit.title} <span className="text-ink-2">{LIST_KINDS[hit.list]}</span>
            </button>
          </li>
        ))}
        {asked.trim().length > 1 && hits.length === 0 && <li className="px-2 text-sm text-ink-2">Nothing in this tree has such a name.</li>}
      </ul>
    </form>
  );
}

type Found = { key: string; title: string; list: ListName; node: TreeNode };

function allNodes(tree: FaultTree): Found[] {
  return (Object.keys(LIST_KINDS) as ListName[]).flatMap((list) =>
    (tree[list] as readonly TreeNode[]).map((node) => ({
      key: `${list}:${node.key}`,
      title: list === "cautions" && "says" in node ? String(node.says) : nameOf(node),
      list,
      node,
    })),
  );
}
