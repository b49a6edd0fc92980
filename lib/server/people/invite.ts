import "server-only";
import { and, eq, gt, ne, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { invitations, memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import type { Invitation, NewInvitation } from "@/lib/core/contract/people";
import { Problem } from "@/lib/core/contract/problem";
import { canonical } from "@/lib/server/trees/content-hash";
import { countAttempt, LIMITS } from "../auth/attempts";
import { newToken, tokenHash } from "../auth/one-time-token";
import { afterCommit } from "../auth/fleet-transaction";
import type { FleetScope } from "../auth/scope";
import { invitationLetter } from "../mail/letters";
import { sendMail } from "../mail/send-mail";
import { getFleet, invitationOf } from "./queries";

const UNTIL = sql`now() + interval '72 hours'`;

/**
 * Invites an address with roles, by mail. A second invitation of one address takes the place of the first. Asked twice
 * with one id it is done once; where its mail did not go out, asking again sends it, and its link is a new one.
 */
export async function invite(scope: FleetScope<"people:write">, { id, email, roles }: NewInvitation): Promise<Invitation> {
  const db = identityDatabase();
  const [repeat] = await db.select().from(invitations).where(itself(scope, id));
  if (repeat && (repeat.email !== email || canonical(repeat.roles) !== canonical(roles)))
    throw Problem.conflict("Another invitation has this id already.");
  if (repeat?.sentAt) return invitationOf(repeat);
  if (repeat) return sendAgain(scope, id);
  const [member] = await db
    .select({ userId: users.id })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.fleetId, scope.fleetId), eq(users.email, email)));
  if (member) throw Problem.conflict("That person is in the fleet already. Change their roles instead.");
  await countOne(scope);
  const fleet = await getFleet(scope);
  const token = newToken();
  const row = await db.transaction(async (tx) => {
    await tx.delete(invitations).where(and(eq(invitations.fleetId, scope.fleetId), eq(invitations.email, email), ne(invitations.id, id)));
    const [made] = await tx
      .insert(invitations)
      .values({
        fleetId: scope.fleetId,
        id,
        tokenHash: tokenHash(token),
        email,
        roles: [...roles],
        fleetName: fleet.name,
        invitedBy: scope.actor.userId,
        invitedByName: scope.actor.name,
        expiresAt: UNTIL,
      })
      .returning();
    if (!made) throw new Error("an insert gave no row");
    return made;
  });
  return mail(scope, token, row);
}

/** Sends the mail of an invitation once more, with a new link that is good from now on; the old link is gone. */
export async function sendAgain(scope: FleetScope<"people:write">, id: string): Promise<Invitation> {
  await countOne(scope);
  const token = newToken();
  const [row] = await identityDatabase()
    .update(invitations)
    .set({ tokenHash: tokenHash(token), expiresAt: UNTIL, sentAt: null })
    .where(itself(scope, id))
    .returning();
  if (!row) throw Problem.notFound("That invitation has been accepted, withdrawn or has run out.");
  return mail(scope, token, row);
}

/** After the commit: a slow mail server holds nothing up. Where it fails the invitation stands, unsent, and says so. */
function mail(scope: FleetScope<"people:write">, token: string, row: typeof invitations.$inferSelect): Invitation {
  const invitation = invitationOf(row);
  afterCommit(scope.tx, async () => {
    try {
      await sendMail(row.email, invitationLetter(token, row));
    } catch (error) {
      console.error("an invitation's mail could not be sent:", error instanceof Error ? error.message : error);
      return;
    }
    // Of two mails at once the link of the later one holds.
    const [sent] = await identityDatabase()
      .update(invitations)
      .set({ sentAt: sql`now()` })
      .where(and(itself(scope, row.id), eq(invitations.tokenHash, row.tokenHash)))
      .returning();
    if (sent) Object.assign(invitation, invitationOf(sent));
  });
  return invitation;
}

async function countOne(scope: FleetScope<"people:write">): Promise<void> {
  const until = await countAttempt(LIMITS.invitationsOfFleet, scope.fleetId);
  if (until) throw Problem.tooMany(until.toISOString());
}

const itself = (scope: FleetScope, id: string) => and(eq(invitations.fleetId, scope.fleetId), eq(invitations.id, id));

export async function withdrawInvitation(scope: FleetScope<"people:write">, id: string): Promise<void> {
  const gone = await identityDatabase()
    .delete(invitations)
    .where(and(eq(invitations.fleetId, scope.fleetId), eq(invitations.id, id)))
    .returning({ id: invitations.id });
  if (gone.length === 0) throw Problem.notFound("That invitation has been accepted, withdrawn or has run out.");
}

/** Uses an invitation up, if it still holds. */
export const liveInvitation = (token: string) => and(eq(invitations.tokenHash, tokenHash(token)), gt(invitations.expiresAt, sql`now()`));
