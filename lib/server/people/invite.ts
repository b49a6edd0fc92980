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
import type { FleetScope } from "../auth/scope";
import { invitationLetter } from "../mail/letters";
import { sendMail } from "../mail/send-mail";
import { getFleet, invitationOf } from "./queries";

const HOURS = 72;

/** Invites an address with roles, by mail. A second invitation of one address takes the place of the first. Asked twice with one id it is done once. */
export async function invite(scope: FleetScope<"people:write">, { id, email, roles }: NewInvitation): Promise<Invitation> {
  const db = identityDatabase();
  const [repeat] = await db
    .select()
    .from(invitations)
    .where(and(eq(invitations.fleetId, scope.fleetId), eq(invitations.id, id)));
  if (repeat) {
    if (repeat.email === email && canonical(repeat.roles) === canonical(roles)) return invitationOf(repeat);
    throw Problem.conflict("Another invitation has this id already.");
  }
  const [member] = await db
    .select({ userId: users.id })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.fleetId, scope.fleetId), eq(users.email, email)));
  if (member) throw Problem.conflict("That person is in the fleet already. Change their roles instead.");
  const until = await countAttempt(LIMITS.invitationsOfFleet, scope.fleetId);
  if (until) throw Problem.tooMany(until.toISOString());
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
        expiresAt: sql`now() + make_interval(hours => ${HOURS})`,
      })
      .returning();
    if (!made) throw new Error("an insert gave no row");
    return made;
  });
  try {
    await sendMail(email, invitationLetter(token, row));
  } catch (error) {
    // Kept, it would make the next try a repeat, which sends nothing.
    await db.delete(invitations).where(and(eq(invitations.fleetId, scope.fleetId), eq(invitations.id, id)));
    throw error;
  }
  return invitationOf(row);
}

export async function withdrawInvitation(scope: FleetScope<"people:write">, id: string): Promise<void> {
  const gone = await identityDatabase()
    .delete(invitations)
    .where(and(eq(invitations.fleetId, scope.fleetId), eq(invitations.id, id)))
    .returning({ id: invitations.id });
  if (gone.length === 0) throw Problem.notFound("That invitation has been accepted, withdrawn or has run out.");
}

/** Uses an invitation up, if it still holds. */
export const liveInvitation = (token: string) => and(eq(invitations.tokenHash, tokenHash(token)), gt(invitations.expiresAt, sql`now()`));
