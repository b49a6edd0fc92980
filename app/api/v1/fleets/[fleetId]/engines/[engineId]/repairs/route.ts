import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { LogEntry, NewRepair } from "@/lib/core/contract/log";
import { logRepair } from "@/lib/server/log/commands";
import { endpoint } from "@/lib/server/web/endpoint";
import { inPlace } from "@/lib/server/web/in-place";

export const POST = endpoint({
  permission: "log:write",
  summary: "Log a repair that was done without a diagnosis",
  params: z.object({ fleetId: Id, engineId: Id }),
  input: NewRepair,
  output: LogEntry,
  status: 201,
  run: (scope, { params, input }) => logRepair(scope, inPlace("engineId", params.engineId, input)),
});
