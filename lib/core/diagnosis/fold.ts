import type { DiagnosisEvent, EventKind, EventOf } from "../contract/event";
import type { EngineProfile } from "../contract/engine";
import type { Situation } from "../tree/schema";
import { causalOrder, type CausalOrder } from "./causal-order";
import { liveEvents } from "./live-events";
import type { SymptomTold } from "./evidence";
import { partCureOf, type PartCure } from "./part-cure";
import { settle, stepOf, type StepEvent } from "./settle";

/** Where a diagnosis stands, as its log tells it: no tree is needed to know. */
export type DiagnosisState = {
  readonly order: CausalOrder;
  readonly live: ReadonlySet<DiagnosisEvent>;
  readonly begun: EventOf<"begun"> | null;
  readonly situation: Situation;
  /** Features and figures told since it began stand over those it began with. */
  readonly profile: EngineProfile;
  /** In the order first told; `present` as things stand now. */
  readonly symptoms: readonly SymptomTold[];
  readonly answers: ReadonlyMap<string, EventOf<"answered">>;
  readonly remedies: ReadonlyMap<string, EventOf<"remedy-tried">>;
  readonly conflicts: readonly (readonly StepEvent[])[];
  /** The remedy that put right one of two faults; null while none did. */
  readonly partCure: PartCure | null;
  readonly notAboard: readonly string[];
  readonly ended: EventOf<"ended"> | null;
  readonly runsAgain: boolean;
};

/**
 * Folds a log into a state. Sent twice, late, out of order or from several
 * devices, the same events give the same state. Rules [F1]-[F9].
 */
export function fold(log: readonly DiagnosisEvent[]): DiagnosisState {
  const order = causalOrder(log);
  const live = liveEvents(order);
  const all = order.events.filter((event) => live.has(event));
  const of = <K extends EventKind>(kind: K): readonly EventOf<K>[] => all.filter((event): event is EventOf<K> => event.kind === kind);
  const begun = of("begun")[0] ?? null;
  const answers = settled(of("answered"), of("picked"), order);
  const remedies = settled(of("remedy-tried"), of("picked"), order);
  const partCure = partCureOf([...remedies.stands.values()], of("symptom-told"), order);
  return {
    order,
    live,
    begun,
    situation: of("situation-changed").at(-1)?.payload.situation ?? begun?.payload.situation ?? "alongside",
    profile: profileOf(begun, of("feature-told"), of("figure-told")),
    symptoms: symptomsOf(begun, of("symptom-told"), partCure),
    partCure,
    answers: answers.stands,
    remedies: remedies.stands,
    conflicts: [...answers.conflicts, ...remedies.conflicts],
    notAboard: [...new Set(of("not-aboard").map((event) => event.payload.item))],
    ended: endedBy(of("ended"), of("taken-up-again"), order),
    runsAgain: runsAgain(all),
  };
}

function settled<E extends StepEvent>(events: readonly E[], picks: readonly EventOf<"picked">[], order: CausalOrder) {
  const byStep = new Map<string, E[]>();
  for (const event of events) byStep.set(stepOf(event), [...(byStep.get(stepOf(event)) ?? []), event]);
  const stands = new Map<string, E>();
  const conflicts: (readonly E[])[] = [];
  for (const [step, told] of byStep) {
    const result = settle(told, picks, order);
    if ("event" in result) stands.set(step, result.event);
    else conflicts.push(result.conflict);
  }
  return { stands, conflicts };
}

function profileOf(
  begun: EventOf<"begun"> | null,
  features: readonly EventOf<"feature-told">[],
  figures: readonly EventOf<"figure-told">[],
): EngineProfile {
  const start = begun?.payload.profile ?? { features: {}, figures: {}, healthy: {} };
  return {
    ...start,
    features: { ...start.features, ...Object.fromEntries(features.map(({ payload }) => [payload.feature, payload.option])) },
    figures: { ...start.figures, ...Object.fromEntries(figures.map(({ payload }) => [payload.figure, payload.value])) },
  };
}

function symptomsOf(
  begun: EventOf<"begun"> | null,
  told: readonly EventOf<"symptom-told">[],
  partCure: PartCure | null,
): readonly SymptomTold[] {
  const before = new Map<string, boolean>((begun?.payload.symptoms ?? []).map((symptom) => [symptom, true]));
  const left = new Map<string, boolean>();
  for (const event of told) (partCure?.isLeft(event) ? left : before).set(event.payload.symptom, event.payload.present);
  return [...new Set([...before.keys(), ...left.keys()])].map((symptom) => {
    const now = left.get(symptom);
    const first = before.get(symptom) ?? null;
    return now === undefined ? { symptom, present: first === true } : { symptom, present: now, left: { before: first } };
  });
}

/** The last end that nobody who knew of it has taken up again. */
function endedBy(ends: readonly EventOf<"ended">[], ups: readonly EventOf<"taken-up-again">[], order: CausalOrder) {
  return ends.filter((end) => !ups.some((up) => order.before(end, up))).at(-1) ?? null;
}

/** "It runs again by itself" holds until someone goes on looking. */
function runsAgain(all: readonly DiagnosisEvent[]): boolean {
  const last = all.findLast((event) => ["runs-again", "answered", "remedy-tried", "taken-up-again"].includes(event.kind));
  return last?.kind === "runs-again";
}
