"use client";

import type { ReactNode } from "react";
import { useHere } from "./here";

/** What was just answered, with a way back from it. It asks nothing. */
export function UndoBar() {
  const { undo, setUndo, record, view, events, go } = useHere();
  if (!undo) return null;
  if ("look" in undo) return <Bar says={undo.says} does="Look at them" onTap={() => go(undo.look)} />;
  const withdrawn = undo.withdraws ? view.symptoms.find(({ key, present }) => key === undo.withdraws && present) : undefined;
  /** What it took the place of stands again; else it is as if it had not been said. */
  const takeBack = () => {
    setUndo(null);
    const said = events.find(({ event }) => event.id === undo.event)?.event;
    const before = events.find(({ event }) => event.id === said?.supersedes)?.event;
    if (before) void record(before.kind, before.payload, undo.event);
    else void record("taken-back", { event: undo.event });
  };
  return (
    <Bar says={undo.says} does="Undo" onTap={takeBack}>
      {withdrawn && (
        <p className="pb-1">
          This speaks against &ldquo;{withdrawn.title}&rdquo;.{" "}
          <button
            type="button"
            className="link min-h-12"
            onClick={() => {
              setUndo({ ...undo, withdraws: null });
              void record("symptom-told", { symptom: withdrawn.key, present: false });
            }}
          >
            Take that symptom back
          </button>
        </p>
      )}
    </Bar>
  );
}

function Bar({ says, does, onTap, children }: { says: string; does: string; onTap: () => void; children?: ReactNode }) {
  return (
    <div role="status" className="mb-4 rounded-lg border border-rule bg-sheet px-3 py-1 text-sm">
      <div className="flex items-center justify-between gap-x-3">
        <span>{says}</span>
        <button type="button" className="link min-h-12 min-w-12 flex-none font-semibold" onClick={onTap}>
          {does}
        </button>
      </div>
      {children}
    </div>
  );
}
