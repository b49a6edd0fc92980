import { boolean, doublePrecision, foreignKey, index, jsonb, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import type { OutcomeKind, OutcomePayload } from "../../lib/core/contract/event";
import { engines } from "./boats";
import { diagnoses } from "./diagnoses";
import { people } from "./fleets";
import { createdAt, fleetId, moment, version, wall } from "./wall";

/** A line of an engine's log: the outcome of a diagnosis (a projection), or a repair written in without one. */
export const logEntries = pgTable(
  "log_entries",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    engineId: uuid().notNull(),
    /** null for a repair logged without a diagnosis. */
    diagnosisId: uuid(),
    at: moment().notNull(),
    /** null while the diagnosis is open. */
    outcome: text().$type<OutcomeKind>(),
    symptoms: jsonb().$type<{ key: string; title: string }[]>().notNull().default([]),
    /** Key and title as the tree had them then; a cause in the person's own words has a title only. */
    causeKey: text(),
    causeTitle: text(),
    causeSystem: text(),
    remedyKey: text(),
    remedyTitle: text(),
    proof: text(),
    /** The remedy only gets one home: the cause stays open. */
    temporary: boolean().notNull().default(false),
    /** What the meter showed, where the person wrote it down; hours since new are worked out from all readings. */
    engineHours: doublePrecision(),
    minutes: doublePrecision(),
    parts: jsonb().$type<OutcomePayload["parts"]>().notNull().default([]),
    note: text(),
    by: uuid().notNull(),
    version: version(),
    createdAt: createdAt(),
    /** A repair written in by mistake: off the log and out of every count, and still readable. */
    takenBackAt: moment(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.engineId], foreignColumns: [engines.fleetId, engines.id] }).onDelete("cascade"),
    foreignKey({ columns: [t.fleetId, t.diagnosisId], foreignColumns: [diagnoses.fleetId, diagnoses.id] }).onDelete("cascade"),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    unique().on(t.fleetId, t.diagnosisId),
    index().on(t.fleetId, t.engineId, t.at, t.id),
    index().on(t.fleetId, t.at, t.id),
    index().on(t.fleetId, t.engineId, t.causeKey),
    wall(),
  ],
);
