import "server-only";
import { and, desc, eq, isNotNull } from "drizzle-orm";
import { logEntries } from "@/db/schema/log-entries";
import type { LoggedCase } from "@/lib/core/contract/logged-case";
import { caseOfLog } from "@/lib/core/diagnosis/case-of-log";
import type { FleetScope } from "@/lib/server/auth/scope";
import { plainEvents, readEventsOf } from "@/lib/server/diagnoses/stored-events";
import { documentOf, getCurrentTreeVersion } from "./queries";

/** The fleet's diagnoses that ended in a proved cure, as known cases, the newest first. */
export async function listLoggedCases(scope: FleetScope<"tree:write">, limit: number): Promise<LoggedCase[]> {
  const proved = await scope.tx
    .select({ diagnosisId: logEntries.diagnosisId })
    .from(logEntries)
    .where(
      and(
        eq(logEntries.fleetId, scope.fleetId),
        eq(logEntries.outcome, "cured"),
        isNotNull(logEntries.diagnosisId),
        isNotNull(logEntries.proof),
        isNotNull(logEntries.causeKey),
      ),
    )
    .orderBy(desc(logEntries.at), desc(logEntries.id))
    .limit(limit);
  const ids = proved.flatMap(({ diagnosisId }) => diagnosisId ?? []);
  const events = await readEventsOf(scope, ids);
  const titles = await documentOf(scope, await getCurrentTreeVersion(scope));
  return ids.flatMap((diagnosisId) => {
    const known = caseOfLog(plainEvents(events.get(diagnosisId) ?? []), titles);
    return known === null ? [] : [{ diagnosisId, known }];
  });
}
