import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { filtersOf } from "@/components/log/filters";
import { LogFilters } from "@/components/log/log-filters";
import { LogTable } from "@/components/log/log-table";
import { Pager } from "@/components/log/pager";
import { Card } from "@/components/ui/card";
import { EmptyState } from "@/components/ui/empty-state";
import { LinkButton } from "@/components/ui/link-button";
import { PageHead } from "@/components/ui/page-head";
import { LogQuery } from "@/lib/core/contract/log";
import { listBoats } from "@/lib/server/boats/queries";
import { listEngines } from "@/lib/server/engines/queries";
import { listLog } from "@/lib/server/log/queries";
import { documentOf, getCurrentTreeVersion } from "@/lib/server/trees/queries";
import { pageScope } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Logged diagnoses" };

const LINES_A_PAGE = 50;

export default async function LogPage({ params, searchParams }: PageProps<"/f/[fleetId]/log">) {
  const { fleetId } = await params;
  const search = await searchParams;
  const filters = filtersOf(search);
  const after = typeof search.after === "string" ? search.after : undefined;
  const asked = LogQuery.safeParse({
    limit: LINES_A_PAGE,
    after,
    boatId: filters.boat,
    engineId: filters.engine,
    system: filters.system,
    outcome: filters.outcome,
  });
  // An address made by hand that names nothing of ours.
  if (!asked.success) notFound();
  const { boats, engines, systems, log } = await pageScope("log:read", fleetId, async (scope) => ({
    boats: await listBoats(scope),
    engines: await listEngines(scope),
    systems: (await documentOf(scope, await getCurrentTreeVersion(scope))).systems,
    log: await listLog(scope, asked.data),
  }));
  const here = `/f/${fleetId}/log`;
  const narrowed = Object.keys(filters).length > 0;
  return (
    <>
      <PageHead title="Logged diagnoses" under="Every diagnosis and repair of the fleet, newest first." />
      <div className="grid grid-cols-1 gap-5">
        <LogFilters path={here} filters={filters} boats={boats} engines={engines} systems={systems} />
        <Card>
          <LogTable
            fleetId={fleetId}
            entries={log.items}
            caption="The fleet’s log"
            namesEngine
            empty={
              narrowed ? (
                <EmptyState title="Nothing like that is logged" action={<LinkButton href={here}>Show all</LinkButton>}>
                  Choose fewer things, or show the whole log.
                </EmptyState>
              ) : undefined
            }
          />
          <Pager path={here} query={filters} isLater={after !== undefined} next={log.next} />
        </Card>
      </div>
    </>
  );
}
