import { sql } from "drizzle-orm";
import { check, foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import type { DiagnosisEvent, EventKind, OutcomeKind } from "../../lib/core/contract/event";
import { engines } from "./boats";
import { people } from "./fleets";
import { shippedTreeVersions, treeVersions } from "./trees";
import { createdAt, fleetId, moment, wall } from "./wall";

/** One run from complaint to outcome. All but what it was begun with is a projection of its events and can be rebuilt. */
export const diagnoses = pgTable(
  "diagnoses",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    engineId: uuid().notNull(),
    /** Pinned to a shipped version or to one of the fleet's own: one of the two. */
    shippedVersionId: uuid().references(() => shippedTreeVersions.id),
    ownVersionId: uuid(),
    begunAt: moment().notNull(),
    begunBy: uuid().notNull(),
    symptoms: text().array().notNull().default([]),
    endedAt: moment(),
    outcome: text().$type<OutcomeKind>(),
    lastEventAt: moment().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.engineId], foreignColumns: [engines.fleetId, engines.id] }).onDelete("cascade"),
    foreignKey({ columns: [t.fleetId, t.ownVersionId], foreignColumns: [treeVersions.fleetId, treeVersions.id] }),
    foreignKey({ columns: [t.fleetId, t.begunBy], foreignColumns: [people.fleetId, people.userId] }),
    check("diagnoses_one_tree_version", sql`num_nonnulls(shipped_version_id, own_version_id) = 1`),
    index().on(t.fleetId, t.engineId, t.begunAt),
    index().on(t.fleetId, t.begunAt),
    wall(),
  ],
);

/** The log that a diagnosis is: append-only, a trigger refuses anything else. Ordered by device and sequence, never by wall clock. */
export const diagnosisEvents = pgTable(
  "diagnosis_events",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    diagnosisId: uuid().notNull(),
    device: uuid().notNull(),
    sequence: integer().notNull(),
    kind: text().$type<EventKind>().notNull(),
    payload: jsonb().$type<DiagnosisEvent["payload"]>().notNull(),
    seen: jsonb().$type<Record<string, number>>().notNull().default({}),
    supersedes: uuid(),
    madeAt: moment().notNull(),
    receivedAt: createdAt(),
    by: uuid().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.diagnosisId], foreignColumns: [diagnoses.fleetId, diagnoses.id] }),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    unique().on(t.fleetId, t.diagnosisId, t.device, t.sequence),
    wall(),
  ],
);
