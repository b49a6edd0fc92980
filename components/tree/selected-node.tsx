"use client";

import { useEffect, useRef } from "react";
import { CausePanel, CheckPanel, RemedyPanel, SymptomPanel } from "./node-panel";
import type { TreePart } from "./tree-part";

/** What the node chosen in the picture says, read only; each choice starts at the top of it. */
export function SelectedNode({ id, part }: { id: string; part: TreePart }) {
  const top = useRef<HTMLDivElement>(null);
  useEffect(() => {
    top.current?.parentElement?.scrollTo({ top: 0 });
  }, [id]);
  const node = nodeOf(id, part);
  if (!node) return null;
  return (
    <div ref={top} aria-live="polite">
      <p className="text-sm text-ink-2">{node.kind}</p>
      <h2>{node.title}</h2>
      <NodeBody id={id} part={part} />
    </div>
  );
}

/** Everything under a node's title. */
export function NodeBody({ id, part }: { id: string; part: TreePart }) {
  const node = nodeOf(id, part);
  if (!node) return null;
  if (node.kind === "Check") return <CheckPanel node={node.of} part={part} />;
  if (node.kind === "Cause") return <CausePanel node={node.of} part={part} />;
  if (node.kind === "Remedy") return <RemedyPanel node={node.of} part={part} />;
  return <SymptomPanel node={node.of} part={part} />;
}

/** The node of an id as the picture gives it: "symptom", "check:key", "cause:key", "remedy:key". */
export function nodeOf(id: string, { graph }: TreePart) {
  const [kind, key] = id.split(":");
  const check = kind === "check" ? graph.checks.find((c) => c.key === key) : undefined;
  const cause = kind === "cause" ? graph.causes.find((c) => c.key === key) : undefined;
  const remedy = kind === "remedy" ? graph.remedies.find((r) => r.key === key) : undefined;
  if (check) return { kind: "Check", title: check.title, of: check } as const;
  if (cause) return { kind: "Cause", title: cause.title, of: cause } as const;
  if (remedy) return { kind: "Remedy", title: remedy.title, of: remedy } as const;
  return id === "symptom" ? ({ kind: "Symptom", title: graph.symptom.title, of: graph.symptom } as const) : null;
}
