import { boolean, doublePrecision, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import type { Boat, EngineProfile } from "../../lib/core/contract/engine";
import { fleets, people } from "./fleets";
import { createdAt, fleetId, moment, version, wall } from "./wall";

export const boats = pgTable(
  "boats",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    id: uuid().notNull(),
    name: text().notNull(),
    callMinutes: jsonb().$type<Boat["callMinutes"]>().notNull().default({}),
    version: version(),
    createdAt: createdAt(),
    /** Sold or given up: no longer offered, its log stays. */
    removedAt: moment(),
  },
  (t) => [primaryKey({ columns: [t.fleetId, t.id] }), wall()],
);

export const engines = pgTable(
  "engines",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    boatId: uuid().notNull(),
    name: text().notNull(),
    hasHourMeter: boolean().notNull().default(true),
    estimatedHoursPerYear: doublePrecision(),
    profile: jsonb().$type<EngineProfile>().notNull(),
    version: version(),
    createdAt: createdAt(),
    removedAt: moment(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.boatId], foreignColumns: [boats.fleetId, boats.id] }).onDelete("cascade"),
    index().on(t.fleetId, t.boatId),
    wall(),
  ],
);

export const hourReadings = pgTable(
  "hour_readings",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    engineId: uuid().notNull(),
    /** What the meter showed, in hours. */
    reading: doublePrecision().notNull(),
    readAt: moment().notNull(),
    /** The meter was replaced or set back; hours go on from `reading`. */
    reset: boolean().notNull().default(false),
    by: uuid().notNull(),
    version: version(),
    createdAt: createdAt(),
    /** Written down by mistake: counts for nothing, and stays readable. */
    takenBackAt: moment(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.engineId], foreignColumns: [engines.fleetId, engines.id] }).onDelete("cascade"),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    index().on(t.fleetId, t.engineId, t.readAt),
    wall(),
  ],
);
