"use client";

import { useState, type ReactElement } from "react";
import { Dialog } from "@/components/ui/dialog";
import { ratioInFigures } from "./in-words";
import { NodeBody, nodeOf } from "./selected-node";
import type { TreePart } from "./tree-part";

/** The same as the picture, as a list: for a screen reader, a small phone and a printer. Each name opens what it says. */
export function TreeOutline({ part }: { part: TreePart }) {
  const { graph } = part;
  const [open, setOpen] = useState<string | null>(null);
  const node = open === null ? null : nodeOf(open, part);
  const named = (id: string, title: string) => (
    <button type="button" className="link inline-flex min-h-12 items-center text-left sm:min-h-8" onClick={() => setOpen(id)}>
      {title}
    </button>
  );
  const titleOf = (kind: "check" | "remedy", key: string) =>
    (kind === "check" ? graph.checks : graph.remedies).find((n) => n.key === key)?.title ?? key;
  const findingOf = (check: string, key: string) =>
    graph.checks.find((c) => c.key === check)?.findings.find((f) => f.key === key)?.title ?? key;
  return (
    <>
      <p className="text-sm text-ink-2">×14: the finding is seen 14 times as often with this cause as in a sound engine.</p>
      <ul className="grid gap-3">
        {graph.causes.map((cause) => (
          <li key={cause.key} className="break-inside-avoid rounded-lg border border-rule bg-sheet px-4 py-3">
            <h3>{named(`cause:${cause.key}`, cause.title)}</h3>
            <p className="text-sm text-ink-2">{cause.is}</p>
            <dl className="mt-2 grid gap-x-4 gap-y-1 text-sm sm:grid-cols-[9rem_1fr]">
              <dt className="text-ink-2">Told by</dt>
              <dd>
                <Strongest
                  lines={graph.tells
                    .filter((t) => t.cause === cause.key)
                    .sort((x, y) => y.ratio - x.ratio)
                    .map((t) => (
                      <span key={t.check + t.finding}>
                        {named(`check:${t.check}`, titleOf("check", t.check))}: {findingOf(t.check, t.finding)}{" "}
                        <span className="dial whitespace-nowrap">×{ratioInFigures(t.ratio)}</span>
                      </span>
                    ))}
                />
              </dd>
              <dt className="text-ink-2">Put right by</dt>
              <dd>
                <ul>
                  {graph.cures
                    .filter((c) => c.cause === cause.key)
                    .map((c) => (
                      <li key={c.remedy}>{named(`remedy:${c.remedy}`, titleOf("remedy", c.remedy))}</li>
                    ))}
                </ul>
              </dd>
              {cause.roots.length > 0 && (
                <>
                  <dt className="text-ink-2">Comes back through</dt>
                  <dd>{cause.roots.join("; ")}</dd>
                </>
              )}
            </dl>
          </li>
        ))}
      </ul>
      <Dialog open={node !== null} onClose={() => setOpen(null)} title={node?.title ?? ""}>
        {open !== null && <NodeBody id={open} part={part} />}
      </Dialog>
    </>
  );
}

const STRONGEST = 6;

/** The findings that tell most; the rest one tap away. */
function Strongest({ lines }: { lines: readonly ReactElement[] }) {
  const item = (line: ReactElement) => <li key={line.key}>{line}</li>;
  return (
    <>
      <ul>{lines.slice(0, STRONGEST).map(item)}</ul>
      {lines.length > STRONGEST && (
        <details>
          <summary className="link inline-flex min-h-12 items-center sm:min-h-8">{lines.length - STRONGEST} more</summary>
          <ul>{lines.slice(STRONGEST).map(item)}</ul>
        </details>
      )}
    </>
  );
}
