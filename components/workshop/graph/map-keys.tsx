"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";

const KEYS = [
  ["Tab", "to the next node or link"],
  ["Enter", "opens it"],
  ["Arrows", "move a chosen node"],
  ["Shift and click", "chooses several"],
  ["Delete", "takes out what is chosen"],
  ["Ctrl C, V, D", "copy, paste, duplicate"],
  ["Ctrl Z, Shift Ctrl Z", "undo, redo"],
] as const;

/** What the keyboard does in the picture. */
export function MapKeys() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button className="ml-auto" onClick={() => setOpen(true)}>
        Keys
      </Button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Keys in the picture">
        <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
          {KEYS.map(([key, does]) => (
            <div key={key} className="contents">
              <dt className="font-semibold">{key}</dt>
              <dd>{does}</dd>
            </div>
          ))}
        </dl>
      </Dialog>
    </>
  );
}
