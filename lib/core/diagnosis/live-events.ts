import type { DiagnosisEvent } from "../contract/event";
import type { CausalOrder } from "./causal-order";

/**
 * Events that still count: not superseded, and not taken back by an event that
 * itself still counts. Rule [F3].
 */
export function liveEvents({ events }: CausalOrder): ReadonlySet<DiagnosisEvent> {
  const superseded = new Set(
    events.flatMap((event) => (event.supersedes === undefined || event.supersedes === event.id ? [] : [event.supersedes])),
  );
  const takers = new Map<string, DiagnosisEvent[]>();
  for (const event of events)
    if (event.kind === "taken-back") takers.set(event.payload.event, [...(takers.get(event.payload.event) ?? []), event]);
  const verdicts = new Map<string, boolean>();
  const isLive = (event: DiagnosisEvent): boolean => {
    const ready = verdicts.get(event.id);
    if (ready !== undefined) return ready;
    // Two events that take each other back: both stay.
    verdicts.set(event.id, true);
    const live = !superseded.has(event.id) && !(takers.get(event.id) ?? []).some(isLive);
    verdicts.set(event.id, live);
    return live;
  };
  return new Set(events.filter(isLive));
}
