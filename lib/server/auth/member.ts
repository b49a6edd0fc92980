import "server-only";
import { and, eq, gt, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { sessions } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";
import type { Role } from "@/lib/core/access/roles";

export type MemberKey = { readonly sessionId: string } | { readonly userId: string };

export type Member = { userId: string; name: string; email: string; roles: Role[] | null };

/** Session, person and membership as they are now, in one query; null without a live session (or person). `roles` is null for a stranger to the fleet. */
export async function findMember(who: MemberKey, fleetId: string): Promise<Member | null> {
  const db = identityDatabase();
  const columns = { userId: users.id, name: users.name, email: users.email, roles: memberships.roles };
  const inThisFleet = and(eq(memberships.userId, users.id), eq(memberships.fleetId, fleetId));
  const [row] =
    "sessionId" in who
      ? await db
          .select(columns)
          .from(sessions)
          .innerJoin(users, eq(users.id, sessions.userId))
          .leftJoin(memberships, inThisFleet)
          .where(and(eq(sessions.id, who.sessionId), gt(sessions.expiresAt, sql`now()`)))
      : await db.select(columns).from(users).leftJoin(memberships, inThisFleet).where(eq(users.id, who.userId));
  return row ?? null;
}
