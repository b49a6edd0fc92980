import "server-only";
import { and, asc, eq } from "drizzle-orm";
import { corrections } from "@/db/schema/corrections";
import { people } from "@/db/schema/fleets";
import type { CorrectedKind } from "@/lib/core/contract/correction";
import type { FleetScope } from "@/lib/server/auth/scope";

type PutAside = { kind: CorrectedKind; subjectId: string; version: number; was: Record<string, unknown>; takenBack: boolean };

/** Keeps what a line said, before it says something else or nothing. */
export async function putAside(scope: FleetScope<"log:write" | "engine:write">, line: PutAside): Promise<void> {
  await scope.tx.insert(corrections).values({ ...line, fleetId: scope.fleetId, by: scope.actor.userId });
}

/** All that a line said before, oldest first. `W`: the shape in which its kind is put aside. */
export async function readCorrections<W>(scope: FleetScope, kind: CorrectedKind, subjectId: string) {
  const rows = await scope.tx
    .select({ correction: corrections, by: people.name })
    .from(corrections)
    .innerJoin(people, and(eq(people.fleetId, corrections.fleetId), eq(people.userId, corrections.by)))
    .where(and(eq(corrections.fleetId, scope.fleetId), eq(corrections.kind, kind), eq(corrections.subjectId, subjectId)))
    .orderBy(asc(corrections.version));
  return rows.map(({ correction, by }) => ({
    version: correction.version,
    was: correction.was as W,
    takenBack: correction.takenBack,
    at: correction.at.toISOString(),
    by,
    byId: correction.by,
  }));
}
