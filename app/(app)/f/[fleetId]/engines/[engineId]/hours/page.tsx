import type { Metadata } from "next";
import { ReadingTable } from "@/components/engine/reading-table";
import { Pager } from "@/components/log/pager";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { PageHead } from "@/components/ui/page-head";
import { getEngine } from "@/lib/server/engines/queries";
import { listHourReadings } from "@/lib/server/engines/readings";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../known-id";

export const metadata: Metadata = { title: "Readings of the hour meter" };

export default async function ReadingsPage({ params, searchParams }: PageProps<"/f/[fleetId]/engines/[engineId]/hours">) {
  const { fleetId, engineId } = await params;
  const { after } = await searchParams;
  const from = typeof after === "string" ? { after } : {};
  const { engine, page } = await pageScope("fleet:read", fleetId, async (scope) => ({
    engine: await getEngine(scope, knownId(engineId)),
    page: await listHourReadings(scope, engineId, from),
  }));
  const home = `/f/${fleetId}/engines/${engine.id}`;
  return (
    <>
      <PageHead
        title="Readings of the hour meter"
        under="The log counts in these hours. A reading that is wrong is corrected, not crossed out: what it said stays readable."
        back={<BackTo href={home} title={`${engine.boatName} · ${engine.name}`} />}
      />
      <Card>
        <ReadingTable home={home} readings={page.items} />
        <Pager path={`${home}/hours`} isLater={"after" in from} next={page.next} />
      </Card>
    </>
  );
}
