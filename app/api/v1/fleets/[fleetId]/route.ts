import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { Fleet } from "@/lib/core/contract/people";
import { renameFleet } from "@/lib/server/people/commands";
import { getFleet } from "@/lib/server/people/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id });

export const GET = endpoint({ permission: "fleet:read", summary: "The fleet", params, output: Fleet, run: (scope) => getFleet(scope) });

export const PATCH = endpoint({
  permission: "fleet:write",
  summary: "Rename the fleet",
  params,
  input: Fleet.pick({ name: true }),
  output: Fleet,
  versioned: true,
  run: (scope, { input, version }) => renameFleet(scope, input.name, version),
});
