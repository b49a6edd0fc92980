import Link from "next/link";
import { Day } from "@/components/log/day";
import { Card } from "@/components/ui/card";
import type { Engine } from "@/lib/core/contract/engine";
import { Hours } from "./hours";
import { HourEntry } from "./hour-entry";

/** Where the engine's hours come from, and the next reading. */
export function HoursCard({ fleetId, engine }: { fleetId: string; engine: Engine }) {
  const moved = engine.hoursSinceNew !== null && engine.hours !== null && Math.abs(engine.hoursSinceNew - engine.hours) >= 1;
  return (
    <Card aria-labelledby="hours">
      <h2 id="hours">Hours</h2>
      <p className="mt-1 mb-4">
        <Hours engine={engine} />
        {engine.hasHourMeter && engine.hoursReadAt && (
          <span className="text-ink-2">
            , read on <Day at={engine.hoursReadAt} />
          </span>
        )}
        {moved && engine.hasHourMeter && (
          <span className="text-ink-2">
            . The meter was replaced: <span className="dial">{Math.round(engine.hoursSinceNew ?? 0)}</span> h since new, which the log
            counts in
          </span>
        )}
      </p>
      {engine.hasHourMeter ? (
        <div className="no-print">
          <HourEntry fleetId={fleetId} engineId={engine.id} />
          <Link className="link mt-2 inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/engines/${engine.id}/hours`}>
            All readings, and correcting one
          </Link>
        </div>
      ) : (
        <p className="text-sm text-ink-2">
          It has no hour meter.{" "}
          {engine.estimatedHoursPerYear === undefined ? (
            <>
              Say in{" "}
              <Link className="link" prefetch={false} href={`/f/${fleetId}/engines/${engine.id}/edit`}>
                its profile
              </Link>{" "}
              how many hours it runs in a usual year; hours are then estimated.
            </>
          ) : (
            `Estimated from ${engine.estimatedHoursPerYear} h in a usual year.`
          )}
        </p>
      )}
    </Card>
  );
}
