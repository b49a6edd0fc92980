import type { DiagnosisEvent, EventOf } from "../contract/event";
import type { FaultTree } from "../tree/schema";
import type { DiagnosisState } from "./fold";
import { findingFrom } from "./read-answer";
import type { Said } from "./view";
import { CANNOT_TELL, figureSaid, NOT_FITTED, RESULTS_SAID, SITUATIONS_SAID } from "./words";

const RULE_ANSWERS = { yes: "Yes", no: "No", cleared: "Cleared" } as const;

const OUTCOMES_SAID = {
  cured: "Cured",
  held: "Held for now",
  "handed-over": "Help was called",
  "by-itself": "It runs again by itself",
  "broken-off": "Broken off",
} as const;

/** What a kind of event says; null where it is not something said (taking back, picking). */
type Line = Pick<Said, "key" | "title" | "says"> & { note?: string | undefined; photos?: readonly string[]; mayChange?: boolean };

/** Everything said so far that still counts, oldest first. Rule [X6]. */
export function said(tree: FaultTree, state: DiagnosisState): readonly Said[] {
  return state.order.events.flatMap((event) => {
    const line = state.live.has(event) ? lineOf(tree, state, event) : null;
    if (!line) return [];
    return [
      {
        event: event.id,
        kind: event.kind,
        key: line.key,
        title: line.title,
        says: line.says,
        at: event.madeAt,
        device: event.device,
        note: line.note ?? null,
        photos: line.photos ?? [],
        mayChange: line.mayChange === true && state.ended === null,
      },
    ];
  });
}

const titled = (nodes: readonly { key: string; title: string }[], key: string): string =>
  nodes.find((node) => node.key === key)?.title ?? key;

function lineOf(tree: FaultTree, state: DiagnosisState, event: DiagnosisEvent): Line | null {
  switch (event.kind) {
    case "begun":
      return {
        key: null,
        title: "What is wrong",
        says: event.payload.symptoms.map((key) => titled(tree.symptoms, key)).join(", ") || event.payload.complaint || "Nothing named",
        note: event.payload.complaint,
      };
    case "symptom-told":
      return {
        key: event.payload.symptom,
        title: titled(tree.symptoms, event.payload.symptom),
        says: event.payload.present ? "Yes" : "No",
        mayChange: true,
      };
    case "situation-changed":
      return { key: null, title: "Where", says: SITUATIONS_SAID[event.payload.situation] };
    case "answered":
      return {
        key: event.payload.check,
        title: titled(tree.checks, event.payload.check),
        says: answerSaid(tree, state, event),
        note: event.payload.note,
        photos: event.payload.photos,
        mayChange: true,
      };
    case "rule-answered":
      return {
        key: event.payload.rule,
        title: titled(tree.stopRules, event.payload.rule),
        says: RULE_ANSWERS[event.payload.answer],
        mayChange: true,
      };
    case "remedy-tried":
      return {
        key: event.payload.remedy,
        title: titled(tree.remedies, event.payload.remedy),
        says: RESULTS_SAID[event.payload.result],
        note: event.payload.note,
        photos: event.payload.photos,
        mayChange: true,
      };
    case "cranked":
      return {
        key: null,
        title: "Cranked",
        says: `${figureSaid(event.payload.seconds)} s, ${event.payload.ran ? "and it ran" : "it did not run"}`,
      };
    case "feature-told": {
      const feature = tree.features.find((one) => one.key === event.payload.feature);
      return {
        key: event.payload.feature,
        title: feature?.title ?? event.payload.feature,
        says: titled(feature?.options ?? [], event.payload.option),
        mayChange: true,
      };
    }
    case "figure-told":
      return {
        key: event.payload.figure,
        title: FIGURES_SAID[event.payload.figure],
        says: figureSaid(event.payload.value),
        mayChange: true,
      };
    case "not-aboard":
      return { key: null, title: "Not aboard", says: event.payload.item, mayChange: true };
    case "runs-again":
      return { key: null, title: "It runs again by itself", says: "", note: event.payload.note, mayChange: true };
    case "noted":
      return { key: null, title: "Note", says: "", note: event.payload.note, photos: event.payload.photos, mayChange: true };
    case "ended":
      return { key: event.payload.cause ?? null, title: "Outcome", says: OUTCOMES_SAID[event.payload.outcome], note: event.payload.note };
    case "taken-up-again":
      return { key: null, title: "Taken up again", says: "" };
    case "taken-back":
    case "picked":
      return null;
  }
}

const FIGURES_SAID = {
  ratedRpm: "Rated speed, rpm",
  noLoadRpm: "Speed out of gear at full throttle, rpm",
  idleRpm: "Idle speed, rpm",
  openingTemperatureC: "Thermostat opens at, °C",
} as const;

/** "31 kPa: High", "Black specks or slime", "Not fitted". */
export function answerSaid(tree: FaultTree, state: Pick<DiagnosisState, "profile">, event: EventOf<"answered">): string {
  const { answer } = event.payload;
  if ("cannotTell" in answer) return CANNOT_TELL;
  if ("notFitted" in answer) return NOT_FITTED;
  const check = tree.checks.find((one) => one.key === event.payload.check);
  const finding = findingFrom(tree, state, event);
  const title = finding === null ? null : titled(check?.findings ?? [], finding);
  if ("finding" in answer) return title ?? answer.finding;
  return `${figureSaid(answer.value)} ${answer.unit}${title === null ? "" : `: ${title}`}`;
}
