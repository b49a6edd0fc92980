import type { DiagnosisEvent } from "@/lib/core/contract/event";

/** What the log of a diagnosis says of this device's next event: its number, and how far this device knows the other devices' logs. */
export function stamp(events: readonly DiagnosisEvent[], device: string): Pick<DiagnosisEvent, "sequence" | "seen"> {
  let last = 0;
  const seen: Record<string, number> = {};
  for (const event of events) {
    if (event.device === device) last = Math.max(last, event.sequence);
    else seen[event.device] = Math.max(seen[event.device] ?? 0, event.sequence);
  }
  return { sequence: last + 1, seen };
}
