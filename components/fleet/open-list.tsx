import Link from "next/link";
import { Day } from "@/components/log/day";
import { Card } from "@/components/ui/card";
import type { LogEntry } from "@/lib/core/contract/log";

/** Diagnoses that have not ended, each with the way back into it. */
export function OpenList({ fleetId, entries }: { fleetId: string; entries: readonly LogEntry[] }) {
  if (entries.length === 0) return null;
  return (
    <Card aria-labelledby="open">
      <h2 id="open">Open diagnoses</h2>
      <ul className="mt-1 divide-y divide-rule">
        {entries.map((entry) => (
          <li key={entry.id} className="flex flex-wrap items-center justify-between gap-x-4 py-1">
            <span>
              {entry.boatName}, {entry.engineName}: {entry.symptoms.map((s) => s.title).join(", ") || "no symptom named"}.{" "}
              <span className="text-sm text-ink-2">
                Since <Day at={entry.at} />, {entry.by}
              </span>
            </span>
            <span className="flex flex-wrap gap-x-5">
              <Link className="link inline-flex min-h-12 items-center" prefetch={false} href={`/f/${fleetId}/log/${entry.diagnosisId}`}>
                Read it
              </Link>
              <Link
                className="link inline-flex min-h-12 items-center"
                prefetch={false}
                href={`/diagnose?fleet=${fleetId}&d=${entry.diagnosisId}`}
              >
                Go on with it
              </Link>
            </span>
          </li>
        ))}
      </ul>
    </Card>
  );
}
