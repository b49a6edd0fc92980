import * as z from "zod";
import { SafetyFlags } from "./safety-flags";
import * as shapes from "./schema";
import { FindingLink, OddsFactor, Strength } from "./finding-link";

/**
 * The shape of a fault tree as JSON Schema (draft 2020-12), for editors and
 * other programs: of what may be written, so defaults may be left out. Shapes
 * go by the names their modules export.
 */
export function jsonSchema(): Record<string, unknown> {
  const names = z.registry<{ id: string }>();
  for (const [name, shape] of Object.entries({ ...shapes, SafetyFlags, FindingLink, OddsFactor, Strength }))
    if (name !== "FaultTree") names.add(shape, { id: name });
  return { title: "Fault tree", ...z.toJSONSchema(shapes.FaultTree, { io: "input", metadata: names }) };
}
