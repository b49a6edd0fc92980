"use client";

import { Plus } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Segmented } from "@/components/ui/segmented";
import { TextField } from "@/components/ui/text-field";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { Place } from "../place";
import { withNew, type Addable } from "./new-nodes";

type Props = { bench: Workbench; tree: FaultTree; symptom: string; onOpen: (node: Place["node"]) => void };

const KINDS: readonly { value: Addable; title: string }[] = [
  { value: "causes", title: "Cause" },
  { value: "checks", title: "Check" },
  { value: "remedies", title: "Remedy" },
  { value: "symptoms", title: "Symptom" },
];

/** A new node by its name; everything else about it is filled in at the side. */
export function AddNode({ bench, tree, symptom, onOpen }: Props) {
  const [open, setOpen] = useState(false);
  const [list, setList] = useState<Addable>("causes");
  const [title, setTitle] = useState("");
  const name = title.trim();
  const add = () => {
    if (name === "") return;
    const made = withNew(tree, list, name, symptom);
    bench.edit(made.tree, `“${name}” added`);
    setOpen(false);
    setTitle("");
    onOpen({ list, key: made.key });
  };
  return (
    <>
      <Button onClick={() => setOpen(true)}>
        <Plus aria-hidden size={18} /> Add
      </Button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Add to the tree">
        <form
          className="grid gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            add();
          }}
        >
          <Segmented name="new-kind" legend="What is it?" options={KINDS} value={list} onChange={setList} />
          <TextField
            id="new-title"
            label="What is it called?"
            hint="Short and plain, as one says it aloud."
            maxLength={200}
            value={title}
            onChange={(event) => setTitle(event.target.value)}
          />
          {list === "causes" && <p className="text-sm text-ink-2">It is hung on the symptom that is drawn now, as shown “often”.</p>}
          <div>
            <Button type="submit" tone="strong" disabled={name === ""}>
              Add it
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
