import type { Metadata } from "next";
import { HourEntry } from "@/components/engine/hour-entry";
import { RemoveThing } from "@/components/form/remove-thing";
import { SaidBefore } from "@/components/log/said-before";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { Notice } from "@/components/ui/notice";
import { PageHead } from "@/components/ui/page-head";
import { getEngine } from "@/lib/server/engines/queries";
import { getReading } from "@/lib/server/engines/readings";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../../../known-id";

export const metadata: Metadata = { title: "A reading of the hour meter" };

export default async function ReadingPage({ params }: PageProps<"/f/[fleetId]/engines/[engineId]/hours/[readingId]">) {
  const { fleetId, engineId, readingId } = await params;
  const { engine, reading } = await pageScope("engine:write", fleetId, async (scope) => ({
    engine: await getEngine(scope, knownId(engineId)),
    reading: await getReading(scope, engineId, knownId(readingId)),
  }));
  const list = `/f/${fleetId}/engines/${engine.id}/hours`;
  const before = reading.corrections.map(({ was, ...one }) => ({
    ...one,
    lines: [
      ["Read on", was.readAt.slice(0, 10)],
      ["The meter showed", `${was.reading} h${was.reset ? ", replaced or set back" : ""}`],
    ] as const,
  }));
  return (
    <>
      <PageHead
        title="A reading of the hour meter"
        under={`${engine.boatName}, ${engine.name}. Written down by ${reading.by}.`}
        back={<BackTo href={list} title="Readings of the hour meter" />}
      />
      <div className="grid gap-6">
        {reading.takenBackAt ? (
          <Notice tone="look" title="This reading was taken back">
            It counts for nothing. What it said stands below.
          </Notice>
        ) : (
          <Card>
            <HourEntry key={reading.version} fleetId={fleetId} engineId={engine.id} standing={reading} />
            <div className="mt-4">
              <RemoveThing
                title="Take it back"
                path={`/api/v1/fleets/${fleetId}/engines/${engine.id}/hours/${reading.id}`}
                version={reading.version}
                then={list}
              >
                <p>
                  For a reading of another engine, or one that was written down twice. The hours no longer count it. What it said stays
                  readable here.
                </p>
              </RemoveThing>
            </div>
          </Card>
        )}
        <SaidBefore before={before} />
      </div>
    </>
  );
}
