import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { FaultTree } from "@/lib/core/tree/schema";
import { readTreeText } from "@/lib/server/trees/read-tree-text";
import { slowEndpoint } from "@/lib/server/web/endpoint";

/** Nothing is stored: what was read goes into the draft as an edit, so that it can be undone. */
export const POST = slowEndpoint({
  permission: "tree:write",
  summary: "Read a tree from a YAML or JSON file",
  params: z.object({ fleetId: Id }),
  raw: { accepts: ["application/yaml", "application/json"], maxBytes: 8_000_000 },
  output: z.object({ document: FaultTree }),
  run: async (_pass, { bytes }) => ({ document: readTreeText(new TextDecoder().decode(bytes.body)) }),
});
