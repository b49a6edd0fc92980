import * as z from "zod";
import { ROLES } from "../access/roles";
import { Email, FleetName } from "./account";
import { Id, Moment } from "./id";

/** One role at least, each once. */
export const Roles = z
  .array(z.enum(ROLES))
  .min(1, "Choose at least one role.")
  .transform((roles) => ROLES.filter((role) => roles.includes(role)));

export const FleetPerson = z.strictObject({
  userId: Id,
  name: z.string(),
  /** Shown to owners only. */
  email: z.string().nullable(),
  roles: z.array(z.enum(ROLES)),
  version: z.number().int(),
  joinedAt: Moment,
});
export type FleetPerson = z.infer<typeof FleetPerson>;

export const NewInvitation = z.strictObject({ id: Id, email: Email, roles: Roles });
export type NewInvitation = z.infer<typeof NewInvitation>;

export const Invitation = z.strictObject({
  id: Id,
  email: z.string(),
  roles: z.array(z.enum(ROLES)),
  invitedByName: z.string(),
  createdAt: Moment,
  expiresAt: Moment,
  /** When its mail was handed over; null while it is on its way, or where it could not be sent: send the invitation again. */
  sentAt: Moment.nullable(),
});
export type Invitation = z.infer<typeof Invitation>;

export const RolesChange = z.strictObject({ roles: Roles });

export const Fleet = z.strictObject({ id: Id, name: FleetName, version: z.number().int(), createdAt: Moment });
export type Fleet = z.infer<typeof Fleet>;
