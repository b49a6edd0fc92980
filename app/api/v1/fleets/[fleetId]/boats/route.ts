import * as z from "zod";
import { Boat, NewBoat } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { addBoat } from "@/lib/server/boats/commands";
import { listBoats } from "@/lib/server/boats/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "The fleet's boats",
  params,
  output: listOf(Boat),
  run: async (scope) => ({ items: await listBoats(scope) }),
});

export const POST = endpoint({
  permission: "boat:write",
  summary: "Add a boat",
  params,
  input: NewBoat,
  output: Boat,
  status: 201,
  run: (scope, { input }) => addBoat(scope, input),
});
