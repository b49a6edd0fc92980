import "server-only";
import { and, asc, eq, gt, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { fleets } from "@/db/schema/fleets";
import { invitations, memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import { can } from "@/lib/core/access/permissions";
import type { Role } from "@/lib/core/access/roles";
import { Problem } from "@/lib/core/contract/problem";
import type { Fleet, FleetPerson, Invitation } from "@/lib/core/contract/people";
import { inFleet } from "../auth/fleet-transaction";
import { tokenHash } from "../auth/one-time-token";
import type { FleetScope } from "../auth/scope";

/** Everyone in the fleet, by name. Addresses are for those who manage people. */
export async function listPeople(scope: FleetScope): Promise<FleetPerson[]> {
  const rows = await identityDatabase()
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      roles: memberships.roles,
      version: memberships.version,
      joinedAt: memberships.createdAt,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.fleetId, scope.fleetId))
    .orderBy(asc(users.name), asc(users.id));
  const showsEmail = can(scope.actor.roles, "people:write");
  return rows.map((row) => ({ ...row, email: showsEmail ? row.email : null, joinedAt: row.joinedAt.toISOString() }));
}

/** Invitations that can still be accepted. */
export async function listInvitations(scope: FleetScope<"people:write">): Promise<Invitation[]> {
  const rows = await identityDatabase()
    .select()
    .from(invitations)
    .where(and(eq(invitations.fleetId, scope.fleetId), gt(invitations.expiresAt, sql`now()`)))
    .orderBy(asc(invitations.createdAt));
  return rows.map(invitationOf);
}

export const invitationOf = (row: typeof invitations.$inferSelect): Invitation => ({
  id: row.id,
  email: row.email,
  roles: row.roles,
  invitedByName: row.invitedByName,
  createdAt: row.createdAt.toISOString(),
  expiresAt: row.expiresAt.toISOString(),
  sentAt: row.sentAt?.toISOString() ?? null,
});

export type PeekedInvitation = Invitation & { fleetId: string; fleetName: string; hasAccount: boolean };

/** What an invitation says, for whoever holds its link; looking does not use it up. */
export async function peekInvitation(token: string): Promise<PeekedInvitation | null> {
  const [row] = await identityDatabase()
    .select({ invitation: invitations, userId: users.id })
    .from(invitations)
    .leftJoin(users, eq(users.email, invitations.email))
    .where(and(eq(invitations.tokenHash, tokenHash(token)), gt(invitations.expiresAt, sql`now()`)));
  if (!row) return null;
  const { fleetId, fleetName } = row.invitation;
  return { ...invitationOf(row.invitation), fleetId, fleetName, hasAccount: row.userId !== null };
}

/** A person's fleets, first joined first. Their names stand behind each fleet's own wall: one look a fleet. */
export async function fleetsOf({ userId }: { userId: string }): Promise<{ id: string; name: string; roles: Role[] }[]> {
  const rows = await identityDatabase()
    .select({ id: memberships.fleetId, roles: memberships.roles })
    .from(memberships)
    .where(eq(memberships.userId, userId))
    .orderBy(asc(memberships.createdAt), asc(memberships.fleetId));
  const named = [];
  for (const row of rows) {
    const [fleet] = await inFleet(row.id, (tx) => tx.select({ name: fleets.name }).from(fleets).where(eq(fleets.id, row.id)));
    named.push({ id: row.id, name: fleet?.name ?? "", roles: row.roles });
  }
  return named;
}

/** Somebody of every fleet: work that is done for all fleets runs behind each one's wall. */
export async function memberOfEachFleet(): Promise<{ fleetId: string; userId: string }[]> {
  return identityDatabase()
    .selectDistinctOn([memberships.fleetId], { fleetId: memberships.fleetId, userId: memberships.userId })
    .from(memberships)
    .orderBy(asc(memberships.fleetId), asc(memberships.userId));
}

export async function getFleet(scope: FleetScope): Promise<Fleet> {
  const [row] = await scope.tx.select().from(fleets).where(eq(fleets.id, scope.fleetId));
  if (!row) throw Problem.notFound();
  return { ...row, createdAt: row.createdAt.toISOString() };
}
