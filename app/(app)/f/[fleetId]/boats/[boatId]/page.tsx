import type { Metadata } from "next";
import Link from "next/link";
import { cache } from "react";
import { Hours } from "@/components/engine/hours";
import { BoatForm } from "@/components/fleet/boat-form";
import { RemoveThing } from "@/components/form/remove-thing";
import { BackTo } from "@/components/shell/back-to";
import { Card } from "@/components/ui/card";
import { EmptyState } from "@/components/ui/empty-state";
import { LinkButton } from "@/components/ui/link-button";
import { PageHead } from "@/components/ui/page-head";
import { can } from "@/lib/core/access/permissions";
import { getBoat } from "@/lib/server/boats/queries";
import { listEngines } from "@/lib/server/engines/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { knownId } from "../../known-id";

type Props = PageProps<"/f/[fleetId]/boats/[boatId]">;

const read = cache((fleetId: string, boatId: string) =>
  pageScope("fleet:read", fleetId, async (scope) => ({
    boat: await getBoat(scope, knownId(boatId)),
    engines: (await listEngines(scope)).filter((engine) => engine.boatId === boatId),
    mayRemove: can(scope.actor.roles, "boat:remove"),
  })),
);

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { fleetId, boatId } = await params;
  return { title: (await read(fleetId, boatId)).boat.name };
}

export default async function BoatPage({ params }: Props) {
  const { fleetId, boatId } = await params;
  const { boat, engines, mayRemove } = await read(fleetId, boatId);
  const add = (
    <LinkButton href={`/f/${fleetId}/boats/${boat.id}/engines/new`}>{engines.length === 0 ? "Add its engine" : "Add an engine"}</LinkButton>
  );
  return (
    <>
      <PageHead title={boat.name} back={<BackTo href={`/f/${fleetId}`} title="Boats and engines" />} action={engines.length > 0 && add} />
      <div className="grid max-w-3xl gap-5">
        <Card aria-labelledby="engines">
          <h2 id="engines">Engines</h2>
          {engines.length === 0 ? (
            <div className="mt-2">
              <EmptyState title="No engine yet" action={add}>
                Its engine is what a diagnosis and the log hang on. Twins are two engines: port and starboard.
              </EmptyState>
            </div>
          ) : (
            <ul className="divide-y divide-rule">
              {engines.map((engine) => (
                <li key={engine.id} className="flex flex-wrap items-center gap-x-4">
                  <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/engines/${engine.id}`}>
                    {engine.name}
                  </Link>
                  <span className="text-sm text-ink-2">
                    <Hours engine={engine} />
                  </span>
                </li>
              ))}
            </ul>
          )}
          {engines.length > 0 && (
            <p className="mt-2">
              <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/boats/${boat.id}/passage`}>
                Spares for a passage
              </Link>
            </p>
          )}
        </Card>
        <Card aria-labelledby="boat-itself">
          <h2 id="boat-itself" className="mb-3">
            The boat
          </h2>
          <BoatForm fleetId={fleetId} boat={boat} />
        </Card>
        {mayRemove && (
          <div className="no-print">
            <RemoveThing
              title={`Remove ${boat.name}`}
              path={`/api/v1/fleets/${fleetId}/boats/${boat.id}`}
              version={boat.version}
              then={`/f/${fleetId}`}
            >
              <p>
                {boat.name} {engines.length > 0 && `and ${engines.length === 1 ? "its engine" : `its ${engines.length} engines`} `}
                {engines.length > 0 ? "go" : "goes"} off the lists. What was logged stays in the log and can still be read.
              </p>
            </RemoveThing>
          </div>
        )}
      </div>
    </>
  );
}
