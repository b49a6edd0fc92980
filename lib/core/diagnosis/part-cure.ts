import type { DiagnosisEvent, EventOf } from "../contract/event";
import type { CausalOrder } from "./causal-order";

/** One of two faults was put right, and the log went on with what is left. */
export type PartCure = {
  readonly event: EventOf<"remedy-tried">;
  /** Was this told by someone who knew of it, so that it speaks of what is left? */
  readonly isLeft: (event: DiagnosisEvent) => boolean;
};

/**
 * The first remedy that made it better and no more, or that cured it but for a
 * symptom told since. A corrected answer stands where the answer that it
 * corrects stood. Rule [F8].
 *
 * @param tried the remedies' answers that stand.
 * @param told symptoms told, that still count.
 */
export function partCureOf(
  tried: readonly EventOf<"remedy-tried">[],
  told: readonly EventOf<"symptom-told">[],
  order: CausalOrder,
): PartCure | null {
  const byId = new Map(order.events.map((event, place) => [event.id, { event, place }]));
  const firstOf = (event: DiagnosisEvent): { event: DiagnosisEvent; place: number } => {
    let found = byId.get(event.id) ?? { event, place: 0 };
    // Each correction stands later than what it corrects; anything else is a log that bites its tail.
    for (;;) {
      const corrected = byId.get(found.event.supersedes ?? "");
      if (!corrected || corrected.place >= found.place) return found;
      found = corrected;
    }
  };
  const leavesOne = (event: EventOf<"remedy-tried">): boolean =>
    event.payload.result === "better" ||
    (event.payload.result === "cured" && told.some((symptom) => symptom.payload.present && order.before(event, symptom)));
  const [first] = tried
    .filter(leavesOne)
    .map((event) => ({ event, from: firstOf(event) }))
    .sort((a, b) => a.from.place - b.from.place);
  if (!first) return null;
  return { event: first.event, isLeft: (event) => order.before(first.from.event, firstOf(event).event) };
}
