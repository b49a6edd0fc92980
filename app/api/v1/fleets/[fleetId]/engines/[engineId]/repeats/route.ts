import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { RepeatFault } from "@/lib/core/contract/log";
import { listOf } from "@/lib/core/contract/page";
import { getEngine } from "@/lib/server/engines/queries";
import { listRepeats } from "@/lib/server/log/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "Faults that came back on this engine",
  params: z.object({ fleetId: Id, engineId: Id }),
  output: listOf(RepeatFault),
  run: async (scope, { params }) => {
    await getEngine(scope, params.engineId);
    return { items: await listRepeats(scope, params.engineId) };
  },
});
