import type { DiagnosisEvent } from "../contract/event";
import type { EngineState, FaultTree } from "../tree/schema";
import type { DiagnosisState } from "./fold";

const RUNS: readonly EngineState[] = ["idling", "under-load"];

/**
 * Seconds of cranking since the engine last ran, or since the exhaust was
 * drained, over all steps and bursts. Rule [T4]. A step that was put off ("can't
 * tell", "could not") has not turned the starter. Bursts timed at a step are part
 * of what that step asks for: the longer of the two counts. A corrected answer has
 * not turned the starter again, and what was turned before it stays counted.
 */
export function crankSeconds(tree: FaultTree, state: DiagnosisState): number {
  const checks = new Map(tree.checks.map((check) => [check.key, check]));
  const remedies = new Map(tree.remedies.map((remedy) => [remedy.key, remedy]));
  const limits = tree.stopRules.filter((rule) => rule.when.crankSeconds !== undefined);
  const drains = new Set(limits.map((rule) => rule.key));
  const drainFindings = new Set(limits.flatMap((rule) => rule.clearedBy.map((ref) => `${ref.check}=${ref.finding}`)));
  const corrected = correctedOf(state);
  const turned = new Set<string>();
  let seconds = 0;
  let timed = 0;
  const drained = (): void => {
    seconds = 0;
    timed = 0;
  };
  const stepDone = (event: DiagnosisEvent, asked: number): void => {
    const before = event.supersedes !== undefined && turned.has(event.supersedes);
    if (!before) seconds += Math.max(0, asked - timed);
    turned.add(event.id);
    timed = 0;
  };
  const happened = (event: DiagnosisEvent, stands: boolean): void => {
    switch (event.kind) {
      case "cranked":
        if (event.payload.ran) return drained();
        seconds += event.payload.seconds;
        timed += event.payload.seconds;
        return;
      case "runs-again":
        return drained();
      case "rule-answered":
        if (event.payload.answer === "cleared" && drains.has(event.payload.rule)) drained();
        return;
      case "answered": {
        const { answer } = event.payload;
        if ("cannotTell" in answer || "notFitted" in answer) return void (timed = 0);
        const check = checks.get(event.payload.check);
        stepDone(event, check?.flags.cranks ?? 0);
        const finding = "finding" in answer ? answer.finding : null;
        const ran = check !== undefined && RUNS.includes(check.engine);
        if (stands && (ran || drainFindings.has(`${event.payload.check}=${finding}`))) drained();
        return;
      }
      case "remedy-tried":
        if (event.payload.result === "could-not") return void (timed = 0);
        stepDone(event, remedies.get(event.payload.remedy)?.flags.cranks ?? 0);
        if (stands && event.payload.result === "cured") drained();
    }
  };
  for (const event of state.order.events) {
    const stands = state.live.has(event);
    if (stands || corrected.has(event.id)) happened(event, stands);
  }
  return seconds;
}

/** Steps whose answer was changed afterwards: what they did to the engine was done. One that was taken back was not. */
function correctedOf(state: DiagnosisState): ReadonlySet<string> {
  const takenBack = new Set([...state.live].flatMap((event) => (event.kind === "taken-back" ? [event.payload.event] : [])));
  const superseded = state.order.events.flatMap((event) => event.supersedes ?? []);
  const steps = new Set(state.order.events.filter(({ kind }) => kind === "answered" || kind === "remedy-tried").map(({ id }) => id));
  return new Set(superseded.filter((id) => steps.has(id) && !takenBack.has(id)));
}
