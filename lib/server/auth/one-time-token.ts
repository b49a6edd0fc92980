import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { and, eq, gt, sql } from "drizzle-orm";
import { identityDatabase, type Database, type Transaction } from "@/db/client";
import { oneTimeTokens, type TOKEN_PURPOSES } from "@/db/schema/sessions";

export type TokenPurpose = (typeof TOKEN_PURPOSES)[number];

const MINUTES: Record<TokenPurpose, number> = { "sign-up": 24 * 60, "sign-in": 30, reset: 30, "change-address": 60 };

export const newToken = (): string => randomBytes(32).toString("base64url");
/** All that is kept of a token: who reads the table cannot use what is in it. */
export const tokenHash = (token: string): string => createHash("sha256").update(token).digest("base64url");

/** Makes the token of a mailed link. Earlier ones of the same kind stay good until they run out: mails overtake each other. */
export async function issueToken(purpose: TokenPurpose, email: string, userId: string | null): Promise<string> {
  const token = newToken();
  await identityDatabase()
    .insert(oneTimeTokens)
    .values({ tokenHash: tokenHash(token), purpose, email, userId, expiresAt: sql`now() + make_interval(mins => ${MINUTES[purpose]})` });
  return token;
}

const live = (purpose: TokenPurpose, token: string) =>
  and(eq(oneTimeTokens.tokenHash, tokenHash(token)), eq(oneTimeTokens.purpose, purpose), gt(oneTimeTokens.expiresAt, sql`now()`));

/** Whose link it is, without using it up: opening a page must not, mail scanners open pages. */
export async function peekToken(purpose: TokenPurpose, token: string): Promise<{ email: string } | null> {
  const [row] = await identityDatabase().select({ email: oneTimeTokens.email }).from(oneTimeTokens).where(live(purpose, token));
  return row ?? null;
}

/** Uses it up: of two at once one gets it. */
export async function takeToken(
  purpose: TokenPurpose,
  token: string,
  on: Database | Transaction = identityDatabase(),
): Promise<{ email: string; userId: string | null } | null> {
  const [row] = await on
    .delete(oneTimeTokens)
    .where(live(purpose, token))
    .returning({ email: oneTimeTokens.email, userId: oneTimeTokens.userId });
  return row ?? null;
}
