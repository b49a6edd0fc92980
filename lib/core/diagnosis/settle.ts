import type { DiagnosisEvent, EventOf } from "../contract/event";
import type { CausalOrder } from "./causal-order";

/** Steps: the events that two devices may answer in two ways at once. */
export type StepEvent = EventOf<"answered"> | EventOf<"remedy-tried">;

export const stepOf = (event: StepEvent): string => (event.kind === "answered" ? event.payload.check : event.payload.remedy);

const contentOf = (event: StepEvent): string => (event.kind === "answered" ? JSON.stringify(event.payload.answer) : event.payload.result);

/** What stands for a step: one event, or those that contradict each other. */
export type Settled<E extends StepEvent> = { readonly event: E } | { readonly conflict: readonly E[] };

/**
 * Which answer stands for one step. The newest that each device knew of; where
 * two devices answered without having seen each other and say different
 * things, neither, until one is picked. A pick settles only what it had seen. Rule [F4].
 *
 * @param events live events of one step, in causal order; at least one.
 */
export function settle<E extends StepEvent>(events: readonly E[], picks: readonly EventOf<"picked">[], order: CausalOrder): Settled<E> {
  const newest = events.filter((event) => !events.some((other) => other !== event && order.before(event, other)));
  const first = newest[0] ?? events[0];
  if (newest.every((event) => first && contentOf(event) === contentOf(first)) && first) return { event: first };
  const here = picks.filter((pick) => newest.some((event) => event.id === pick.payload.event));
  const last = here.filter((pick) => !here.some((other) => other !== pick && order.before(pick, other)));
  const ruledOut = (event: DiagnosisEvent): boolean => last.some((pick) => pick.payload.event !== event.id && order.before(event, pick));
  const left = newest.filter((event) => !ruledOut(event));
  const [only] = left;
  return only && left.length === 1 ? { event: only } : { conflict: left.length > 1 ? left : newest };
}
