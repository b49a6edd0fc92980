import "server-only";
import { eq } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { identityDatabase, type Database, type Transaction } from "@/db/client";
import { fleets, people } from "@/db/schema/fleets";
import { memberships } from "@/db/schema/memberships";
import { ROLES, type Role } from "@/lib/core/access/roles";
import { inFleet } from "../auth/fleet-transaction";
import type { Person } from "../auth/person";
import { fleetsOf } from "./queries";

type Newcomer = { userId: string; name: string };

/**
 * Starts a fleet with its first member, who is owner, skipper and mechanic. The fleet stands on the far side of the wall
 * between the two roles, so it is made first; where `join` fails it is taken away again.
 */
export async function startFleet(name: string, first: Newcomer, join: (fleetId: string) => Promise<void>): Promise<string> {
  const fleetId = uuidv7();
  await inFleet(fleetId, async (tx) => {
    await tx.insert(fleets).values({ id: fleetId, name });
    await tx.insert(people).values({ fleetId, userId: first.userId, name: first.name });
  });
  try {
    await join(fleetId);
  } catch (error) {
    await inFleet(fleetId, (tx) => tx.delete(fleets).where(eq(fleets.id, fleetId)));
    throw error;
  }
  return fleetId;
}

/** A fleet for somebody who has an account and is in none: removed from their last one, or never in any. null where they are in one. */
export async function startFleetAfresh(person: Person, name: string): Promise<string | null> {
  if ((await fleetsOf(person)).length > 0) return null;
  return startFleet(name, person, (fleetId) => joinAsFirst(identityDatabase(), fleetId, person.userId));
}

/** The membership that makes somebody owner, skipper and mechanic of a fleet just started. */
export async function joinAsFirst(on: Database | Transaction, fleetId: string, userId: string): Promise<void> {
  await on.insert(memberships).values({ fleetId, userId, roles: [...ROLES] });
}

/** Puts a person's card into the fleet; the fleet's log refers to it. One who comes back gets the old card. */
async function writeCard(fleetId: string, { userId, name }: Newcomer): Promise<void> {
  await inFleet(fleetId, (tx) =>
    tx
      .insert(people)
      .values({ fleetId, userId, name })
      .onConflictDoUpdate({ target: [people.fleetId, people.userId], set: { name, leftAt: null } }),
  );
}

/** Somebody joins a fleet with these roles: what accepting an invitation does, and loading the demo fleet. */
export async function addMember(
  fleetId: string,
  person: Newcomer,
  roles: readonly Role[],
  on: Database | Transaction = identityDatabase(),
): Promise<void> {
  await writeCard(fleetId, person);
  await on
    .insert(memberships)
    .values({ fleetId, userId: person.userId, roles: [...roles] })
    .onConflictDoNothing();
}
