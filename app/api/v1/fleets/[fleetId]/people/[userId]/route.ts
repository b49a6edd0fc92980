import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { FleetPerson, RolesChange } from "@/lib/core/contract/people";
import { changeRoles, removePerson } from "@/lib/server/people/commands";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, userId: Id });

export const PATCH = endpoint({
  permission: "people:write",
  summary: "Change what a person may do in the fleet",
  params,
  input: RolesChange,
  output: FleetPerson,
  versioned: true,
  run: (scope, { params, input, version }) => changeRoles(scope, params.userId, input.roles, version),
});

export const DELETE = endpoint({
  permission: "people:write",
  summary: "Take a person out of the fleet",
  params,
  versioned: true,
  run: (scope, { params, version }) => removePerson(scope, params.userId, version),
});
