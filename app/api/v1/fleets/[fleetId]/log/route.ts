import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { LogEntry, LogQuery } from "@/lib/core/contract/log";
import { pageOf } from "@/lib/core/contract/page";
import { listLog } from "@/lib/server/log/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "The fleet's log, newest first",
  params: z.object({ fleetId: Id }),
  query: LogQuery,
  output: pageOf(LogEntry),
  run: (scope, { query }) => listLog(scope, query),
});
