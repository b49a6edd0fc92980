import type { DiagnosisEvent } from "@/lib/core/contract/event";

/** Small enough that a weak signal gets one through. */
export const EVENTS_A_BATCH = 25;

/** One POST: events of one diagnosis, each device's own in the order of its numbers. */
export type Batch = { diagnosisId: string; events: readonly DiagnosisEvent[] };

/**
 * The outbox as the requests that empty it: the diagnosis that has waited longest
 * first, and in it by device and number, never by the clock, since a clock may have
 * been set back. The beginning of a diagnosis is its first event and so leads.
 */
export function batches(waiting: readonly DiagnosisEvent[], size = EVENTS_A_BATCH): Batch[] {
  const byDiagnosis = new Map<string, DiagnosisEvent[]>();
  for (const event of waiting) byDiagnosis.set(event.diagnosisId, [...(byDiagnosis.get(event.diagnosisId) ?? []), event]);
  const result: Batch[] = [];
  for (const diagnosisId of [...byDiagnosis.keys()].sort()) {
    const events = (byDiagnosis.get(diagnosisId) ?? []).sort(byDeviceAndNumber);
    for (let from = 0; from < events.length; from += size) result.push({ diagnosisId, events: events.slice(from, from + size) });
  }
  return result;
}

function byDeviceAndNumber(a: DiagnosisEvent, b: DiagnosisEvent): number {
  if (a.kind === "begun" && b.kind !== "begun") return -1;
  if (b.kind === "begun" && a.kind !== "begun") return 1;
  return a.device < b.device ? -1 : a.device > b.device ? 1 : a.sequence - b.sequence;
}
