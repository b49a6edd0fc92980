import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { Invitation, NewInvitation } from "@/lib/core/contract/people";
import { invite } from "@/lib/server/people/invite";
import { listInvitations } from "@/lib/server/people/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id });

export const GET = endpoint({
  permission: "people:write",
  summary: "Invitations that can still be accepted",
  params,
  output: listOf(Invitation),
  run: async (scope) => ({ items: await listInvitations(scope) }),
});

export const POST = endpoint({
  permission: "people:write",
  summary: "Invite somebody by e-mail; the same once more sends a mail that has not gone out",
  params,
  input: NewInvitation,
  output: Invitation,
  status: 201,
  run: (scope, { input }) => invite(scope, input),
});
