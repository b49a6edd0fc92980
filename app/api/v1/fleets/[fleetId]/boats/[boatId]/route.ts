import * as z from "zod";
import { Boat, BoatChange } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { changeBoat, removeBoat } from "@/lib/server/boats/commands";
import { getBoat } from "@/lib/server/boats/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, boatId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "One boat",
  params,
  output: Boat,
  run: (scope, { params }) => getBoat(scope, params.boatId),
});

export const PATCH = endpoint({
  permission: "boat:write",
  summary: "Change a boat",
  params,
  input: BoatChange,
  output: Boat,
  versioned: true,
  run: (scope, { params, input, version }) => changeBoat(scope, params.boatId, input, version),
});

export const DELETE = endpoint({
  permission: "boat:remove",
  summary: "Take a boat and its engines off the lists; their log stays",
  params,
  versioned: true,
  run: (scope, { params, version }) => removeBoat(scope, params.boatId, version),
});
