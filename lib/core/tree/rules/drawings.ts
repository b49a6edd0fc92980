import { DRAWINGS, isDrawing } from "../drawings";
import { didYouMean } from "../nearest";
import type { FaultTree } from "../schema";
import { ruleNode, stepNode, stepsOf, type Found, type Rule } from "./rule";

const drawn = (tree: FaultTree): { node: Found["node"]; drawing: string | undefined }[] => [
  ...stepsOf(tree).map((node) => ({ node: stepNode(node), drawing: node.step.drawing })),
  ...tree.stopRules.map((rule) => ({ node: ruleNode(rule), drawing: rule.drawing })),
];

const unknownDrawings = (tree: FaultTree): Found[] =>
  drawn(tree).flatMap(({ node, drawing }) => {
    if (drawing === undefined || isDrawing(drawing)) return [];
    return [
      {
        node,
        says: `"drawing" names "${drawing}", and there is no such drawing.`,
        mend: didYouMean(drawing, new Set(Object.keys(DRAWINGS)), "Take the name out."),
      },
    ];
  });

export const drawingRules: readonly Rule[] = [{ name: "unknown-drawing", severity: "error", find: unknownDrawings }];
