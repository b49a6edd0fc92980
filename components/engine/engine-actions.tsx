import { LinkButton } from "@/components/ui/link-button";
import type { LogEntry } from "@/lib/core/contract/log";

/** What people come to an engine's page to do. */
export function EngineActions({ fleetId, engineId, open }: { fleetId: string; engineId: string; open: readonly LogEntry[] }) {
  const here = `/f/${fleetId}/engines/${engineId}`;
  const first = open[0];
  return (
    <div className="flex flex-wrap gap-3">
      <LinkButton href={`${here}/edit`} prefetch={false}>
        Profile
      </LinkButton>
      <LinkButton href={`${here}/repairs/new`} prefetch={false}>
        Log a repair
      </LinkButton>
      {first && (
        <LinkButton href={`/diagnose?fleet=${fleetId}&d=${first.diagnosisId}`} prefetch={false}>
          Go on with the open diagnosis
        </LinkButton>
      )}
      <LinkButton tone="strong" href={`/diagnose?fleet=${fleetId}&engine=${engineId}`} prefetch={false}>
        Diagnose a fault
      </LinkButton>
    </div>
  );
}
