import "server-only";
import { and, asc, eq, isNull } from "drizzle-orm";
import { boats, engines } from "@/db/schema/boats";
import type { Engine } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import type { EngineClock } from "@/lib/core/recurrence/engine-clock";
import type { FleetScope } from "@/lib/server/auth/scope";
import { clocksOf, hoursNow, type EngineRow } from "./clocks";

/** The fleet's engines by boat and name, without those that were removed. */
export async function listEngines(scope: FleetScope): Promise<Engine[]> {
  return enginesWhere(scope, isNull(engines.removedAt));
}

/** An engine that is still there. */
export async function getEngine(scope: FleetScope, id: string): Promise<Engine> {
  const [engine] = await enginesWhere(scope, and(eq(engines.id, id), isNull(engines.removedAt)));
  if (!engine) throw Problem.notFound();
  return engine;
}

async function enginesWhere(scope: FleetScope, condition: ReturnType<typeof and>): Promise<Engine[]> {
  const rows = await scope.tx
    .select({ engine: engines, boatName: boats.name })
    .from(engines)
    .innerJoin(boats, and(eq(boats.fleetId, engines.fleetId), eq(boats.id, engines.boatId)))
    .where(and(eq(engines.fleetId, scope.fleetId), condition))
    .orderBy(asc(boats.name), asc(engines.name), asc(engines.id));
  const clocks = await clocksOf(
    scope,
    rows.map((row) => row.engine),
  );
  return rows.flatMap(({ engine, boatName }) => {
    const clock = clocks.get(engine.id);
    return clock ? [engineOf(engine, boatName, clock)] : [];
  });
}

function engineOf(row: EngineRow, boatName: string, clock: EngineClock): Engine {
  const sinceNew = hoursNow(row, clock);
  return {
    id: row.id,
    boatId: row.boatId,
    boatName,
    name: row.name,
    hasHourMeter: row.hasHourMeter,
    ...(row.estimatedHoursPerYear === null ? {} : { estimatedHoursPerYear: row.estimatedHoursPerYear }),
    profile: row.profile,
    version: row.version,
    createdAt: row.createdAt.toISOString(),
    hours: row.hasHourMeter ? (clock.latest?.reading ?? null) : sinceNew,
    hoursSinceNew: sinceNew,
    hoursAreEstimated: !row.hasHourMeter,
    hoursReadAt: clock.latest?.readAt ?? null,
  };
}
