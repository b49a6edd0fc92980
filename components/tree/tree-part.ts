import { cautionsOf, safetyOf, type StepCaution } from "@/lib/core/tree/safety-steps";
import type { FaultTree } from "@/lib/core/tree/schema";
import { graphOf, type TreeGraph } from "./tree-graph";

/** What its flags write round a step's own list. */
export type StepSafety = { first: readonly string[]; last: readonly string[]; cautions: readonly StepCaution[] };

/** One symptom's part of a tree with all that its nodes speak of, so that the whole document need not be sent. */
export type TreePart = {
  graph: TreeGraph;
  /** By "check:key" and "remedy:key", for an engine of which nothing is known: the more dangerous case. */
  safety: Readonly<Record<string, StepSafety>>;
  /** Titles by "symptom:key", "cause:key", "check:key", "remedy:key" and "finding:check/finding". */
  titles: Readonly<Record<string, string>>;
  /** Titles of sources by key. */
  sources: Readonly<Record<string, string>>;
};

const NOTHING_KNOWN = { features: {} };

/** The likeliest `limit` causes of a symptom and what hangs on them; null for a symptom that the tree does not have. */
export function partOf(tree: FaultTree, symptom: string, limit: number): TreePart | null {
  const graph = graphOf(tree, symptom, limit);
  if (!graph) return null;
  const steps = [
    ...graph.checks.map((check) => [`check:${check.key}`, check] as const),
    ...graph.remedies.map((remedy) => [`remedy:${remedy.key}`, remedy] as const),
  ];
  const nodes = [graph.symptom, ...graph.checks, ...graph.causes, ...graph.remedies];
  const cited = new Set(nodes.flatMap((node) => node.sources.map(sourceKey)));
  return {
    graph,
    safety: Object.fromEntries(
      steps.map(([id, step]) => {
        const { first, last } = safetyOf(step, NOTHING_KNOWN);
        return [id, { first, last, cautions: cautionsOf(step, tree, NOTHING_KNOWN) }];
      }),
    ),
    titles: titlesFor(tree, graph),
    sources: Object.fromEntries(tree.sources.filter(({ key }) => cited.has(key)).map(({ key, title }) => [key, title])),
  };
}

/** "en2 p. 3-23" cites en2. */
export const sourceKey = (citation: string): string => citation.split(" ")[0] ?? citation;

function titlesFor(tree: FaultTree, graph: TreeGraph): Record<string, string> {
  const checks = new Set(graph.causes.flatMap((cause) => Object.keys(cause.gives)));
  const symptoms = new Set(graph.causes.flatMap((cause) => Object.keys(cause.shows)));
  const causes = new Set(graph.causes.flatMap((cause) => Object.keys(cause.broughtOnBy)));
  const remedies = new Set(graph.causes.flatMap((cause) => Object.keys(cause.curedBy)));
  const pick = (kind: string, of: readonly { key: string; title: string }[], wanted: ReadonlySet<string>) =>
    of.filter(({ key }) => wanted.has(key)).map(({ key, title }) => [`${kind}:${key}`, title]);
  return Object.fromEntries([
    ...pick("symptom", tree.symptoms, symptoms),
    ...pick("cause", tree.causes, causes),
    ...pick("remedy", tree.remedies, remedies),
    ...pick("check", tree.checks, checks),
    ...tree.checks
      .filter(({ key }) => checks.has(key))
      .flatMap((check) => check.findings.map((finding) => [`finding:${check.key}/${finding.key}`, finding.title])),
  ]);
}
