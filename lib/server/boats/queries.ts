import "server-only";
import { and, asc, eq, isNull } from "drizzle-orm";
import { boats } from "@/db/schema/boats";
import type { Boat } from "@/lib/core/contract/engine";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";

type Row = typeof boats.$inferSelect;

/** The fleet's boats by name, without those that were removed. */
export async function listBoats(scope: FleetScope): Promise<Boat[]> {
  const rows = await scope.tx
    .select()
    .from(boats)
    .where(and(eq(boats.fleetId, scope.fleetId), isNull(boats.removedAt)))
    .orderBy(asc(boats.name), asc(boats.id));
  return rows.map(boatOf);
}

export async function getBoat(scope: FleetScope, id: string): Promise<Boat> {
  const [row] = await scope.tx
    .select()
    .from(boats)
    .where(and(eq(boats.fleetId, scope.fleetId), eq(boats.id, id), isNull(boats.removedAt)));
  if (!row) throw Problem.notFound();
  return boatOf(row);
}

function boatOf(row: Row): Boat {
  return { id: row.id, name: row.name, callMinutes: row.callMinutes, version: row.version, createdAt: row.createdAt.toISOString() };
}
