import "server-only";
import { headers } from "next/headers";
import { notFound, redirect } from "next/navigation";
import { cache } from "react";
import type { Permission } from "@/lib/core/access/permissions";
import { Id } from "@/lib/core/contract/id";
import { Problem } from "@/lib/core/contract/problem";
import { findPerson, type Person } from "../auth/person";
import { prove, type FleetScope } from "../auth/scope";
import { sessionIdOf } from "../auth/session-cookie";

/** The person who asks for this page, read once however many components ask; null when signed out. */
export const pagePerson = cache(async (): Promise<Person | null> => {
  const sessionId = await sessionIdOf(await headers());
  return sessionId ? findPerson(sessionId) : null;
});

/** The same for a page that is for people who are signed in: others are led to sign in and back to `here`. */
export async function signedInPerson(here: string): Promise<Person> {
  const person = await pagePerson();
  if (!person) redirect(`/sign-in?next=${encodeURIComponent(here)}`);
  return person;
}

/**
 * Runs a page's queries in a fleet, in one transaction: `pageScope("fleet:read", fleetId, (scope) => listBoats(scope))`.
 * Strangers, and members who may not, see "not found"; somebody signed out is led to sign in.
 */
export async function pageScope<P extends Permission, T>(
  permission: P,
  fleetId: string,
  run: (scope: FleetScope<P>) => Promise<T>,
): Promise<T> {
  if (!Id.safeParse(fleetId).success) notFound();
  const person = await signedInPerson(`/f/${fleetId}`);
  try {
    return await (await prove(person, fleetId, permission)).enter(run);
  } catch (error) {
    if (error instanceof Problem && [403, 404, 422].includes(error.status)) notFound();
    throw error;
  }
}
