import { DRAWINGS, isDrawing } from "../drawings";
import { didYouMean } from "../nearest";
import type { FaultTree } from "../schema";
import { stepNode, stepsOf, type Found, type Rule } from "./rule";

const unknownDrawings = (tree: FaultTree): Found[] =>
  stepsOf(tree).flatMap((node) => {
    const { drawing } = node.step;
    if (drawing === undefined || isDrawing(drawing)) return [];
    return [
      {
        node: stepNode(node),
        says: `"drawing" names "${drawing}", and there is no such drawing.`,
        mend: didYouMean(drawing, new Set(Object.keys(DRAWINGS)), "Take the name out."),
      },
    ];
  });

export const drawingRules: readonly Rule[] = [{ name: "unknown-drawing", severity: "error", find: unknownDrawings }];
