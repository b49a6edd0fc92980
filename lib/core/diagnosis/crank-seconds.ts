import type { DiagnosisEvent } from "../contract/event";
import type { EngineState, FaultTree } from "../tree/schema";
import type { DiagnosisState } from "./fold";

const RUNS: readonly EngineState[] = ["idling", "under-load"];

/**
 * Seconds of cranking since the engine last ran, or since the exhaust was
 * drained, over all steps and bursts. Rule [T4]. A step that was put off ("can't
 * tell", "could not") has not turned the starter; a changed answer has not turned it again.
 */
export function crankSeconds(tree: FaultTree, state: DiagnosisState): number {
  const checks = new Map(tree.checks.map((check) => [check.key, check]));
  const remedies = new Map(tree.remedies.map((remedy) => [remedy.key, remedy]));
  const drains = new Set(tree.stopRules.filter((rule) => rule.when.crankSeconds !== undefined).map((rule) => rule.key));
  const drainFindings = new Set(
    tree.stopRules.filter((rule) => drains.has(rule.key)).flatMap((rule) => rule.clearedBy.map((ref) => `${ref.check}=${ref.finding}`)),
  );
  let seconds = 0;
  const happened = (event: DiagnosisEvent): void => {
    if (event.kind === "cranked") seconds = event.payload.ran ? 0 : seconds + event.payload.seconds;
    else if (event.kind === "runs-again") seconds = 0;
    else if (event.kind === "rule-answered" && event.payload.answer === "cleared" && drains.has(event.payload.rule)) seconds = 0;
    else if (event.kind === "answered" && !("cannotTell" in event.payload.answer) && !("notFitted" in event.payload.answer)) {
      const check = checks.get(event.payload.check);
      const finding = "finding" in event.payload.answer ? event.payload.answer.finding : null;
      if (check && RUNS.includes(check.engine)) seconds = 0;
      else seconds += event.supersedes === undefined ? (check?.flags.cranks ?? 0) : 0;
      if (drainFindings.has(`${event.payload.check}=${finding}`)) seconds = 0;
    } else if (event.kind === "remedy-tried" && event.payload.result !== "could-not") {
      seconds += event.supersedes === undefined ? (remedies.get(event.payload.remedy)?.flags.cranks ?? 0) : 0;
      if (event.payload.result === "cured") seconds = 0;
    }
  };
  for (const event of state.order.events) if (state.live.has(event)) happened(event);
  return seconds;
}
