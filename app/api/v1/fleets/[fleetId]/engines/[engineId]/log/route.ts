import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { LogEntry, LogQuery } from "@/lib/core/contract/log";
import { pageOf } from "@/lib/core/contract/page";
import { getEngine } from "@/lib/server/engines/queries";
import { listLog } from "@/lib/server/log/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "An engine's log, newest first",
  params: z.object({ fleetId: Id, engineId: Id }),
  query: LogQuery.omit({ engineId: true, boatId: true }),
  output: pageOf(LogEntry),
  run: async (scope, { params, query }) => {
    await getEngine(scope, params.engineId);
    return listLog(scope, { ...query, engineId: params.engineId });
  },
});
