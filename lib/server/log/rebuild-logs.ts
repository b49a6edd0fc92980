import "server-only";
import { asc, eq } from "drizzle-orm";
import { diagnoses } from "@/db/schema/diagnoses";
import { withScope, type FleetScope } from "@/lib/server/auth/scope";
import { memberOfEachFleet } from "@/lib/server/people/queries";
import { projectDiagnosis } from "./project-diagnosis";

/**
 * Works out every diagnosis' line of every fleet's log anew from its events, as after a mend of the fold: a fleet at a
 * time, each in a transaction of its own, so that it can be broken off and begun again. Repairs that people wrote in
 * stay as they are.
 */
export async function rebuildLogs(): Promise<{ fleets: number; diagnoses: number }> {
  const members = await memberOfEachFleet();
  let done = 0;
  for (const { fleetId, userId } of members) done += await withScope({ userId }, fleetId, "log:write", rebuildLog);
  return { fleets: members.length, diagnoses: done };
}

/** The log of one fleet; gives the number of its diagnoses. */
export async function rebuildLog(scope: FleetScope<"log:write">): Promise<number> {
  const rows = await scope.tx
    .select({ id: diagnoses.id })
    .from(diagnoses)
    .where(eq(diagnoses.fleetId, scope.fleetId))
    .orderBy(asc(diagnoses.id));
  for (const { id } of rows) await projectDiagnosis(scope, id);
  return rows.length;
}
