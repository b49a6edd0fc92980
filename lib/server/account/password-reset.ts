import "server-only";
import { and, eq, inArray, sql } from "drizzle-orm";
import { identityDatabase, type Transaction } from "@/db/client";
import { oneTimeTokens } from "@/db/schema/sessions";
import { credentials, users } from "@/db/schema/users";
import { issueToken, peekToken, takeToken } from "../auth/one-time-token";
import { hashPassword } from "../auth/password";
import { endSessionsOf } from "../auth/sessions";
import { passwordChangedLetter, resetLetter, signInLetter } from "../mail/letters";
import { sendMail } from "../mail/send-mail";

const findUserId = async (email: string): Promise<string | null> => {
  const [row] = await identityDatabase().select({ id: users.id }).from(users).where(eq(users.email, email));
  return row?.id ?? null;
};

/** Nothing happens for an address nobody has; who asks is told the same. */
export async function sendResetLink(email: string): Promise<void> {
  const userId = await findUserId(email);
  if (userId) await sendMail(email, resetLetter(await issueToken("reset", email, userId)));
}

/** A link that signs in, for those who would rather not type a password. */
export async function sendSignInLink(email: string, next?: string): Promise<void> {
  const userId = await findUserId(email);
  if (userId) await sendMail(email, signInLetter(await issueToken("sign-in", email, userId), next));
}

/** Sets a password and makes every mailed link of the person worthless; `keep` is the session that stays. */
export async function setPassword(tx: Transaction, userId: string, passwordHash: string, keep: string | null): Promise<void> {
  await tx
    .insert(credentials)
    .values({ userId, passwordHash })
    .onConflictDoUpdate({ target: credentials.userId, set: { passwordHash, changedAt: sql`now()` } });
  await endSessionsOf(userId, keep, tx);
  await tx
    .delete(oneTimeTokens)
    .where(and(eq(oneTimeTokens.userId, userId), inArray(oneTimeTokens.purpose, ["reset", "sign-in", "change-address"])));
}

/** Takes a reset link and its new password. All sessions of the person end. Null when the link is used up or too old. */
export async function resetPassword(token: string, password: string): Promise<{ userId: string; email: string } | null> {
  if (!(await peekToken("reset", token))) return null;
  const passwordHash = await hashPassword(password);
  const reset = await identityDatabase().transaction(async (tx) => {
    const link = await takeToken("reset", token, tx);
    if (!link?.userId) return null;
    await setPassword(tx, link.userId, passwordHash, null);
    return { userId: link.userId, email: link.email };
  });
  if (reset) await sendMail(reset.email, passwordChangedLetter());
  return reset;
}
