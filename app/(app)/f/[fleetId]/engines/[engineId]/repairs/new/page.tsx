import type { Metadata } from "next";
import { repairChoices } from "@/components/log/repair-choices";
import { RepairForm } from "@/components/log/repair-form";
import { BackTo } from "@/components/shell/back-to";
import { PageHead } from "@/components/ui/page-head";
import { getEngine } from "@/lib/server/engines/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../../known-id";

export const metadata: Metadata = { title: "Log a repair" };

export default async function NewRepairPage({ params }: PageProps<"/f/[fleetId]/engines/[engineId]/repairs/new">) {
  const { fleetId, engineId } = await params;
  const { engine, tree } = await pageScope("log:write", fleetId, async (scope) => ({
    engine: await getEngine(scope, knownId(engineId)),
    tree: await documentOf(scope, await getCurrentTreeVersion(scope)),
  }));
  const title = `${engine.boatName} · ${engine.name}`;
  return (
    <>
      <PageHead
        title="Log a repair"
        under={`Done without a diagnosis, or out of an old notebook. It goes into the log of ${engine.boatName}, ${engine.name}.`}
        back={<BackTo href={`/f/${fleetId}/engines/${engine.id}`} title={title} />}
      />
      <RepairForm fleetId={fleetId} engineId={engine.id} hasHourMeter={engine.hasHourMeter} choices={repairChoices(tree)} />
    </>
  );
}
