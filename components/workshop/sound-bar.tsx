"use client";

import { useState } from "react";
import type { Flaw } from "@/lib/core/tree/flaw";
import { listOf } from "@/lib/core/tree/edits/edit";
import type { Place } from "./place";
import type { Checked } from "./use-checked";

type Props = { checked: Checked; onOpen: (node: Place["node"]) => void };

const MOST = 100;

/** How sound the draft is, in a line; the list of what is wrong leads to each node. */
export function SoundBar({ checked: { flaws, proved }, onOpen }: Props) {
  const [open, setOpen] = useState(false);
  const errors = flaws?.filter(({ severity }) => severity === "error") ?? [];
  const lookAts = flaws?.filter(({ severity }) => severity === "look-at") ?? [];
  return (
    <div className="mt-3 rounded-xl border border-rule bg-sheet px-4 py-2">
      <button
        type="button"
        aria-expanded={open}
        onClick={() => setOpen(!open)}
        className="flex min-h-12 w-full flex-wrap items-center gap-x-5 gap-y-1 text-left text-sm"
        disabled={flaws === null}
      >
        {flaws === null ? (
          <span role="status">Looking it over…</span>
        ) : (
          <>
            <span className={errors.length === 0 ? "font-semibold text-sound" : "font-semibold text-lead"}>
              {errors.length === 0 ? "Sound: 0 errors" : errors.length === 1 ? "1 error" : `${errors.length} errors`}
            </span>
            <span className={lookAts.length > 0 ? "font-semibold text-buoy" : ""}>{lookAts.length} to look at</span>
          </>
        )}
        <span>
          {proved ? `Proved on ${proved.cases - proved.failing.length} of ${proved.cases} known cases` : "Replaying the known cases…"}
        </span>
      </button>
      {open && (
        <ul className="grid max-h-80 gap-1 overflow-y-auto pb-2 text-sm">
          {[...errors, ...lookAts].slice(0, MOST).map((flaw, index) => (
            <FlawLine key={index} flaw={flaw} onOpen={onOpen} />
          ))}
          {(flaws?.length ?? 0) > MOST && <li>And {(flaws?.length ?? 0) - MOST} more.</li>}
          {proved?.failing.map((key) => (
            <li key={key}>
              <button type="button" className="link min-h-10 text-left" onClick={() => onOpen({ list: "knownCases", key })}>
                Known case {key}: its cause is not among the first three
              </button>
            </li>
          ))}
          {flaws?.length === 0 && proved?.failing.length === 0 && <li>Nothing is wrong with it.</li>}
        </ul>
      )}
    </div>
  );
}

function FlawLine({ flaw: { node, says, mend, severity }, onOpen }: { flaw: Flaw; onOpen: (node: Place["node"]) => void }) {
  const list = listOf(node.kind);
  const words = (
    <>
      <b className={severity === "error" ? "font-semibold text-lead" : "font-semibold text-buoy"}>
        {severity === "error" ? "Error" : "Look at"}
      </b>{" "}
      {node.kind} {node.key}: {says} {mend && <span className="text-ink-2">{mend}</span>}
    </>
  );
  return (
    <li>
      {list === null ? (
        <p>{words}</p>
      ) : (
        <button
          type="button"
          className="min-h-10 text-left underline decoration-rule underline-offset-4"
          onClick={() => onOpen({ list, key: node.key })}
        >
          {words}
        </button>
      )}
    </li>
  );
}
