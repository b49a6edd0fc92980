import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import { boats, engines } from "@/db/schema/boats";
import type { Boat, BoatChange, NewBoat } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { getBoat } from "./queries";

/** Adds a boat. Sent twice it is one boat; another boat under the same id is refused. */
export async function addBoat(scope: FleetScope<"boat:write">, boat: NewBoat): Promise<Boat> {
  await scope.tx
    .insert(boats)
    .values({ ...boat, fleetId: scope.fleetId })
    .onConflictDoNothing();
  const there = await getBoat(scope, boat.id);
  if (there.version === 1 && there.name !== boat.name) throw Problem.conflict(`Another boat, ${there.name}, has this id already.`);
  return there;
}

/** @throws Problem 412 when somebody changed the boat since `version` */
export async function changeBoat(scope: FleetScope<"boat:write">, id: string, change: BoatChange, version: number): Promise<Boat> {
  const changed = await scope.tx
    .update(boats)
    .set({ ...change, version: sql`${boats.version} + 1` })
    .where(and(eq(boats.fleetId, scope.fleetId), eq(boats.id, id), eq(boats.version, version), isNull(boats.removedAt)))
    .returning({ id: boats.id });
  const now = await getBoat(scope, id);
  if (changed.length === 0) throw Problem.stale(now);
  return now;
}

/** Takes a boat and its engines off the lists; what was logged stays. */
export async function removeBoat(scope: FleetScope<"boat:remove">, id: string, version: number): Promise<void> {
  const now = await getBoat(scope, id);
  const gone = { removedAt: new Date() };
  const removed = await scope.tx
    .update(boats)
    .set({ ...gone, version: sql`${boats.version} + 1` })
    .where(and(eq(boats.fleetId, scope.fleetId), eq(boats.id, id), eq(boats.version, version)))
    .returning({ id: boats.id });
  if (removed.length === 0) throw Problem.stale(now);
  await scope.tx
    .update(engines)
    .set(gone)
    .where(and(eq(engines.fleetId, scope.fleetId), eq(engines.boatId, id), isNull(engines.removedAt)));
}
