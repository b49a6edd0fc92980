import type { DiagnosisEvent } from "../contract/event";
import type { FaultTree } from "../tree/schema";
import type { Evidence } from "./evidence";
import type { DiagnosisState } from "./fold";
import { findingFrom } from "./read-answer";
import { standingOf } from "./standing-of";
import { rulesInForce } from "./stop-rules";

/** All that is known, in the order first told; what was told once one of two faults was put right is marked. Rules [F8], [M4]. */
export function evidenceOf(tree: FaultTree, state: DiagnosisState): Evidence {
  const { partCure } = state;
  const marked = (event: DiagnosisEvent): { left?: true } => (partCure?.isLeft(event) ? { left: true } : {});
  return {
    symptoms: state.symptoms,
    findings: [...state.answers].map(([check, event]) => ({ check, finding: findingFrom(tree, state, event), ...marked(event) })),
    remedies: [...state.remedies].map(([remedy, event]) => ({
      remedy,
      result: event === partCure?.event ? "better" : event.payload.result,
      ...marked(event),
    })),
    ...(partCure ? { curedOne: partCure.event.payload.remedy } : {}),
    standing: standingOf(tree, state, rulesInForce(tree, state)),
  };
}
