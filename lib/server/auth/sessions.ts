import "server-only";
import { and, desc, eq, gt, lt, ne, sql } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { identityDatabase, type Database, type Transaction } from "@/db/client";
import { attempts, oneTimeTokens, sessions } from "@/db/schema/sessions";
import type { Person } from "./person";
import { SESSION_SECONDS } from "./session-cookie";

export type OwnSession = { id: string; device: string; createdAt: string; lastSeenAt: string; current: boolean };

/** A new row for each sign-in; what has run out is swept away on the way. */
export async function openSession(userId: string, device: string): Promise<string> {
  const db = identityDatabase();
  const id = uuidv7();
  await db.insert(sessions).values({ id, userId, device, expiresAt: sql`now() + make_interval(secs => ${SESSION_SECONDS})` });
  await db.delete(sessions).where(lt(sessions.expiresAt, sql`now()`));
  await db.delete(oneTimeTokens).where(lt(oneTimeTokens.expiresAt, sql`now()`));
  await db.delete(attempts).where(lt(attempts.endsAt, sql`now()`));
  return id;
}

export async function listSessions(person: Person): Promise<OwnSession[]> {
  const rows = await identityDatabase()
    .select()
    .from(sessions)
    .where(and(eq(sessions.userId, person.userId), gt(sessions.expiresAt, sql`now()`)))
    .orderBy(desc(sessions.lastSeenAt));
  return rows.map((row) => ({
    id: row.id,
    device: row.device,
    createdAt: row.createdAt.toISOString(),
    lastSeenAt: row.lastSeenAt.toISOString(),
    current: row.id === person.sessionId,
  }));
}

export async function endSession(person: Person, sessionId: string): Promise<void> {
  await identityDatabase()
    .delete(sessions)
    .where(and(eq(sessions.id, sessionId), eq(sessions.userId, person.userId)));
}

/** By its id alone: for the cookie's own sign-out. */
export async function endSessionById(sessionId: string): Promise<void> {
  await identityDatabase().delete(sessions).where(eq(sessions.id, sessionId));
}

/** Signs a person out everywhere at once, but for the session to keep. */
export async function endSessionsOf(userId: string, keep: string | null, on: Database | Transaction = identityDatabase()): Promise<void> {
  await on.delete(sessions).where(and(eq(sessions.userId, userId), keep === null ? undefined : ne(sessions.id, keep)));
}

/** Is the row still there? */
export async function sessionLives(sessionId: string): Promise<boolean> {
  const rows = await identityDatabase()
    .select({ id: sessions.id })
    .from(sessions)
    .where(and(eq(sessions.id, sessionId), gt(sessions.expiresAt, sql`now()`)));
  return rows.length > 0;
}
