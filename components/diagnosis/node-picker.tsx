"use client";

import { useMemo, useState } from "react";
import { titleFinder } from "@/lib/client/find-titles";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Fold } from "@/components/ui/fold";
import { TextField } from "@/components/ui/text-field";
import { BigRow } from "./big-row";

type Node = { key: string; title: string; system: string };

/** Finds a check or a remedy by a word of its title; by system where nothing is typed. */
export function NodePicker({
  id,
  label,
  tree,
  nodes,
  onPick,
}: {
  id: string;
  label: string;
  tree: FaultTree;
  nodes: readonly Node[];
  onPick: (key: string) => void;
}) {
  const [typed, setTyped] = useState("");
  const find = useMemo(() => titleFinder(nodes), [nodes]);
  const found = useMemo(() => {
    const words = typed.toLowerCase().split(/\s+/).filter(Boolean);
    const exact = nodes.filter(({ title }) => words.every((word) => title.toLowerCase().includes(word)));
    return exact.length > 0 ? exact : find(typed);
  }, [nodes, typed, find]);
  return (
    <div className="grid gap-4">
      <TextField id={id} label={label} value={typed} autoComplete="off" onChange={(event) => setTyped(event.target.value)} />
      <p role="status" className="visually-hidden">
        {found.length} found
      </p>
      {tree.systems.map((system) => {
        const here = found.filter((node) => node.system === system.key);
        if (here.length === 0) return null;
        const rows = here.map((node) => <BigRow key={node.key} title={node.title} onTap={() => onPick(node.key)} />);
        return typed.trim() !== "" ? (
          <section key={system.key} aria-label={system.title} className="grid gap-2">
            <h2 className="text-base text-ink-2">{system.title}</h2>
            {rows}
          </section>
        ) : (
          <Fold key={system.key} title={`${system.title} (${here.length})`}>
            <div className="grid gap-2">{rows}</div>
          </Fold>
        );
      })}
      {found.length === 0 && <p>Nothing has these words in its title. Try one word of it.</p>}
    </div>
  );
}
