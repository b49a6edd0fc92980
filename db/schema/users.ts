import { pgTable, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, moment } from "./wall";

/** A person who can sign in. The address has been proved by a mail before the row is made; kept in lower case. */
export const users = pgTable("users", {
  id: uuid().primaryKey(),
  name: text().notNull(),
  email: text().notNull().unique(),
  createdAt: createdAt(),
});

/** Apart from users, so that no query of people can carry a hash along. */
export const credentials = pgTable("credentials", {
  userId: uuid()
    .primaryKey()
    .references(() => users.id, { onDelete: "cascade" }),
  passwordHash: text().notNull(),
  changedAt: moment().notNull().defaultNow(),
});
