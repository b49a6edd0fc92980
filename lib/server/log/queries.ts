import "server-only";
import { and, desc, eq, isNotNull, isNull, or, sql } from "drizzle-orm";
import { engines } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { LogEntry, LogQuery, RepeatFault } from "@/lib/core/contract/log";
import { Problem } from "@/lib/core/contract/problem";
import { cameBack } from "@/lib/core/recurrence/came-back";
import { upstreamIn } from "@/lib/core/recurrence/upstream";
import type { FleetScope } from "@/lib/server/auth/scope";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageKey, readPageKey } from "@/lib/server/web/page-key";
import { linesOf, readHistory, selectLines, type Causes } from "./lines";

export type LogPage = { items: LogEntry[]; next: string | null };

/** A page of the log, newest first: outcomes of diagnoses, open diagnoses, and repairs written in without one. */
export async function listLog(scope: FleetScope, query: Partial<LogQuery> = {}): Promise<LogPage> {
  const { limit = 50, after } = query;
  const from = readPageKey(after);
  const rows = await selectLines(scope)
    .where(
      and(
        eq(logEntries.fleetId, scope.fleetId),
        isNull(logEntries.takenBackAt),
        query.engineId ? eq(logEntries.engineId, query.engineId) : undefined,
        query.boatId ? eq(engines.boatId, query.boatId) : undefined,
        query.cause ? eq(logEntries.causeKey, query.cause) : undefined,
        query.system ? eq(logEntries.causeSystem, query.system) : undefined,
        query.outcome === "open" ? sql`${logEntries.outcome} is null` : query.outcome ? eq(logEntries.outcome, query.outcome) : undefined,
        from && sql`(${logEntries.at}, ${logEntries.id}) < (${from.at.toISOString()}::timestamptz, ${from.id}::uuid)`,
      ),
    )
    .orderBy(desc(logEntries.at), desc(logEntries.id))
    .limit(limit + 1);
  const page = rows.slice(0, limit);
  const last = rows.length > limit ? page.at(-1)?.entry : undefined;
  return { items: await linesOf(scope, page), next: last ? pageKey(last.at, last.id) : null };
}

export async function getLogEntry(scope: FleetScope, id: string): Promise<LogEntry> {
  const rows = await selectLines(scope).where(
    and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, id), isNull(logEntries.takenBackAt)),
  );
  const [line] = await linesOf(scope, rows);
  if (!line) throw Problem.notFound();
  return line;
}

/** The faults that came back, on one engine or on any of the fleet; what lies upstream as the fleet's present tree says it. */
export async function listRepeats(scope: FleetScope, engineId?: string): Promise<RepeatFault[]> {
  const { cases } = await readHistory(scope, {
    engineIds: engineId === undefined ? undefined : [engineId],
    causes: await repeatedCauses(scope, engineId),
  });
  const tree = await documentOf(scope, await getCurrentTreeVersion(scope));
  return cameBack(cases, upstreamIn(tree));
}

/** The causes that have come more than once on an engine: what has come once cannot have come back, and is not read. */
export async function repeatedCauses(scope: FleetScope, engineId: string | undefined): Promise<Causes> {
  const { fleetId, causeKey, causeTitle, takenBackAt } = logEntries;
  const cases = and(
    eq(fleetId, scope.fleetId),
    engineId === undefined ? undefined : eq(logEntries.engineId, engineId),
    isNull(takenBackAt),
    isNotNull(causeTitle),
    isNotNull(logEntries.outcome),
  );
  const rows = await scope.tx
    .select({ engineId: logEntries.engineId, causeKey })
    .from(logEntries)
    .where(cases)
    .groupBy(logEntries.engineId, causeKey)
    .having(or(sql`count(*) > 1`, isNull(causeKey)));
  const keys = rows.flatMap((row) => row.causeKey ?? []);
  return { keys: [...new Set(keys)], inWords: rows.some((row) => row.causeKey === null) };
}
