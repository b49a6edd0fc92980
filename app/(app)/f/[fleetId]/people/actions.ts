"use server";

import { uuidv7 } from "uuidv7";
import * as z from "zod";
import { Email, FleetName } from "@/lib/core/contract/account";
import { Id } from "@/lib/core/contract/id";
import { Roles } from "@/lib/core/contract/people";
import { changeRoles as change, leaveFleet as leave, removePerson as remove, renameFleet as rename } from "@/lib/server/people/commands";
import { invite as send, sendAgain as again, withdrawInvitation as withdraw } from "@/lib/server/people/invite";
import { done, fleetAction, personalAction } from "@/lib/server/web/action";

/** Checkboxes: none is no field at all, one is a text, several are a list. */
const CheckedRoles = z.preprocess((value) => (value === undefined ? [] : Array.isArray(value) ? value : [value]), Roles);
const Version = z.coerce.number().int().positive();

export const invite = fleetAction({
  permission: "people:write",
  input: z.object({ fleetId: Id, email: Email, roles: CheckedRoles }),
  async run(scope, { email, roles }) {
    await send(scope, { id: uuidv7(), email, roles });
    return done(`${email} is invited, for three days. Under "Invitations waiting" it says whether the mail went out.`);
  },
});

export const sendInvitationAgain = fleetAction({
  permission: "people:write",
  input: z.object({ fleetId: Id, invitationId: Id }),
  async run(scope, { invitationId }) {
    const { email } = await again(scope, invitationId);
    return done(`The invitation goes to ${email} once more, with a new link. The old link no longer works.`);
  },
});

export const withdrawInvitation = fleetAction({
  permission: "people:write",
  input: z.object({ fleetId: Id, invitationId: Id }),
  async run(scope, { invitationId }) {
    await withdraw(scope, invitationId);
    return done("The invitation is withdrawn.");
  },
});

export const changeRoles = fleetAction({
  permission: "people:write",
  input: z.object({ fleetId: Id, userId: Id, roles: CheckedRoles, version: Version }),
  async run(scope, { userId, roles, version }) {
    const person = await change(scope, userId, roles, version);
    return done(`${person.name} is now ${person.roles.join(", ")}.`);
  },
});

export const removePerson = fleetAction({
  permission: "people:write",
  input: z.object({ fleetId: Id, userId: Id, version: Version }),
  async run(scope, { userId, version }) {
    await remove(scope, userId, version);
    return done("They are out of the fleet and signed out everywhere. What they wrote stays.");
  },
});

export const leaveFleet = personalAction({
  input: z.object({ fleetId: Id }),
  async run(person, { fleetId }) {
    await leave(person, fleetId);
    return { goTo: "/f" };
  },
});

export const renameFleet = fleetAction({
  permission: "fleet:write",
  input: z.object({ fleetId: Id, name: FleetName, version: Version }),
  async run(scope, { name, version }) {
    await rename(scope, name, version);
    return done("The fleet is renamed.");
  },
});
