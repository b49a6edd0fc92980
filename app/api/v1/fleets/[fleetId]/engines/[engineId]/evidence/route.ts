import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { RepeatEvidence } from "@/lib/core/contract/repeat-evidence";
import { getEngine } from "@/lib/server/engines/queries";
import { listEvidence } from "@/lib/server/log/evidence";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "Whether the faults that came back on this engine are getting worse, with the evidence",
  params: z.object({ fleetId: Id, engineId: Id }),
  output: listOf(RepeatEvidence),
  run: async (scope, { params }) => {
    await getEngine(scope, params.engineId);
    return { items: await listEvidence(scope, params.engineId) };
  },
});
