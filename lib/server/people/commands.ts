import "server-only";
import { and, eq, sql } from "drizzle-orm";
import { identityDatabase, type Transaction } from "@/db/client";
import { fleets, people } from "@/db/schema/fleets";
import { invitations, memberships } from "@/db/schema/memberships";
import type { Role } from "@/lib/core/access/roles";
import type { Fleet, FleetPerson } from "@/lib/core/contract/people";
import { Problem } from "@/lib/core/contract/problem";
import { inFleet } from "../auth/fleet-transaction";
import type { Person } from "../auth/person";
import type { FleetScope } from "../auth/scope";
import { endSessionsOf } from "../auth/sessions";
import { getFleet, listPeople } from "./queries";

type Membership = typeof memberships.$inferSelect;

/** All memberships of a fleet, held until the transaction ends: of two owners who remove each other at once, one is second. */
const lockMembers = (tx: Transaction, fleetId: string): Promise<Membership[]> =>
  tx.select().from(memberships).where(eq(memberships.fleetId, fleetId)).orderBy(memberships.userId).for("update");

/** A fleet without an owner could never be managed again. */
function keepAnOwner(members: readonly Membership[], userId: string): void {
  if (!members.some((m) => m.userId !== userId && m.roles.includes("owner"))) {
    throw Problem.conflict("This is the fleet's last owner. Make somebody else an owner first.");
  }
}

/** Whoever manages people no longer must leave no way back in, for themselves or for others. */
async function withdrawInvitationsOf(tx: Transaction, fleetId: string, userId: string): Promise<void> {
  await tx.delete(invitations).where(and(eq(invitations.fleetId, fleetId), eq(invitations.invitedBy, userId)));
}

async function getPerson(scope: FleetScope, userId: string): Promise<FleetPerson> {
  const person = (await listPeople(scope)).find((p) => p.userId === userId);
  if (!person) throw Problem.notFound("That person is not in this fleet.");
  return person;
}

/** Holds from the person's next request on: roles are read each time. */
export async function changeRoles(
  scope: FleetScope<"people:write">,
  userId: string,
  roles: readonly Role[],
  version: number,
): Promise<FleetPerson> {
  const seen = await getPerson(scope, userId);
  await identityDatabase().transaction(async (tx) => {
    const members = await lockMembers(tx, scope.fleetId);
    const member = members.find((m) => m.userId === userId);
    if (!member) throw Problem.notFound("That person is not in this fleet.");
    if (member.version !== version) throw Problem.stale({ ...seen, roles: member.roles, version: member.version });
    if (!roles.includes("owner")) {
      keepAnOwner(members, userId);
      await withdrawInvitationsOf(tx, scope.fleetId, userId);
    }
    await tx
      .update(memberships)
      .set({ roles: [...roles], version: sql`${memberships.version} + 1` })
      .where(and(eq(memberships.fleetId, scope.fleetId), eq(memberships.userId, userId)));
  });
  return getPerson(scope, userId);
}

/** Takes a person out of the fleet and signs them out everywhere. What they wrote stays, under their name. */
export async function removePerson(scope: FleetScope<"people:write">, userId: string, version: number): Promise<void> {
  const seen = await getPerson(scope, userId);
  await identityDatabase().transaction(async (tx) => {
    const member = await endMembership(tx, scope.fleetId, userId);
    if (member.version !== version) throw Problem.stale({ ...seen, roles: member.roles, version: member.version });
    await endSessionsOf(userId, null, tx);
  });
  await writeLeft(scope.tx, scope.fleetId, userId);
}

/** A person leaves by their own will; they stay signed in for their other fleets. */
export async function leaveFleet(person: Person, fleetId: string): Promise<void> {
  await identityDatabase().transaction((tx) => endMembership(tx, fleetId, person.userId));
  await inFleet(fleetId, (tx) => writeLeft(tx, fleetId, person.userId));
}

async function endMembership(tx: Transaction, fleetId: string, userId: string): Promise<Membership> {
  const members = await lockMembers(tx, fleetId);
  const member = members.find((m) => m.userId === userId);
  if (!member) throw Problem.notFound("That person is not in this fleet.");
  keepAnOwner(members, userId);
  await tx.delete(memberships).where(and(eq(memberships.fleetId, fleetId), eq(memberships.userId, userId)));
  await withdrawInvitationsOf(tx, fleetId, userId);
  return member;
}

async function writeLeft(tx: Transaction, fleetId: string, userId: string): Promise<void> {
  await tx
    .update(people)
    .set({ leftAt: sql`now()` })
    .where(and(eq(people.fleetId, fleetId), eq(people.userId, userId)));
}

export async function renameFleet(scope: FleetScope<"fleet:write">, name: string, version: number): Promise<Fleet> {
  const changed = await scope.tx
    .update(fleets)
    .set({ name, version: sql`${fleets.version} + 1` })
    .where(and(eq(fleets.id, scope.fleetId), eq(fleets.version, version)))
    .returning({ id: fleets.id });
  if (changed.length === 0) throw Problem.stale(await getFleet(scope));
  return getFleet(scope);
}
