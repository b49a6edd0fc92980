import ELK from "elkjs/lib/elk-api";
import type { TreeGraph } from "./tree-graph";

/** The four ruled lanes, left to right: where each begins and how wide its nodes are. */
export const LANES = {
  symptom: { x: 24, width: 180 },
  check: { x: 260, width: 250 },
  cause: { x: 620, width: 220 },
  remedy: { x: 950, width: 220 },
} as const;

const LINE = 22;
const CHARACTERS_A_LINE = { symptom: 18, check: 27, finding: 31, cause: 23, remedy: 22 } as const;

const linesOf = (text: string, kind: keyof typeof CHARACTERS_A_LINE) => Math.max(1, Math.ceil(text.length / CHARACTERS_A_LINE[kind]));
const rowHeight = (title: string) => linesOf(title, "finding") * LINE + 8;

/** Heights are reckoned from the text, so that nothing has to be measured before it is laid out. */
export const heightOf = {
  symptom: (title: string) => linesOf(title, "symptom") * LINE + 26,
  checkHead: (title: string) => linesOf(title, "check") * LINE + 16,
  findingRow: rowHeight,
  check: (check: TreeGraph["checks"][number]) =>
    heightOf.checkHead(check.title) + check.findings.reduce((sum, f) => sum + rowHeight(f.title), 0),
  cause: (title: string) => linesOf(title, "cause") * LINE + LINE + 22,
  remedy: (title: string) => linesOf(title, "remedy") * LINE + 22,
};

export type Places = ReadonlyMap<string, { x: number; y: number; height: number }>;

/**
 * Orders each lane so that links cross little (ELK's layered layout, in a worker), then stands the lanes where they belong.
 * Throws when the worker cannot be started.
 */
export async function placesOf(graph: TreeGraph): Promise<Places> {
  const elk = new ELK({ workerFactory: () => new Worker(new URL("elkjs/lib/elk-worker.min.js", import.meta.url)) });
  try {
    const node = (id: string, lane: keyof typeof LANES, height: number, partition: number) => ({
      id,
      width: LANES[lane].width,
      height,
      layoutOptions: { "elk.partitioning.partition": String(partition) },
    });
    const out = await elk.layout({
      id: "tree",
      layoutOptions: {
        "elk.algorithm": "layered",
        "elk.direction": "RIGHT",
        "elk.partitioning.activate": "true",
        "elk.spacing.nodeNode": "18",
        "elk.layered.spacing.nodeNodeBetweenLayers": "110",
        "elk.separateConnectedComponents": "false",
      },
      children: [
        node("symptom", "symptom", heightOf.symptom(graph.symptom.title), 0),
        ...graph.checks.map((c) => node(`check:${c.key}`, "check", heightOf.check(c), 1)),
        ...graph.causes.map((c) => node(`cause:${c.key}`, "cause", heightOf.cause(c.title), 2)),
        ...graph.remedies.map((r) => node(`remedy:${r.key}`, "remedy", heightOf.remedy(r.title), 3)),
      ],
      edges: [
        ...graph.tells.map((t) => ({
          id: `${t.check}/${t.finding}/${t.cause}`,
          sources: [`check:${t.check}`],
          targets: [`cause:${t.cause}`],
        })),
        ...graph.cures.map((c) => ({ id: `${c.cause}/${c.remedy}`, sources: [`cause:${c.cause}`], targets: [`remedy:${c.remedy}`] })),
      ],
    });
    const lane = (id: string) => LANES[id === "symptom" ? "symptom" : (id.split(":")[0] as "check" | "cause" | "remedy")];
    const top = Math.min(...(out.children ?? []).map((c) => c.y ?? 0));
    return new Map((out.children ?? []).map((c) => [c.id, { x: lane(c.id).x, y: (c.y ?? 0) - top + 48, height: c.height ?? 0 }]));
  } finally {
    elk.terminateWorker();
  }
}
