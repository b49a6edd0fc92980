import "server-only";
import { and, eq, ne } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { people } from "@/db/schema/fleets";
import { memberships } from "@/db/schema/memberships";
import { oneTimeTokens } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";
import type { ChangeAddress, ChangePassword } from "@/lib/core/contract/account";
import { countAttempt, LIMITS } from "../auth/attempts";
import { checkOwnPassword, type PasswordOutcome } from "../auth/check-password";
import { inFleet } from "../auth/fleet-transaction";
import { issueToken, takeToken } from "../auth/one-time-token";
import { hashPassword } from "../auth/password";
import type { Person } from "../auth/person";
import { endSessionsOf } from "../auth/sessions";
import { addressChangeAskedLetter, addressTakenLetter, confirmAddressLetter, passwordChangedLetter } from "../mail/letters";
import { sendMail } from "../mail/send-mail";
import { setPassword } from "./password-reset";

/** The name, here and on the card in each fleet. */
export async function changeName(person: Person, name: string): Promise<void> {
  const db = identityDatabase();
  await db.update(users).set({ name }).where(eq(users.id, person.userId));
  const fleets = await db.select({ id: memberships.fleetId }).from(memberships).where(eq(memberships.userId, person.userId));
  for (const fleet of fleets) {
    await inFleet(fleet.id, (tx) =>
      tx
        .update(people)
        .set({ name })
        .where(and(eq(people.fleetId, fleet.id), eq(people.userId, person.userId))),
    );
  }
}

/** Ends every other session of the person. */
export async function changePassword(person: Person, { current, password }: ChangePassword): Promise<PasswordOutcome> {
  const checked = await checkOwnPassword(person.userId, current);
  if (checked.result !== "right") return checked;
  const passwordHash = await hashPassword(password);
  await identityDatabase().transaction((tx) => setPassword(tx, person.userId, passwordHash, person.sessionId));
  await sendMail(person.email, passwordChangedLetter());
  return checked;
}

/**
 * Asks the new address whether it is theirs, and tells the old one. An address that somebody has is told of it and gets
 * no link; the answer and the work are the same.
 */
export async function askAddressChange(person: Person, { email, current }: ChangeAddress): Promise<PasswordOutcome> {
  const checked = await checkOwnPassword(person.userId, current);
  if (checked.result !== "right" || email === person.email) return checked;
  const until = (await countAttempt(LIMITS.addressChanges, person.userId)) ?? (await countAttempt(LIMITS.mailToAddress, email));
  if (until) return { result: "wait", until };
  const [taken] = await identityDatabase()
    .select({ id: users.id })
    .from(users)
    .where(and(eq(users.email, email), ne(users.id, person.userId)));
  await sendMail(email, taken ? addressTakenLetter() : confirmAddressLetter(await issueToken("change-address", email, person.userId)));
  await sendMail(person.email, addressChangeAskedLetter(email));
  return checked;
}

/** The new address holds from now on; links mailed to the old one are worthless, and sessions end but for `keep`. False when the link is used up, or the address was taken meanwhile. */
export async function confirmAddress(token: string, keep: string | null): Promise<boolean> {
  return identityDatabase().transaction(async (tx) => {
    const link = await takeToken("change-address", token, tx);
    if (!link?.userId) return false;
    const [taken] = await tx.select({ id: users.id }).from(users).where(eq(users.email, link.email));
    if (taken) return false;
    await tx.update(users).set({ email: link.email }).where(eq(users.id, link.userId));
    await tx.delete(oneTimeTokens).where(eq(oneTimeTokens.userId, link.userId));
    await endSessionsOf(link.userId, keep, tx);
    return true;
  });
}
