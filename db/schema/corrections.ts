import { boolean, foreignKey, integer, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import type { CorrectedKind } from "../../lib/core/contract/correction";
import { people } from "./fleets";
import { createdAt, fleetId, wall } from "./wall";

/** What a repair or a reading of the meter said before somebody corrected it or took it back: append-only, a trigger refuses anything else. */
export const corrections = pgTable(
  "corrections",
  {
    fleetId: fleetId(),
    kind: text().$type<CorrectedKind>().notNull(),
    /** The repair or reading. */
    subjectId: uuid().notNull(),
    /** The version that was put aside. */
    version: integer().notNull(),
    was: jsonb().$type<Record<string, unknown>>().notNull(),
    /** It was taken back, not replaced by other words. */
    takenBack: boolean().notNull(),
    by: uuid().notNull(),
    at: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.kind, t.subjectId, t.version] }),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    wall(),
  ],
);
