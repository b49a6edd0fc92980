import { foreignKey, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { fleets, people } from "./fleets";
import { createdAt, fleetId, wall } from "./wall";

/** A photo that was taken: the row; the bytes are in the object store under `fleetId/id`. */
export const files = pgTable(
  "files",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    id: uuid().notNull(),
    mediaType: text().notNull(),
    bytes: integer().notNull(),
    widthPx: integer().notNull(),
    heightPx: integer().notNull(),
    /** SHA-256 of what was sent, before it was encoded anew: tells a repeat from another photo under the same id. */
    sentHash: text().notNull(),
    by: uuid().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    wall(),
  ],
);
