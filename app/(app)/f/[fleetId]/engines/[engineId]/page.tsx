import type { Metadata } from "next";
import { cache } from "react";
import { AlongTheMeter } from "@/components/engine/along-the-meter";
import { EngineActions } from "@/components/engine/engine-actions";
import { EngineSummary } from "@/components/engine/engine-summary";
import { HoursCard } from "@/components/engine/hours-card";
import { RepeatPanel } from "@/components/engine/repeat-panel";
import { LogTable } from "@/components/log/log-table";
import { Pager } from "@/components/log/pager";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { PageHead } from "@/components/ui/page-head";
import { getEngine } from "@/lib/server/engines/queries";
import { listEvidence } from "@/lib/server/log/evidence";
import { listLog, listRepeats } from "@/lib/server/log/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../known-id";

type Props = PageProps<"/f/[fleetId]/engines/[engineId]">;

const readEngine = cache((fleetId: string, engineId: string) =>
  pageScope("fleet:read", fleetId, (scope) => getEngine(scope, knownId(engineId))),
);

/** The picture takes the newest faults; more would not be told apart on it. */
const MOST_DRAWN = 200;
const LINES_A_PAGE = 20;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { fleetId, engineId } = await params;
  const engine = await readEngine(fleetId, engineId);
  return { title: `${engine.boatName}, ${engine.name}` };
}

export default async function EnginePage({ params, searchParams }: Props) {
  const { fleetId, engineId } = await params;
  const { after: given } = await searchParams;
  const after = typeof given === "string" ? given : undefined;
  const engine = await readEngine(fleetId, engineId);
  const { repeats, evidence, drawn, log, tree } = await pageScope("log:read", fleetId, async (scope) => ({
    repeats: await listRepeats(scope, engineId),
    evidence: await listEvidence(scope, engineId),
    drawn: (await listLog(scope, { engineId, limit: MOST_DRAWN })).items,
    log: await listLog(scope, { engineId, limit: LINES_A_PAGE, ...(after ? { after } : {}) }),
    tree: await documentOf(scope, await getCurrentTreeVersion(scope)),
  }));
  const here = `/f/${fleetId}/engines/${engineId}`;
  return (
    <>
      <PageHead
        title={`${engine.boatName} · ${engine.name}`}
        under={<EngineSummary engine={engine} features={tree.features} />}
        back={<BackTo href={`/f/${fleetId}/boats/${engine.boatId}`} title={engine.boatName} />}
        action={<EngineActions fleetId={fleetId} engineId={engineId} open={drawn.filter((entry) => entry.outcome === null)} />}
      />
      <div className="grid grid-cols-1 gap-5">
        {repeats.map((repeat) => (
          <RepeatPanel key={repeat.cause} repeat={repeat} evidence={evidence.find(({ cause }) => cause === repeat.cause)} />
        ))}
        <Card aria-labelledby="along">
          <h2 id="along" className="mb-2">
            Along the hour meter
          </h2>
          <AlongTheMeter entries={drawn} hoursNow={engine.hoursSinceNew} systems={tree.systems} />
        </Card>
        <Card aria-labelledby="log">
          <h2 id="log" className="mb-2">
            Logged diagnoses and repairs
          </h2>
          <LogTable fleetId={fleetId} entries={log.items} caption={`The log of ${engine.boatName}, ${engine.name}`} />
          <Pager path={here} isLater={after !== undefined} next={log.next} />
        </Card>
        <HoursCard fleetId={fleetId} engine={engine} />
      </div>
    </>
  );
}
