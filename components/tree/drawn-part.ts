import type { Check, Finding } from "@/lib/core/tree/schema";
import type { TreeGraph } from "./tree-graph";

/** More links than these to one cause are a thicket; the list has them all. */
const LINKS_A_CAUSE = 4;

export type DrawnCheck = {
  check: Check;
  /** The findings that a drawn link starts from. */
  findings: readonly Finding[];
  /** How many of its findings are not drawn. */
  folded: number;
};

/** What of a symptom's part goes into the picture: for each cause the findings that tell most. */
export type DrawnPart = Pick<TreeGraph, "symptom" | "causes" | "remedies" | "cures" | "tells"> & { checks: readonly DrawnCheck[] };

export function drawnPart(graph: TreeGraph): DrawnPart {
  const tells = graph.causes.flatMap((cause) =>
    graph.tells
      .filter((tell) => tell.cause === cause.key)
      .sort((a, b) => b.ratio - a.ratio)
      .slice(0, LINKS_A_CAUSE),
  );
  const told = new Set(tells.map((tell) => `${tell.check}/${tell.finding}`));
  const checks = graph.checks.flatMap((check) => {
    const findings = check.findings.filter((finding) => told.has(`${check.key}/${finding.key}`));
    return findings.length > 0 ? [{ check, findings, folded: check.findings.length - findings.length }] : [];
  });
  const { symptom, causes, remedies, cures } = graph;
  return { symptom, causes, remedies, cures, tells, checks };
}
