import type { FaultTree } from "../tree/schema";
import type { Evidence } from "./evidence";
import type { DiagnosisState } from "./fold";
import { findingFrom } from "./read-answer";
import { standingOf } from "./standing-of";
import { rulesInForce } from "./stop-rules";

/** All that is known, in the order first told. */
export function evidenceOf(tree: FaultTree, state: DiagnosisState): Evidence {
  return {
    symptoms: state.symptoms,
    findings: [...state.answers].map(([check, event]) => ({ check, finding: findingFrom(tree, state, event) })),
    remedies: [...state.remedies].map(([remedy, event]) => ({ remedy, result: event.payload.result })),
    standing: standingOf(tree, state, rulesInForce(tree, state)),
  };
}
