import { pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, fleetId, moment, version, wall, wallOfFleets } from "./wall";

export const fleets = pgTable(
  "fleets",
  {
    id: uuid().primaryKey(),
    name: text().notNull(),
    version: version(),
    createdAt: createdAt(),
  },
  () => [wallOfFleets()],
);

/** The fleet's own card of everyone who is or was in it: names for the log, without a look at the identity tables. Can be blanked when someone asks for it. */
export const people = pgTable(
  "people",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    userId: uuid().notNull(),
    name: text().notNull(),
    joinedAt: createdAt(),
    leftAt: moment(),
  },
  (t) => [primaryKey({ columns: [t.fleetId, t.userId] }), wall()],
);
