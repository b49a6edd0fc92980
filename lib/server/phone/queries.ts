import "server-only";
import type { LogEntry } from "@/lib/core/contract/log";
import type { OpenDiagnosis, Phone } from "@/lib/core/contract/phone";
import { multipliersFor } from "@/lib/core/diagnosis/odds-of-this-engine";
import type { FleetScope } from "@/lib/server/auth/scope";
import { listBoats } from "@/lib/server/boats/queries";
import { listDiagnoses } from "@/lib/server/diagnoses/queries";
import { plainEvents, readEventsOf } from "@/lib/server/diagnoses/stored-events";
import { listEngines } from "@/lib/server/engines/queries";
import { listLog } from "@/lib/server/log/queries";
import { getFleet } from "@/lib/server/people/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";

/** Years of a small fleet's log; an engine's odds and "this has been here before" hang on it. */
const LOG_LINES = 200;
const OPEN_DIAGNOSES = 50;

/** Everything that the skipper's path needs of a fleet to go on without a network, but the tree's document, which never changes and is fetched once. */
export async function readPhone(scope: FleetScope): Promise<Phone> {
  const fleet = await getFleet(scope);
  const engines = await listEngines(scope);
  const recentLog = (await listLog(scope, { limit: LOG_LINES })).items;
  const version = await getCurrentTreeVersion(scope);
  const tree = await documentOf(scope, version);
  const logOf = (engineId: string): LogEntry[] => recentLog.filter((entry) => entry.engineId === engineId);
  return {
    fleet: { id: fleet.id, name: fleet.name },
    roles: [...scope.actor.roles],
    boats: await listBoats(scope),
    engines,
    openDiagnoses: await readOpenDiagnoses(scope),
    recentLog,
    treeVersion: { id: version.id, hash: version.hash, number: version.number, publishedAt: version.publishedAt },
    multipliers: Object.fromEntries(
      engines.map((engine) => [
        engine.id,
        multipliersFor(tree, logOf(engine.id), {
          now: { at: new Date().toISOString(), hours: engine.hoursSinceNew },
          fleet: recentLog.filter((entry) => entry.engineId !== engine.id),
        }),
      ]),
    ),
  };
}

async function readOpenDiagnoses(scope: FleetScope): Promise<OpenDiagnosis[]> {
  const { items } = await listDiagnoses(scope, { open: "yes", limit: OPEN_DIAGNOSES });
  const events = await readEventsOf(
    scope,
    items.map((diagnosis) => diagnosis.id),
  );
  return items.map(({ id, engineId, treeVersionId }) => ({ id, engineId, treeVersionId, events: plainEvents(events.get(id) ?? []) }));
}
