import "server-only";
import { TransactionRollbackError } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { identityDatabase, type Transaction } from "@/db/client";
import { invitations } from "@/db/schema/memberships";
import type { AcceptAsNew } from "@/lib/core/contract/account";
import { makeUser } from "../account/make-user";
import { hashPassword } from "../auth/password";
import type { Person } from "../auth/person";
import { liveInvitation } from "./invite";
import { peekInvitation } from "./queries";
import { addMember } from "./start-fleet";

export type AcceptOutcome =
  | { result: "joined"; fleetId: string; userId: string; email: string }
  | { result: "gone" }
  | { result: "for-another-address" }
  | { result: "has-account" };

const take = async (tx: Transaction, token: string) => {
  const [row] = await tx.delete(invitations).where(liveInvitation(token)).returning();
  return row ?? null;
};

/** Somebody signed in accepts. An invitation is for one address: that of another person is refused, and stays good. */
export async function acceptInvitation(person: Person, token: string): Promise<AcceptOutcome> {
  const peeked = await peekInvitation(token);
  if (!peeked) return { result: "gone" };
  if (peeked.email !== person.email) return { result: "for-another-address" };
  return identityDatabase().transaction(async (tx): Promise<AcceptOutcome> => {
    const invitation = await take(tx, token);
    if (!invitation) return { result: "gone" };
    await addMember(invitation.fleetId, person, invitation.roles, tx);
    return { result: "joined", fleetId: invitation.fleetId, userId: person.userId, email: person.email };
  });
}

/** Somebody without an account accepts: the link proves the address, so the account is made on the spot. */
export async function acceptAsNew({ token, name, password }: AcceptAsNew): Promise<AcceptOutcome> {
  const peeked = await peekInvitation(token);
  if (!peeked) return { result: "gone" };
  if (peeked.hasAccount) return { result: "has-account" };
  const passwordHash = await hashPassword(password);
  const userId = uuidv7();
  try {
    return await identityDatabase().transaction(async (tx): Promise<AcceptOutcome> => {
      // The account first: where the address was taken meanwhile, the invitation stays good.
      if (!(await makeUser(tx, { userId, name, email: peeked.email, passwordHash }))) return { result: "has-account" };
      const invitation = await take(tx, token);
      if (!invitation) return tx.rollback();
      await addMember(invitation.fleetId, { userId, name }, invitation.roles, tx);
      return { result: "joined", fleetId: invitation.fleetId, userId, email: peeked.email };
    });
  } catch (error) {
    if (error instanceof TransactionRollbackError) return { result: "gone" };
    throw error;
  }
}
