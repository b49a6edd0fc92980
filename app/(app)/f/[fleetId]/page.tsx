import type { Metadata } from "next";
import { BoatCard } from "@/components/fleet/boat-card";
import { CameBackList } from "@/components/fleet/came-back-list";
import { FirstSteps } from "@/components/fleet/first-steps";
import { newcomerSteps } from "@/components/fleet/newcomer";
import { OpenList } from "@/components/fleet/open-list";
import { LinkButton } from "@/components/ui/link-button";
import { PageHead } from "@/components/ui/page-head";
import { listBoats } from "@/lib/server/boats/queries";
import { listEngines } from "@/lib/server/engines/queries";
import { listLog, listRepeats } from "@/lib/server/log/queries";
import { getFleet } from "@/lib/server/people/queries";
import { pageScope } from "@/lib/server/web/page-scope";

export const metadata: Metadata = { title: "Boats and engines" };

export default async function FleetPage({ params }: PageProps<"/f/[fleetId]">) {
  const { fleetId } = await params;
  const { fleet, boats, engines, repeats, open, logged } = await pageScope("fleet:read", fleetId, async (scope) => ({
    fleet: await getFleet(scope),
    boats: await listBoats(scope),
    engines: await listEngines(scope),
    repeats: await listRepeats(scope),
    open: (await listLog(scope, { outcome: "open", limit: 100 })).items,
    logged: (await listLog(scope, { limit: 1 })).items.length > 0,
  }));
  const standingOf = (boatId: string) =>
    engines
      .filter((engine) => engine.boatId === boatId)
      .map((engine) => ({
        engine,
        open: open.filter((entry) => entry.engineId === engine.id).length,
        repeats: repeats.filter((repeat) => repeat.engineId === engine.id).length,
      }));
  const begins = !logged || engines.length === 0;
  return (
    <>
      <PageHead
        title={fleet.name}
        under={`${counted(boats.length, "boat")}, ${counted(engines.length, "engine")}`}
        action={boats.length > 0 && <LinkButton href={`/f/${fleetId}/boats/new`}>Add a boat</LinkButton>}
      />
      <div className="grid grid-cols-1 gap-5">
        {begins && <FirstSteps steps={newcomerSteps(fleetId, boats, engines)} />}
        <CameBackList fleetId={fleetId} repeats={repeats} engines={engines} />
        <OpenList fleetId={fleetId} entries={open} />
        <div className="grid gap-5 xl:grid-cols-2">
          {boats.map((boat) => (
            <BoatCard key={boat.id} fleetId={fleetId} boat={boat} engines={standingOf(boat.id)} />
          ))}
        </div>
      </div>
    </>
  );
}

const counted = (n: number, what: string) => `${n} ${what}${n === 1 ? "" : "s"}`;
