import "server-only";
import { createHash } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { attempts } from "@/db/schema/sessions";

export type Limit = { readonly name: string; readonly max: number; readonly seconds: number };

/** What may be tried how often. By account alone the limits are wide: nobody can be shut out by a stranger, because a mailed link always gets in. */
export const LIMITS = {
  passwordFromPlace: { name: "password-from-place", max: 10, seconds: 15 * 60 },
  passwordOfAccount: { name: "password-of-account", max: 60, seconds: 3600 },
  passwordsOfPlace: { name: "passwords-of-place", max: 120, seconds: 3600 },
  ownPassword: { name: "own-password", max: 10, seconds: 15 * 60 },
  mailToAddress: { name: "mail-to-address", max: 5, seconds: 15 * 60 },
  mailsOfPlace: { name: "mails-of-place", max: 40, seconds: 3600 },
  addressChanges: { name: "address-changes", max: 10, seconds: 24 * 3600 },
  invitationsOfFleet: { name: "invitations-of-fleet", max: 60, seconds: 24 * 3600 },
} as const satisfies Record<string, Limit>;

/** Addresses stay out of the table: a key tells nothing to those who read it. */
const keyOf = (limit: Limit, who: readonly string[]) =>
  `${limit.name}:${createHash("sha256").update(JSON.stringify(who)).digest("base64url").slice(0, 22)}`;

/**
 * Counts a try before it is made, in one statement, so that a hundred at once are a hundred. Returns null when it may
 * be made, else the moment from which it may. The window begins with the first try and ends by itself.
 */
export async function countAttempt(limit: Limit, ...who: string[]): Promise<Date | null> {
  const fresh = sql`now() + make_interval(secs => ${limit.seconds})`;
  const over = sql`${attempts.endsAt} <= now()`;
  const [row] = await identityDatabase()
    .insert(attempts)
    .values({ key: keyOf(limit, who), count: 1, endsAt: fresh })
    .onConflictDoUpdate({
      target: attempts.key,
      set: {
        count: sql`case when ${over} then 1 else least(${attempts.count} + 1, 1000000) end`,
        endsAt: sql`case when ${over} then ${fresh} else ${attempts.endsAt} end`,
      },
    })
    .returning({ count: attempts.count, endsAt: attempts.endsAt });
  return row && row.count > limit.max ? row.endsAt : null;
}

/** Forgets the tries so far: it went well. */
export async function forgetAttempts(limit: Limit, ...who: string[]): Promise<void> {
  await identityDatabase()
    .delete(attempts)
    .where(eq(attempts.key, keyOf(limit, who)));
}

/** Takes one try back, where a limit is shared by people who are not to pay for each other's success. */
export async function takeBackAttempt(limit: Limit, ...who: string[]): Promise<void> {
  await identityDatabase()
    .update(attempts)
    .set({ count: sql`greatest(${attempts.count} - 1, 0)` })
    .where(eq(attempts.key, keyOf(limit, who)));
}
