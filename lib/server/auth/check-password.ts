import "server-only";
import { eq } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { credentials, users } from "@/db/schema/users";
import { countAttempt, forgetAttempts, LIMITS, takeBackAttempt } from "./attempts";
import { hashPassword, isOutdated, verifyNobody, verifyPassword } from "./password";

export type PasswordOutcome = { result: "right"; userId: string } | { result: "wrong" } | { result: "wait"; until: Date };

/**
 * Checks an address and a password that came from `place`. Wrong address and wrong password are one answer, after the
 * same work. Tries are counted by address and place, by address, and by place; whoever gets in starts afresh.
 */
export async function checkPassword(email: string, password: string, place: string): Promise<PasswordOutcome> {
  const until =
    (await countAttempt(LIMITS.passwordFromPlace, email, place)) ??
    (await countAttempt(LIMITS.passwordsOfPlace, place)) ??
    (await countAttempt(LIMITS.passwordOfAccount, email));
  if (until) return { result: "wait", until };
  const db = identityDatabase();
  const [row] = await db
    .select({ userId: users.id, hash: credentials.passwordHash })
    .from(users)
    .innerJoin(credentials, eq(credentials.userId, users.id))
    .where(eq(users.email, email));
  if (!row) {
    await verifyNobody(password);
    return { result: "wrong" };
  }
  if (!(await verifyPassword(row.hash, password))) return { result: "wrong" };
  await forgetAttempts(LIMITS.passwordFromPlace, email, place);
  await takeBackAttempt(LIMITS.passwordsOfPlace, place);
  await takeBackAttempt(LIMITS.passwordOfAccount, email);
  if (isOutdated(row.hash)) {
    await db
      .update(credentials)
      .set({ passwordHash: await hashPassword(password) })
      .where(eq(credentials.userId, row.userId));
  }
  return { result: "right", userId: row.userId };
}

/** The password of somebody who is signed in already, asked for again before something weighty. */
export async function checkOwnPassword(userId: string, password: string): Promise<PasswordOutcome> {
  const until = await countAttempt(LIMITS.ownPassword, userId);
  if (until) return { result: "wait", until };
  const [row] = await identityDatabase().select({ hash: credentials.passwordHash }).from(credentials).where(eq(credentials.userId, userId));
  if (!row || !(await verifyPassword(row.hash, password))) return { result: "wrong" };
  await forgetAttempts(LIMITS.ownPassword, userId);
  return { result: "right", userId };
}
