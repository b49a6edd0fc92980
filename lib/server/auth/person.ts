import "server-only";
import { and, eq, gt, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { sessions } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";

declare const proved: unique symbol;

/** Somebody whose session lives. Made here only: a command about one's own account asks for it. */
export type Person = {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly sessionId: string;
  readonly [proved]: true;
};

const STALE = sql`now() - interval '5 minutes'`;

/** The person of a session as they are now; null when the session has ended. Notes that the session was used, at most every five minutes. */
export async function findPerson(sessionId: string): Promise<Person | null> {
  const db = identityDatabase();
  const [row] = await db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      sessionId: sessions.id,
      stale: sql<boolean>`${sessions.lastSeenAt} < ${STALE}`,
    })
    .from(sessions)
    .innerJoin(users, eq(users.id, sessions.userId))
    .where(and(eq(sessions.id, sessionId), gt(sessions.expiresAt, sql`now()`)));
  if (!row) return null;
  const { stale, ...person } = row;
  if (stale)
    await db
      .update(sessions)
      .set({ lastSeenAt: sql`now()` })
      .where(eq(sessions.id, sessionId));
  return person as Person;
}
