import "server-only";
import type { Transaction } from "@/db/client";
import { can, type Permission } from "@/lib/core/access/permissions";
import type { Role } from "@/lib/core/access/roles";
import { Problem } from "@/lib/core/contract/problem";
import { inFleet } from "./fleet-transaction";
import { findMember, type MemberKey } from "./member";

export type Actor = { readonly userId: string; readonly name: string; readonly email: string; readonly roles: readonly Role[] };

declare const proved: unique symbol;

/**
 * Proof that somebody may do P in a fleet, with the open transaction behind that fleet's wall. Made here only. A
 * command asks for the permission it needs, `FleetScope<"diagnosis:write">`; a query that any member may make asks for
 * `FleetScope`.
 */
export type FleetScope<P extends Permission = Permission> = {
  readonly fleetId: string;
  readonly actor: Actor;
  readonly tx: Transaction;
  readonly [proved]: P;
};

/** A permission proved, before a transaction is opened for it: a slow upload is read in between. */
export type Pass<P extends Permission> = { enter<T>(run: (scope: FleetScope<P>) => Promise<T>): Promise<T> };

/**
 * Proves that somebody may do `permission` in a fleet: a session that has ended is 401, a stranger to the fleet 404, a
 * member without the permission 403. `who` by user id is for jobs and for loading the demo fleet, with no session behind.
 */
export async function prove<P extends Permission>(who: MemberKey, fleetId: string, permission: P): Promise<Pass<P>> {
  const member = await findMember(who, fleetId);
  if (!member) throw Problem.signedOut();
  const { roles } = member;
  if (!roles) throw Problem.notFound();
  if (!can(roles, permission)) throw Problem.notAllowed();
  const actor: Actor = { userId: member.userId, name: member.name, email: member.email, roles };
  return { enter: (run) => inFleet(fleetId, (tx) => run({ fleetId, actor, tx } as FleetScope<P>)) };
}

/** Proves, then runs in one transaction. */
export async function withScope<P extends Permission, T>(
  who: MemberKey,
  fleetId: string,
  permission: P,
  run: (scope: FleetScope<P>) => Promise<T>,
): Promise<T> {
  return (await prove(who, fleetId, permission)).enter(run);
}

/** A second permission, for a command that does more for those who may: 403 for those who may not. */
export function demand<P extends Permission>(scope: FleetScope, permission: P): FleetScope<P> {
  if (!can(scope.actor.roles, permission)) throw Problem.notAllowed();
  return scope as FleetScope<P>;
}
