import "server-only";
import type { WatchedEngine } from "@/lib/core/recurrence/fault-records";
import type { History } from "./lines";

/** The engines as they are watched: from when the log knows them, in hours where it can. */
export const watchedEngines = (history: History, now: string): WatchedEngine[] =>
  history.engines.map((engine) => watched(engine, history, now));

function watched(engine: History["engines"][number], { cases, clocks, hoursNow }: History, now: string): WatchedEngine {
  const clock = clocks.get(engine.id);
  const begins = [
    engine.createdAt.toISOString(),
    clock?.first?.readAt,
    ...cases.flatMap((one) => (one.engineId === engine.id ? [one.at] : [])),
  ]
    .flatMap((moment) => moment ?? [])
    .sort((a, b) => Date.parse(a) - Date.parse(b));
  const hoursAt = (moment: string) => clock?.at(moment) ?? { hours: null, estimated: true };
  return {
    id: engine.id,
    // Before the first reading hours may not be known: the record begins where they are.
    since: begins.find((moment) => hoursAt(moment).hours !== null) ?? begins[0] ?? now,
    now,
    // A meter stands at its last reading until the next.
    clock: { at: (moment) => (moment === now ? { hours: hoursNow(engine.id), estimated: !engine.hasHourMeter } : hoursAt(moment)) },
  };
}
