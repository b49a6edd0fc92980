import "server-only";
import { and, desc, eq, isNull, sql } from "drizzle-orm";
import { engines, hourReadings } from "@/db/schema/boats";
import { people } from "@/db/schema/fleets";
import { logEntries } from "@/db/schema/log-entries";
import { diagnosisEvents } from "@/db/schema/diagnoses";
import type { ListedReading, Reading, ReadingChange } from "@/lib/core/contract/engine";
import type { PageQuery } from "@/lib/core/contract/page";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { readCorrections } from "@/lib/server/log/corrections";
import { pageKey, readPageKey } from "@/lib/server/web/page-key";
import { clocksOf } from "./clocks";

export type ReadingPage = { items: ListedReading[]; next: string | null };

/** A page of the readings of an engine's meter, newest first, without those that were taken back; `doubtful`: does not fit the others and is not counted. */
export async function listHourReadings(scope: FleetScope, engineId: string, query: Partial<PageQuery> = {}): Promise<ReadingPage> {
  const { limit = 50, after } = query;
  const from = readPageKey(after);
  const [engine] = await scope.tx
    .select()
    .from(engines)
    .where(and(eq(engines.fleetId, scope.fleetId), eq(engines.id, engineId)));
  if (!engine) throw Problem.notFound();
  const clock = (await clocksOf(scope, [engine])).get(engineId);
  const rows = await scope.tx
    .select({ row: hourReadings, repair: logEntries.id, event: diagnosisEvents.id })
    .from(hourReadings)
    .leftJoin(logEntries, and(eq(logEntries.fleetId, hourReadings.fleetId), eq(logEntries.id, hourReadings.id)))
    .leftJoin(diagnosisEvents, and(eq(diagnosisEvents.fleetId, hourReadings.fleetId), eq(diagnosisEvents.id, hourReadings.id)))
    .where(
      and(
        eq(hourReadings.fleetId, scope.fleetId),
        eq(hourReadings.engineId, engineId),
        isNull(hourReadings.takenBackAt),
        from && sql`(${hourReadings.readAt}, ${hourReadings.id}) < (${from.at.toISOString()}::timestamptz, ${from.id}::uuid)`,
      ),
    )
    .orderBy(desc(hourReadings.readAt), desc(hourReadings.id))
    .limit(limit + 1);
  const doubted = new Set(clock?.doubtful);
  const items = rows.slice(0, limit).map(({ row, repair, event }) => {
    const { id, reading, reset, version } = row;
    const readAt = row.readAt.toISOString();
    const doubtful = doubted.has(id);
    const partOf = repair !== null ? ("repair" as const) : event !== null ? ("diagnosis" as const) : null;
    return { id, engineId, reading, readAt, reset, hours: doubtful ? null : (clock?.at(readAt).hours ?? null), doubtful, version, partOf };
  });
  const last = rows.length > limit ? rows[limit - 1]?.row : undefined;
  return { items, next: last ? pageKey(last.readAt, last.id) : null };
}

/** A reading with all that was ever written of it; one that was taken back too. */
export async function getReading(scope: FleetScope, engineId: string, id: string): Promise<Reading> {
  const [found] = await scope.tx
    .select({ row: hourReadings, by: people.name })
    .from(hourReadings)
    .innerJoin(people, and(eq(people.fleetId, hourReadings.fleetId), eq(people.userId, hourReadings.by)))
    .where(and(eq(hourReadings.fleetId, scope.fleetId), eq(hourReadings.engineId, engineId), eq(hourReadings.id, id)));
  if (!found) throw Problem.notFound();
  const { reading, readAt, reset, version, takenBackAt } = found.row;
  return {
    ...{ id, engineId, reading, reset, version, by: found.by },
    readAt: readAt.toISOString(),
    takenBackAt: takenBackAt?.toISOString() ?? null,
    corrections: await readCorrections<ReadingChange>(scope, "reading", id),
  };
}
