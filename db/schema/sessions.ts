import { index, integer, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { users } from "./users";
import { createdAt, moment } from "./wall";

/** One row a sign-in. The cookie is a signed token that names its row: no row, no session. */
export const sessions = pgTable(
  "sessions",
  {
    id: uuid().primaryKey(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    /** "Chromium on Android", for the list of one's own sessions. */
    device: text().notNull(),
    createdAt: createdAt(),
    lastSeenAt: moment().notNull().defaultNow(),
    expiresAt: moment().notNull(),
  },
  (t) => [index().on(t.userId), index().on(t.expiresAt)],
);

export const TOKEN_PURPOSES = ["sign-up", "sign-in", "reset", "change-address"] as const;

/** What a mailed link carries: used once, only its SHA-256 is kept. */
export const oneTimeTokens = pgTable(
  "one_time_tokens",
  {
    tokenHash: text().primaryKey(),
    purpose: text({ enum: TOKEN_PURPOSES }).notNull(),
    /** The address the link was sent to. */
    email: text().notNull(),
    /** null for sign-up: there is nobody yet. */
    userId: uuid().references(() => users.id, { onDelete: "cascade" }),
    payload: jsonb().$type<Record<string, string>>().notNull().default({}),
    createdAt: createdAt(),
    expiresAt: moment().notNull(),
  },
  (t) => [index().on(t.userId), index().on(t.expiresAt)],
);

/** Counted tries at something that is limited, by what is limited and who tries. */
export const attempts = pgTable(
  "attempts",
  {
    key: text().primaryKey(),
    count: integer().notNull(),
    endsAt: moment().notNull(),
  },
  (t) => [index().on(t.endsAt)],
);
