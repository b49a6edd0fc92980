import "server-only";
import { and, eq, inArray, isNotNull, isNull, or } from "drizzle-orm";
import { boats, engines } from "@/db/schema/boats";
import { people } from "@/db/schema/fleets";
import { logEntries } from "@/db/schema/log-entries";
import type { LogEntry } from "@/lib/core/contract/log";
import type { EngineClock } from "@/lib/core/recurrence/engine-clock";
import type { CaseEntry } from "@/lib/core/recurrence/spells";
import { standings } from "@/lib/core/recurrence/standing";
import type { FleetScope } from "@/lib/server/auth/scope";
import { clocksOf, hoursNow, type EngineRow } from "@/lib/server/engines/clocks";

type EntryRow = typeof logEntries.$inferSelect;
export type LineRow = { entry: EntryRow; engineName: string; boatName: string; by: string };

/** Rows of the log with the names that stand beside them; the caller narrows, orders and limits. */
export const selectLines = (scope: FleetScope) =>
  scope.tx
    .select({ entry: logEntries, engineName: engines.name, boatName: boats.name, by: people.name })
    .from(logEntries)
    .innerJoin(engines, and(eq(engines.fleetId, logEntries.fleetId), eq(engines.id, logEntries.engineId)))
    .innerJoin(boats, and(eq(boats.fleetId, engines.fleetId), eq(boats.id, engines.boatId)))
    .innerJoin(people, and(eq(people.fleetId, logEntries.fleetId), eq(people.userId, logEntries.by)))
    .$dynamic();

/** Rows as lines of the log: with hours since new, and what became of each cure. */
export async function linesOf(scope: FleetScope, rows: readonly LineRow[]): Promise<LogEntry[]> {
  const history = await readHistory(scope, { engineIds: distinct(rows.map((row) => row.entry.engineId)), causes: causesOn(rows) });
  const became = standings(history.cases, history.hoursNow);
  return rows.map(({ entry, engineName, boatName, by }) => {
    const { hours, estimated } = hoursOf(entry, history.clocks.get(entry.engineId));
    const standing = became.get(entry.id) ?? { cameBackAfterHours: null, heldHours: null, timesHere: 0 };
    return {
      id: entry.id,
      engineId: entry.engineId,
      engineName,
      boatName,
      diagnosisId: entry.diagnosisId,
      at: entry.at.toISOString(),
      engineHours: hours,
      hoursAreEstimated: estimated,
      symptoms: entry.symptoms,
      outcome: entry.outcome,
      cause: causeOf(entry),
      remedy: entry.remedyTitle === null ? null : { key: entry.remedyKey, title: entry.remedyTitle },
      proof: entry.proof,
      temporary: entry.temporary,
      minutes: entry.minutes,
      parts: entry.parts,
      note: entry.note,
      by,
      ...standing,
      ...(entry.diagnosisId === null ? { version: entry.version } : {}),
    };
  });
}

const distinct = <T>(list: readonly T[]): T[] => [...new Set(list)];

/** The causes that these lines speak of: what became of each hangs on the other cases of its own cause alone. */
function causesOn(rows: readonly LineRow[]): Causes {
  const named = rows.filter(({ entry }) => entry.causeTitle !== null);
  return {
    keys: distinct(named.flatMap(({ entry }) => entry.causeKey ?? [])),
    inWords: named.some(({ entry }) => entry.causeKey === null),
  };
}

export type History = {
  engines: readonly EngineRow[];
  cases: CaseEntry[];
  clocks: Map<string, EngineClock>;
  hoursNow: (engineId: string) => number | null;
};

/** `inWords`: a cause that only words name is among them; which key it stands for, all others may decide. */
export type Causes = { keys: readonly string[]; inWords: boolean };

type Wanted = { engineIds?: readonly string[] | undefined; causes?: Causes };

/**
 * The cases that repeat faults hang on, with the engines' clocks: of these engines (of all of the fleet when none are
 * named) and of these causes (of all when none are named). What names no cause, or is still open, is no case and is not read.
 */
export async function readHistory(scope: FleetScope, { engineIds, causes }: Wanted): Promise<History> {
  if (engineIds?.length === 0) return { engines: [], cases: [], clocks: new Map(), hoursNow: () => null };
  const ofThese = engineIds && inArray(engines.id, [...engineIds]);
  const rows = await scope.tx
    .select()
    .from(engines)
    .where(and(eq(engines.fleetId, scope.fleetId), ofThese));
  const clocks = await clocksOf(scope, rows);
  const { id, engineId, at, outcome, causeKey, causeTitle, causeSystem, proof, temporary, engineHours } = logEntries;
  const entries = await scope.tx
    .select({ id, engineId, at, outcome, causeKey, causeTitle, causeSystem, proof, temporary, engineHours })
    .from(logEntries)
    .where(
      and(
        eq(logEntries.fleetId, scope.fleetId),
        isNull(logEntries.takenBackAt),
        isNotNull(logEntries.causeTitle),
        isNotNull(logEntries.outcome),
        engineIds && inArray(logEntries.engineId, [...engineIds]),
        // A cause in words may be one of those with a key under its title.
        causes && !causes.inWords ? or(inArray(logEntries.causeKey, [...causes.keys]), isNull(logEntries.causeKey)) : undefined,
      ),
    );
  const byId = new Map<string, EngineRow>(rows.map((row) => [row.id, row]));
  return {
    engines: rows,
    clocks,
    hoursNow: (engineId) => {
      const [engine, clock] = [byId.get(engineId), clocks.get(engineId)];
      return engine && clock ? hoursNow(engine, clock) : null;
    },
    cases: entries.map((entry) => {
      const { hours, estimated } = hoursOf(entry, clocks.get(entry.engineId));
      return {
        id: entry.id,
        engineId: entry.engineId,
        at: entry.at.toISOString(),
        engineHours: hours,
        hoursAreEstimated: estimated,
        outcome: entry.outcome,
        cause: causeOf(entry),
        proof: entry.proof,
        temporary: entry.temporary,
      };
    }),
  };
}

const hoursOf = (entry: Pick<EntryRow, "at">, clock: EngineClock | undefined) =>
  clock?.at(entry.at.toISOString()) ?? { hours: null, estimated: false };

/** The cause that a line names. */
export function causeOf(entry: Pick<EntryRow, "causeKey" | "causeTitle" | "causeSystem">): LogEntry["cause"] {
  return entry.causeTitle === null ? null : { key: entry.causeKey, title: entry.causeTitle, system: entry.causeSystem };
}
