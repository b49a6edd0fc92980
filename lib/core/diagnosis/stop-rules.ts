import { shareOfEngines } from "../tree/applies";
import type { DiagnosisEvent, EventOf } from "../contract/event";
import type { EngineState, FaultTree, StopRule } from "../tree/schema";
import { crankSeconds } from "./crank-seconds";
import { findingFrom } from "./read-answer";
import type { DiagnosisState } from "./fold";

/** A rule that names no engine states forbids what its kind means. Rule [T5]. */
const FORBIDS: Readonly<Record<StopRule["kind"], readonly EngineState[]>> = {
  stop: ["cranking", "idling", "under-load"],
  "no-crank": ["cranking", "idling", "under-load"],
  call: [],
  "hand-over": [],
};

/** Engine states that a rule takes away; an engine that may not be cranked cannot be started either. */
export function forbidden(rule: StopRule): readonly EngineState[] {
  const named = rule.forbids.length > 0 ? rule.forbids : FORBIDS[rule.kind];
  return named.includes("cranking") ? [...new Set<EngineState>([...named, "idling", "under-load"])] : named;
}

const applying = (tree: FaultTree, state: DiagnosisState): readonly StopRule[] =>
  tree.stopRules.filter((rule) => shareOfEngines(rule.appliesTo, state.profile, state.situation, tree.features) > 0);

/** Rules to be asked before anything else: those that go with the symptoms told, and have no answer yet. Rule [T1]. */
export function rulesToAsk(tree: FaultTree, state: DiagnosisState): readonly StopRule[] {
  const reported = new Set(state.symptoms.filter((one) => one.present).map((one) => one.symptom));
  const inForce = new Set(rulesInForce(tree, state));
  return applying(tree, state).filter(
    (rule) =>
      rule.ask !== undefined &&
      !inForce.has(rule) &&
      (rule.when.symptoms === "*" || rule.when.symptoms.some((symptom) => reported.has(symptom))) &&
      answersTo(rule, state).length === 0,
  );
}

/**
 * How a rule stands. `answer`: a rule in force is a "yes", however it came into force. `found`: in force by a finding or
 * by cranking, with nobody's yes standing. `event`: the answer that another takes the place of; null where none does.
 */
export type RuleStanding = {
  readonly rule: StopRule;
  readonly due: boolean;
  readonly answer: "yes" | "no" | null;
  readonly found: boolean;
  readonly event: string | null;
};

/** Every rule that a person can be asked of this engine, due or not, with the answer that stands: danger may turn up at any time. */
export function standingRules(tree: FaultTree, state: DiagnosisState): readonly RuleStanding[] {
  const due = new Set(rulesToAsk(tree, state));
  const inForce = new Set(rulesInForce(tree, state));
  return applying(tree, state)
    .filter((rule) => rule.ask !== undefined || inForce.has(rule))
    .map((rule) => {
      const last = state.order.events.findLast(
        (event): event is EventOf<"rule-answered"> =>
          event.kind === "rule-answered" && event.payload.rule === rule.key && state.live.has(event),
      );
      // A rule that was lifted comes into force again by a new answer, not by one in the place of the lifting.
      const replaced = last && last.payload.answer !== "cleared" ? last.id : null;
      const found = inForce.has(rule) && last?.payload.answer !== "yes";
      return { rule, due: due.has(rule), answer: inForce.has(rule) ? "yes" : last ? "no" : null, found, event: replaced };
    });
}

/** Rules in force: told, found or cranked into force, and not cleared since by someone who knew. Rules [T2], [T3]. */
export function rulesInForce(tree: FaultTree, state: DiagnosisState): readonly StopRule[] {
  const seconds = crankSeconds(tree, state);
  return applying(tree, state).filter(
    (rule) =>
      (rule.when.crankSeconds !== undefined && seconds >= rule.when.crankSeconds) ||
      triggers(tree, rule, state).some((trigger) => !isCleared(tree, rule, trigger, state)),
  );
}

function answersTo(rule: StopRule, state: DiagnosisState): readonly EventOf<"rule-answered">[] {
  return [...state.live].filter(
    (event): event is EventOf<"rule-answered"> => event.kind === "rule-answered" && event.payload.rule === rule.key,
  );
}

/** Findings as they stand, and in conflict: what might be dangerous counts until someone picks. */
function findingsOf(
  tree: FaultTree,
  state: DiagnosisState,
): readonly { event: DiagnosisEvent; check: string; finding: string | null; settled: boolean }[] {
  const told = [...state.answers.values()].map((event) => ({ event, settled: true }));
  const disputed = state.conflicts.flat().flatMap((event) => (event.kind === "answered" ? [{ event, settled: false }] : []));
  return [...told, ...disputed].map(({ event, settled }) => ({
    event,
    settled,
    check: event.payload.check,
    finding: findingFrom(tree, state, event),
  }));
}

function triggers(tree: FaultTree, rule: StopRule, state: DiagnosisState): readonly DiagnosisEvent[] {
  const said = answersTo(rule, state).filter((event) => event.payload.answer === "yes");
  const found = findingsOf(tree, state).filter(({ check, finding }) =>
    rule.when.findings.some((ref) => ref.check === check && ref.finding === finding),
  );
  return [...said, ...found.map(({ event }) => event)];
}

function isCleared(tree: FaultTree, rule: StopRule, trigger: DiagnosisEvent, state: DiagnosisState): boolean {
  const byHand = rule.clearedWhen === undefined ? [] : answersTo(rule, state).filter((event) => event.payload.answer === "cleared");
  const byFinding = findingsOf(tree, state).filter(
    ({ check, finding, settled }) => settled && rule.clearedBy.some((ref) => ref.check === check && ref.finding === finding),
  );
  return [...byHand, ...byFinding.map(({ event }) => event)].some((event) => state.order.before(trigger, event));
}

/**
 * Is "run on to safety" worth saying? Not beside a rule against cranking while
 * the engine is said not to run at all: there is nothing to run on with.
 */
export function mayRunOn(rule: StopRule, tree: FaultTree, state: Pick<DiagnosisState, "symptoms">): boolean {
  if (!rule.runOnIfStoppingEndangers || rule.kind !== "no-crank") return rule.runOnIfStoppingEndangers;
  const told = new Set(state.symptoms.filter(({ present }) => present).map(({ symptom }) => symptom));
  return !tree.symptoms.some(({ key, rulesOut }) => told.has(key) && rulesOut?.includes("idling"));
}
