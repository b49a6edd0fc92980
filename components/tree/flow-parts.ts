import { Position, type Edge, type Node } from "@xyflow/react";
import type { DrawnPart } from "./drawn-part";
import { heightOf, LANES, type Places } from "./tree-layout";

type Handles = NonNullable<Node["handles"]>;

/** Sizes and handles are given, so that nothing is measured and links to nodes outside the view are drawn. `edited`: they can be moved and linked. */
export function nodesOf(graph: DrawnPart, places: Places, edited = false): Node[] {
  const node = (id: string, type: keyof typeof LANES, data: Record<string, unknown>, handles: Handles): Node => {
    const { x, y, height } = places.get(id)!;
    const { width } = LANES[type];
    return {
      id,
      type,
      data,
      position: { x, y },
      width,
      height,
      measured: { width, height },
      handles,
      draggable: edited,
      connectable: edited,
    };
  };
  const left = (height: number): Handles[number] => ({ type: "target", position: Position.Left, x: 0, y: height / 2, width: 1, height: 1 });
  const right = (width: number, y: number, id?: string): Handles[number] => ({
    id,
    type: "source",
    position: Position.Right,
    x: width,
    y,
    width: 1,
    height: 1,
  });
  return [
    node("symptom", "symptom", { symptom: graph.symptom }, [right(LANES.symptom.width, heightOf.symptom(graph.symptom.title) / 2)]),
    ...graph.checks.map((drawn) => {
      let y = heightOf.checkHead(drawn.check.title);
      const handles = drawn.findings.map((f) => {
        const h = heightOf.findingRow(f.title);
        y += h;
        return right(LANES.check.width, y - h / 2, f.key);
      });
      return node(`check:${drawn.check.key}`, "check", { drawn }, handles);
    }),
    ...graph.causes.map((cause) => {
      const height = heightOf.cause(cause.title);
      const base = typeof cause.base === "number" ? `weight ${cause.base}` : cause.base;
      return node(`cause:${cause.key}`, "cause", { cause, base }, [left(height), right(LANES.cause.width, height / 2)]);
    }),
    ...graph.remedies.map((remedy) => node(`remedy:${remedy.key}`, "remedy", { remedy }, [left(heightOf.remedy(remedy.title))])),
  ];
}

/** Links, each as wide as it tells. */
export function edgesOf(graph: DrawnPart): Edge[] {
  return [
    ...graph.tells.map((t) => ({
      id: `${t.check}/${t.finding}/${t.cause}`,
      source: `check:${t.check}`,
      sourceHandle: t.finding,
      target: `cause:${t.cause}`,
      style: { stroke: "var(--fill)", strokeWidth: Math.min(5, 1 + Math.log2(t.ratio) / 1.4) },
    })),
    ...graph.cures.map((c) => ({
      id: `${c.cause}/${c.remedy}`,
      source: `cause:${c.cause}`,
      target: `remedy:${c.remedy}`,
      style: { stroke: "var(--sound)", strokeWidth: 1 + 2 * c.strength },
    })),
  ];
}
