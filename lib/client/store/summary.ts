import type { DiagnosisEvent, EventOf } from "@/lib/core/contract/event";
import { fold } from "@/lib/core/diagnosis/fold";

/** One line about a diagnosis on this phone. */
export type Summary = {
  id: string;
  engineId: string;
  treeVersionId: string;
  symptoms: readonly string[];
  complaint: string | null;
  beganAt: string;
  /** The newest event, by its own device's clock. */
  touchedAt: string;
  /** Answers and tried remedies that stand. */
  answers: number;
  ended: boolean;
};

/** Sums up the events of one diagnosis; null before its beginning is known here. Any order of events gives the same. */
export function summarize(events: readonly DiagnosisEvent[]): Summary | null {
  const begun = events.find((event): event is EventOf<"begun"> => event.kind === "begun");
  if (!begun) return null;
  const { live, ended } = fold(events);
  return {
    id: begun.diagnosisId,
    engineId: begun.payload.engineId,
    treeVersionId: begun.payload.treeVersionId,
    symptoms: begun.payload.symptoms,
    complaint: begun.payload.complaint ?? null,
    beganAt: begun.madeAt,
    touchedAt: events.reduce((latest, event) => (event.madeAt > latest ? event.madeAt : latest), begun.madeAt),
    answers: [...live].filter((event) => event.kind === "answered" || event.kind === "remedy-tried").length,
    ended: ended !== null,
  };
}
