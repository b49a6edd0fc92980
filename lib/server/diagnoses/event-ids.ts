import "server-only";
import { and, eq } from "drizzle-orm";
import { diagnosisEvents } from "@/db/schema/diagnoses";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";

/** For what shares its ids with events: a reading of the meter under an event's id would come and go with that event. @throws Problem 409 */
export async function refuseEventId(scope: FleetScope, id: string): Promise<void> {
  const [event] = await scope.tx
    .select({ id: diagnosisEvents.id })
    .from(diagnosisEvents)
    .where(and(eq(diagnosisEvents.fleetId, scope.fleetId), eq(diagnosisEvents.id, id)));
  if (event) throw Problem.conflict("An entry of a diagnosis has this id already.");
}
