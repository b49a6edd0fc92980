import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { withdrawInvitation } from "@/lib/server/people/invite";
import { endpoint } from "@/lib/server/web/endpoint";

export const DELETE = endpoint({
  permission: "people:write",
  summary: "Withdraw an invitation",
  params: z.object({ fleetId: Id, invitationId: Id }),
  run: (scope, { params }) => withdrawInvitation(scope, params.invitationId),
});
