import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import { engines, hourReadings } from "@/db/schema/boats";
import type { Engine, EngineChange, HourReading, NewEngine } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { getBoat } from "@/lib/server/boats/queries";
import { refuseEventId } from "@/lib/server/diagnoses/event-ids";
import { canonical } from "@/lib/server/trees/content-hash";
import { notAhead } from "@/lib/server/web/not-ahead";
import { getEngine, listEngines } from "./queries";
import { refuseRunningBack } from "./running-back";

/** Adds an engine to a boat. Sent twice it is one engine; another engine under the same id is refused. */
export async function addEngine(scope: FleetScope<"engine:write">, engine: NewEngine): Promise<Engine> {
  await getBoat(scope, engine.boatId);
  await refuseSameName(scope, engine);
  await scope.tx
    .insert(engines)
    .values({ ...engine, fleetId: scope.fleetId })
    .onConflictDoNothing();
  const there = await getEngine(scope, engine.id);
  const isOther = there.boatId !== engine.boatId || (there.version === 1 && canonical(contentOf(there)) !== canonical(contentOf(engine)));
  if (isOther) throw Problem.conflict(`Another engine, ${there.name} of ${there.boatName}, has this id already.`);
  return there;
}

const contentOf = ({ name, hasHourMeter, estimatedHoursPerYear, profile }: NewEngine) => ({
  name,
  hasHourMeter,
  estimatedHoursPerYear,
  profile,
});

/** Two engines of one name on a boat: nobody could tell which one a diagnosis is of. */
async function refuseSameName(scope: FleetScope, { id, boatId, name }: Pick<NewEngine, "id" | "boatId" | "name">): Promise<void> {
  const alike = (other: string) => other.trim().toLowerCase() === name.trim().toLowerCase();
  const other = (await listEngines(scope)).find((one) => one.id !== id && one.boatId === boatId && alike(one.name));
  if (!other) return;
  const says = `${other.boatName} has an engine called ${other.name} already. Give this one another name.`;
  throw Problem.invalid([{ path: "name", says }]);
}

/** @throws Problem 412 when somebody changed the engine since `version` */
export async function changeEngine(scope: FleetScope<"engine:write">, id: string, change: EngineChange, version: number): Promise<Engine> {
  if (change.boatId) await getBoat(scope, change.boatId);
  if (change.boatId || change.name) await refuseSameName(scope, { ...(await getEngine(scope, id)), ...change, id });
  const changed = await scope.tx
    .update(engines)
    .set({ ...change, version: sql`${engines.version} + 1` })
    .where(and(eq(engines.fleetId, scope.fleetId), eq(engines.id, id), eq(engines.version, version), isNull(engines.removedAt)))
    .returning({ id: engines.id });
  const now = await getEngine(scope, id);
  if (changed.length === 0) throw Problem.stale(now);
  return now;
}

/** Takes an engine off the lists; its log stays. */
export async function removeEngine(scope: FleetScope<"boat:remove">, id: string, version: number): Promise<void> {
  const now = await getEngine(scope, id);
  const removed = await scope.tx
    .update(engines)
    .set({ removedAt: new Date(), version: sql`${engines.version} + 1` })
    .where(and(eq(engines.fleetId, scope.fleetId), eq(engines.id, id), eq(engines.version, version)))
    .returning({ id: engines.id });
  if (removed.length === 0) throw Problem.stale(now);
}

/** Writes down what the meter shows. Sent twice it is one reading. A meter that ran back must have been replaced, and that has to be said. */
export async function addHourReading(scope: FleetScope<"engine:write">, reading: HourReading): Promise<HourReading> {
  await getEngine(scope, reading.engineId);
  const readAt = notAhead("readAt", reading.readAt);
  const [there] = await scope.tx
    .select()
    .from(hourReadings)
    .where(and(eq(hourReadings.fleetId, scope.fleetId), eq(hourReadings.id, reading.id)));
  if (there) {
    // What was corrected since then is not undone by its first form coming once more.
    if (there.version > 1 && there.engineId === reading.engineId) return reading;
    const same =
      there.engineId === reading.engineId &&
      there.reading === reading.reading &&
      there.readAt.getTime() === readAt.getTime() &&
      there.reset === reading.reset;
    if (!same) throw Problem.conflict("Another reading has this id already.");
    return reading;
  }
  await refuseEventId(scope, reading.id);
  await refuseRunningBack(scope, reading, readAt);
  await scope.tx.insert(hourReadings).values({ ...reading, readAt, fleetId: scope.fleetId, by: scope.actor.userId });
  return reading;
}
