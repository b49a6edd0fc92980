import { index, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { ROLES } from "../../lib/core/access/roles";
import { fleets } from "./fleets";
import { users } from "./users";
import { createdAt, fleetId, moment, version } from "./wall";

const roles = () => text({ enum: ROLES }).array().notNull();

/** What a person is in a fleet. Read on each request, so a change of it holds at once. */
export const memberships = pgTable(
  "memberships",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    roles: roles(),
    version: version(),
    createdAt: createdAt(),
  },
  (t) => [primaryKey({ columns: [t.fleetId, t.userId] }), index().on(t.userId)],
);

/** Read by a stranger who holds the token, before any fleet is known: so it stands with the identity tables, and carries the names it shows. */
export const invitations = pgTable(
  "invitations",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    id: uuid().notNull(),
    tokenHash: text().notNull().unique(),
    email: text().notNull(),
    roles: roles(),
    fleetName: text().notNull(),
    invitedBy: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    invitedByName: text().notNull(),
    createdAt: createdAt(),
    expiresAt: moment().notNull(),
    /** When its mail was handed over; null while it has not been: it can then be sent again. */
    sentAt: moment(),
  },
  (t) => [primaryKey({ columns: [t.fleetId, t.id] }), index().on(t.fleetId, t.email)],
);
