import type { DiagnosisEvent, EventKind, EventOf } from "../contract/event";

/** What an event says, without who wrote it and when. */
export type Payload = { [K in EventKind]: { kind: K; payload: EventOf<K>["payload"] } }[EventKind];

/** A log as one device would write it, for diagnoses that nobody lived through: only the order counts. */
export const logOf = (payloads: readonly Payload[]): DiagnosisEvent[] =>
  payloads.map(
    (payload, index) =>
      ({
        ...payload,
        id: `event-${index}`,
        diagnosisId: "case",
        device: "device",
        sequence: index + 1,
        madeAt: "2000-01-01T00:00:00Z",
        seen: {},
      }) as DiagnosisEvent,
  );
