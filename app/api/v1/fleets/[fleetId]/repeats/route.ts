import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { RepeatFault } from "@/lib/core/contract/log";
import { listOf } from "@/lib/core/contract/page";
import { listRepeats } from "@/lib/server/log/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "Faults that came back on any engine of the fleet",
  params: z.object({ fleetId: Id }),
  output: listOf(RepeatFault),
  run: async (scope) => ({ items: await listRepeats(scope) }),
});
