import { encode } from "next-auth/jwt";
import { identityDatabase } from "@/db/client";
import { fleets, people } from "@/db/schema/fleets";
import { memberships } from "@/db/schema/memberships";
import { sessions } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";
import type { Role } from "@/lib/core/access/roles";
import { inFleet } from "@/lib/server/auth/fleet-transaction";

export type TestPerson = { userId: string; name: string; email: string; sessionId: string };

/** A person with a live session. No password: tests of passwords give one by the command that people use. */
export async function addPerson({ name }: { name: string }): Promise<TestPerson> {
  const userId = crypto.randomUUID();
  const email = `${name.toLowerCase().replace(/[^a-z]+/g, "-")}-${userId.slice(0, 8)}@example.test`;
  await identityDatabase().insert(users).values({ id: userId, name, email });
  return { userId, name, email, sessionId: await addSession(userId) };
}

export async function addSession(userId: string): Promise<string> {
  const id = crypto.randomUUID();
  await identityDatabase()
    .insert(sessions)
    .values({ id, userId, device: "a test", expiresAt: new Date(Date.now() + 3_600_000) });
  return id;
}

/** A fleet with its first member: owner, skipper and mechanic unless said otherwise. */
export async function addFleet(name: string, person: TestPerson, roles: Role[] = ["owner", "skipper", "mechanic"]): Promise<string> {
  const fleetId = crypto.randomUUID();
  await inFleet(fleetId, (tx) => tx.insert(fleets).values({ id: fleetId, name }));
  await addMember(fleetId, person, roles);
  return fleetId;
}

export async function addMember(fleetId: string, person: TestPerson, roles: Role[]): Promise<void> {
  await identityDatabase().insert(memberships).values({ fleetId, userId: person.userId, roles });
  await inFleet(fleetId, (tx) => tx.insert(people).values({ fleetId, userId: person.userId, name: person.name }));
}

/** The Cookie header of a person's session, signed as the site signs it. */
export async function cookieOf({ sessionId }: { sessionId: string }): Promise<string> {
  const name = "authjs.session-token";
  return `${name}=${await encode({ token: { sid: sessionId }, secret: process.env.AUTH_SECRET ?? "", salt: name })}`;
}
