import type { Metadata } from "next";
import { RemoveThing } from "@/components/form/remove-thing";
import { repairChoices } from "@/components/log/repair-choices";
import { RepairForm } from "@/components/log/repair-form";
import { repairInWords } from "@/components/log/repair-in-words";
import { SaidBefore } from "@/components/log/said-before";
import { BackTo } from "@/components/shell/back-to";
import { Notice } from "@/components/ui/notice";
import { PageHead } from "@/components/ui/page-head";
import { getEngine } from "@/lib/server/engines/queries";
import { getRepair } from "@/lib/server/log/repairs";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../../known-id";

export const metadata: Metadata = { title: "A repair" };

export default async function RepairPage({ params }: PageProps<"/f/[fleetId]/engines/[engineId]/repairs/[repairId]">) {
  const { fleetId, engineId, repairId } = await params;
  const { engine, repair, tree } = await pageScope("log:write", fleetId, async (scope) => ({
    engine: await getEngine(scope, knownId(engineId)),
    repair: await getRepair(scope, engineId, knownId(repairId)),
    tree: await documentOf(scope, await getCurrentTreeVersion(scope)),
  }));
  const here = `/f/${fleetId}/engines/${engine.id}`;
  return (
    <>
      <PageHead
        title="A repair"
        under={`Written into the log of ${engine.boatName}, ${engine.name}, by ${repair.entry.by}. What is corrected stays readable below.`}
        back={<BackTo href={here} title={`${engine.boatName} · ${engine.name}`} />}
      />
      <div className="grid gap-6">
        {repair.takenBackAt ? (
          <Notice tone="look" title="This repair was taken back">
            It is off the log and counts for nothing. What it said stands below.
          </Notice>
        ) : (
          <>
            <RepairForm
              key={repair.version}
              fleetId={fleetId}
              engineId={engine.id}
              hasHourMeter={engine.hasHourMeter}
              choices={repairChoices(tree)}
              standing={repair}
            />
            <div>
              <RemoveThing
                title="Take it back"
                path={`/api/v1/fleets/${fleetId}/engines/${engine.id}/repairs/${repair.entry.id}`}
                version={repair.version}
                then={here}
              >
                <p>
                  For a repair that was never done, or was written down twice. It leaves the log and every count. What it said stays
                  readable here.
                </p>
              </RemoveThing>
            </div>
          </>
        )}
        <SaidBefore before={repair.corrections.map((one) => ({ ...one, lines: repairInWords(one.was) }))} />
      </div>
    </>
  );
}
