import { sql } from "drizzle-orm";
import { check, foreignKey, integer, jsonb, pgTable, primaryKey, text, unique, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import type { FaultTree } from "../../lib/core/tree/schema";
import { fleets, people } from "./fleets";
import { createdAt, fleetId, moment, wall } from "./wall";

/** Trees that come with Gudgeon: the same for every fleet, read by all, written by the owner role when the program starts. */
export const shippedTreeVersions = pgTable(
  "shipped_tree_versions",
  {
    id: uuid().primaryKey(),
    key: text().notNull(),
    title: text().notNull(),
    number: integer().notNull(),
    document: jsonb().$type<FaultTree>().notNull(),
    /** SHA-256 of the document. */
    hash: text().notNull(),
    publishedAt: createdAt(),
  },
  (t) => [unique().on(t.key, t.number)],
);

/** A fleet's own tree, which began as a shipped version. */
export const trees = pgTable(
  "trees",
  {
    fleetId: fleetId().references(() => fleets.id, { onDelete: "cascade" }),
    id: uuid().notNull(),
    key: text().notNull(),
    title: text().notNull(),
    ancestorId: uuid()
      .notNull()
      .references(() => shippedTreeVersions.id),
    createdAt: createdAt(),
  },
  (t) => [primaryKey({ columns: [t.fleetId, t.id] }), unique().on(t.fleetId, t.key), wall()],
);

/** Immutable once published; one draft a tree, with a revision that counts its saves. */
export const treeVersions = pgTable(
  "tree_versions",
  {
    fleetId: fleetId(),
    id: uuid().notNull(),
    treeId: uuid().notNull(),
    /** null while it is a draft. */
    number: integer(),
    revision: integer().notNull().default(1),
    document: jsonb().$type<FaultTree>().notNull(),
    hash: text().notNull(),
    /** The version it was begun from, shipped or own; what it is compared with and proved against. */
    begunFrom: uuid().notNull(),
    /** The shipped version whose content it has taken up: what a newer one is joined against. */
    takenUp: uuid()
      .notNull()
      .references(() => shippedTreeVersions.id),
    /** What the mechanic says of it when it is published. */
    note: text(),
    /** What changed from the version it was begun from, in words; written when it is published. */
    differences: jsonb().$type<string[]>().notNull().default([]),
    by: uuid().notNull(),
    createdAt: createdAt(),
    savedAt: createdAt(),
    publishedAt: moment(),
  },
  (t) => [
    primaryKey({ columns: [t.fleetId, t.id] }),
    foreignKey({ columns: [t.fleetId, t.treeId], foreignColumns: [trees.fleetId, trees.id] }).onDelete("cascade"),
    foreignKey({ columns: [t.fleetId, t.by], foreignColumns: [people.fleetId, people.userId] }),
    unique().on(t.fleetId, t.treeId, t.number),
    uniqueIndex("tree_versions_one_draft")
      .on(t.fleetId, t.treeId)
      .where(sql`published_at is null`),
    check("tree_versions_numbered_when_published", sql`(number is null) = (published_at is null)`),
    wall(),
  ],
);
