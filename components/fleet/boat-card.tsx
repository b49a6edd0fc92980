import Link from "next/link";
import { Hours } from "@/components/engine/hours";
import { Card } from "@/components/ui/card";
import { Chip } from "@/components/ui/chip";
import { LinkButton } from "@/components/ui/link-button";
import type { Boat, Engine } from "@/lib/core/contract/engine";

export type EngineStanding = { engine: Engine; open: number; repeats: number };

/** A boat and its engines: hours, what is open, what came back. */
export function BoatCard({ fleetId, boat, engines }: { fleetId: string; boat: Boat; engines: readonly EngineStanding[] }) {
  return (
    <Card aria-labelledby={`boat-${boat.id}`}>
      <h2 id={`boat-${boat.id}`}>
        <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/boats/${boat.id}`}>
          {boat.name}
        </Link>
      </h2>
      {engines.length === 0 ? (
        <div className="mt-1">
          <p className="text-sm text-ink-2">No engine yet. Its engine is what a diagnosis and the log hang on.</p>
          <LinkButton className="mt-2" href={`/f/${fleetId}/boats/${boat.id}/engines/new`}>
            Add its engine
          </LinkButton>
        </div>
      ) : (
        <ul className="divide-y divide-rule">
          {engines.map((standing) => (
            <EngineRow key={standing.engine.id} fleetId={fleetId} {...standing} />
          ))}
        </ul>
      )}
    </Card>
  );
}

function EngineRow({ fleetId, engine, open, repeats }: EngineStanding & { fleetId: string }) {
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2 pb-3">
      <div className="min-w-0 flex-1 basis-56">
        <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/engines/${engine.id}`}>
          {engine.name}
        </Link>
        <p className="flex flex-wrap items-center gap-2 text-sm text-ink-2">
          <Hours engine={engine} />
          {open > 0 && <Chip tone="buoy">{open === 1 ? "1 open diagnosis" : `${open} open diagnoses`}</Chip>}
          {repeats > 0 && <Chip tone="lead">{repeats === 1 ? "1 fault came back" : `${repeats} faults came back`}</Chip>}
        </p>
      </div>
      <LinkButton className="no-print" href={`/diagnose?fleet=${fleetId}&engine=${engine.id}`} prefetch={false}>
        Diagnose a fault
      </LinkButton>
    </li>
  );
}
