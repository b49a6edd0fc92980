import * as z from "zod";
import { FaultTree, Key } from "../tree/schema";
import { TreeVersionStamp } from "./phone";

/** A published version in a list. `from`: shipped with Gudgeon, or the fleet's own. */
export const TreeVersionInfo = TreeVersionStamp.extend({
  key: Key,
  title: z.string(),
  from: z.enum(["shipped", "own"]),
  note: z.string().nullable().describe("What the mechanic said of it when it was published; null for shipped versions"),
});
export type TreeVersionInfo = z.infer<typeof TreeVersionInfo>;

/** A published version with its document, as phones keep it. */
export const TreeVersionDocument = TreeVersionInfo.extend({
  document: FaultTree,
  /** What changed from the version before, in words. */
  differences: z.array(z.string()),
});
export type TreeVersionDocument = z.infer<typeof TreeVersionDocument>;
