import "server-only";
import { and, desc, eq, sql } from "drizzle-orm";
import { engines } from "@/db/schema/boats";
import { logEntries } from "@/db/schema/log-entries";
import type { LogEntry, LogQuery, RepeatFault } from "@/lib/core/contract/log";
import { Problem } from "@/lib/core/contract/problem";
import { cameBack } from "@/lib/core/recurrence/came-back";
import { upstreamIn } from "@/lib/core/recurrence/upstream";
import type { FleetScope } from "@/lib/server/auth/scope";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { linesOf, readHistory, selectLines } from "./lines";
import { pageKey, readPageKey } from "./page-key";

export type LogPage = { items: LogEntry[]; next: string | null };

/** A page of the log, newest first: outcomes of diagnoses, open diagnoses, and repairs written in without one. */
export async function listLog(scope: FleetScope, query: Partial<LogQuery> = {}): Promise<LogPage> {
  const { limit = 50, after } = query;
  const from = after === undefined ? undefined : readPageKey(after);
  if (from === null) throw Problem.invalid([{ path: "after", says: "This is not the next of a page." }]);
  const rows = await selectLines(scope)
    .where(
      and(
        eq(logEntries.fleetId, scope.fleetId),
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
  const rows = await selectLines(scope).where(and(eq(logEntries.fleetId, scope.fleetId), eq(logEntries.id, id)));
  const [line] = await linesOf(scope, rows);
  if (!line) throw Problem.notFound();
  return line;
}

/** The faults that came back, on one engine or on any of the fleet; what lies upstream as the fleet's present tree says it. */
export async function listRepeats(scope: FleetScope, engineId?: string): Promise<RepeatFault[]> {
  const { cases } = await readHistory(scope, engineId === undefined ? undefined : [engineId]);
  const tree = await documentOf(scope, await getCurrentTreeVersion(scope));
  return cameBack(cases, upstreamIn(tree));
}
