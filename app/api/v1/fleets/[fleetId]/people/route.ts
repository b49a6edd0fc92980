import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { FleetPerson } from "@/lib/core/contract/people";
import { listPeople } from "@/lib/server/people/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "people:read",
  summary: "Everyone in the fleet",
  params: z.object({ fleetId: Id }),
  output: listOf(FleetPerson),
  run: async (scope) => ({ items: await listPeople(scope) }),
});
