import type { DiagnosisEvent } from "../contract/event";
import type { Check, EngineState, FaultTree, Remedy, StopRule } from "../tree/schema";
import type { Standing } from "./evidence";
import type { DiagnosisState } from "./fold";
import { forbidden } from "./stop-rules";

/** How the engine stands after the last step, and what rules and symptoms take away. Rules [C3], [C4], [T5], [T7]. */
export function standingOf(tree: FaultTree, state: DiagnosisState, inForce: readonly StopRule[]): Standing {
  const symptoms = new Set(state.symptoms.filter((one) => one.present).map((one) => one.symptom));
  const lost = tree.symptoms.filter((symptom) => symptoms.has(symptom.key)).flatMap((symptom) => symptom.rulesOut ?? []);
  const done = state.order.events.flatMap((event) => stepDone(tree, state, event));
  const open = new Set(done.flatMap((step) => (step.opens ? [step.opens.area] : [])));
  const lostStates = new Set<EngineState>(lost);
  const ruledOut = new Set<EngineState>(inForce.flatMap(forbidden));
  const runs = (engine: EngineState): boolean => engine === "idling" || engine === "under-load";
  let hot = state.situation === "under-way" && !ruledOut.has("idling") && !lostStates.has("idling");
  let running = false;
  for (const { engine } of done) {
    if (engine === "any") continue;
    running = runs(engine);
    if (running) hot = true;
    else if (engine === "cold") hot = false;
  }
  return {
    hot,
    running,
    open,
    ruledOut,
    lost: lostStates,
    mayNotStart: inForce.some((rule) => forbidden(rule).includes("idling")),
    mustCall: inForce.some((rule) => rule.kind === "call" || rule.kind === "hand-over"),
    clearing: inForce.flatMap((rule) => rule.clearedBy.map((ref) => ref.check)),
  };
}

/** The step of an event, where it stands and was really done. */
function stepDone(tree: FaultTree, state: DiagnosisState, event: DiagnosisEvent): readonly (Check | Remedy)[] {
  if (event.kind === "answered") {
    const done =
      state.answers.get(event.payload.check) === event && !("cannotTell" in event.payload.answer) && !("notFitted" in event.payload.answer);
    return done ? tree.checks.filter((check) => check.key === event.payload.check) : [];
  }
  if (event.kind !== "remedy-tried" || state.remedies.get(event.payload.remedy) !== event || event.payload.result === "could-not")
    return [];
  return tree.remedies.filter((remedy) => remedy.key === event.payload.remedy);
}
