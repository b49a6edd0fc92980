import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { PassageLine, PassageQuery } from "@/lib/core/contract/passage";
import { planForBoat } from "@/lib/server/boats/passage";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "log:read",
  summary: "How many of each spare to carry for a passage, and what drives each number",
  params: z.object({ fleetId: Id, boatId: Id }),
  query: PassageQuery,
  output: listOf(PassageLine),
  run: async (scope, { params, query }) => ({ items: await planForBoat(scope, params.boatId, query) }),
});
