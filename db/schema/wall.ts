import { sql } from "drizzle-orm";
import { integer, pgPolicy, timestamp, uuid } from "drizzle-orm/pg-core";

/** The fleet of this transaction. A setting made for one transaction reads '' after it, not null: hence nullif. `select` lets it be worked out once a statement. */
const fleetOfTransaction = sql`(select nullif(current_setting('app.fleet_id', true), '')::uuid)`;

/** The fleet wall of a table: rows of one fleet only, to read and to write. A hand-written migration forces it on the owner too. */
export const wall = () =>
  pgPolicy("fleet_wall", { using: sql`fleet_id = ${fleetOfTransaction}`, withCheck: sql`fleet_id = ${fleetOfTransaction}` });

/** The same for the table of fleets itself. */
export const wallOfFleets = () =>
  pgPolicy("fleet_wall", { using: sql`id = ${fleetOfTransaction}`, withCheck: sql`id = ${fleetOfTransaction}` });

export const fleetId = () => uuid().notNull();
export const moment = () => timestamp({ withTimezone: true, mode: "date" });
export const createdAt = () => moment().notNull().defaultNow();
/** Counts up with each change; what If-Match is compared with. */
export const version = () => integer().notNull().default(1);
