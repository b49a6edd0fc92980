import type { DiagnosisEvent } from "../contract/event";
import type { FaultTree, StopRule } from "../tree/schema";
import { believe } from "./believe";
import { compile } from "./compile";
import { crankSeconds } from "./crank-seconds";
import type { Evidence } from "./evidence";
import { evidenceOf } from "./evidence-of";
import { fold, type DiagnosisState } from "./fold";
import type { Compile } from "./keep-models";
import type { Model } from "./model";
import { nextStep } from "./next-step";
import { possible } from "./possible";
import { settingOf } from "./setting-of";
import { putRightShown } from "./show-put-right";
import { answerSaid, said } from "./show-said";
import { showStep } from "./show-step";
import { mayRunOn, rulesInForce, rulesToAsk, standingRules } from "./stop-rules";
import type { DiagnosisView, RuleShown, StepShown } from "./view";
import { RESULTS_SAID } from "./words";

/**
 * What a screen of a diagnosis shows, from the tree and the log alone: the same
 * on the phone, on the server and in print. Rules [X1]-[X7].
 *
 * @param log the events in any order, with any repeats.
 * @param models how a tree is compiled; hand in keepModels() to spare compiling it at each answer.
 */
export function view(tree: FaultTree, log: readonly DiagnosisEvent[], models: Compile = compile): DiagnosisView {
  const state = fold(log);
  const setting = settingOf(tree, state);
  const model = models(tree, setting);
  const evidence = evidenceOf(tree, state);
  const belief = believe(model, evidence);
  const toAsk = state.begun && !state.ended ? rulesToAsk(tree, state) : [];
  const inForce = rulesInForce(tree, state);
  const shown = (rule: StopRule): RuleShown => ruleShown(rule, mayRunOn(rule, tree, state));
  const cured = curedCause(model, state, belief.shares);
  const goesOn = state.begun !== null && state.ended === null && toAsk.length === 0 && cured === null;
  return {
    begun: state.begun !== null,
    situation: state.situation,
    person: setting.person,
    profile: { ...state.profile, features: setting.profile.features },
    multipliers: setting.multipliers ?? [],
    symptoms: state.symptoms.map(({ symptom, present }) => ({ key: symptom, title: titleOf(tree.symptoms, symptom), present })),
    said: said(tree, state),
    conflicts: conflictsShown(tree, state),
    rulesToAsk: toAsk.map(shown),
    rules: standingRules(tree, state).map(({ rule, ...standing }) => ({ ...shown(rule), ...standing })),
    rulesInForce: inForce.map(shown),
    step: goesOn ? stepShown(model, evidence, inForce) : null,
    possible: possible(model, evidence, belief),
    crankSeconds: crankSeconds(tree, state),
    outcome: state.ended ? { ...state.ended.payload, event: state.ended.id, at: state.ended.madeAt } : null,
    curedCause: cured,
    putRight: putRightShown(model, state, belief),
    runsAgain: state.runsAgain,
  };
}

const titleOf = (nodes: readonly { key: string; title: string }[], key: string): string =>
  nodes.find((node) => node.key === key)?.title ?? key;

function stepShown(model: Model, evidence: Evidence, inForce: readonly StopRule[]): StepShown {
  const step = nextStep(model, evidence);
  const clears = inForce.filter((rule) => rule.clearedBy.some((ref) => ref.check === step.key)).map((rule) => rule.title);
  return showStep(model, evidence, step, clears);
}

const ruleShown = (rule: StopRule, runOn: boolean): RuleShown => ({
  key: rule.key,
  title: rule.title,
  kind: rule.kind,
  ask: rule.ask ?? null,
  because: rule.because,
  says: rule.says,
  runOn,
  clearedWhen: rule.clearedWhen ?? null,
  drawing: rule.drawing ?? null,
});

function conflictsShown(tree: FaultTree, state: DiagnosisState): DiagnosisView["conflicts"] {
  return state.conflicts.map((events) => {
    const [first] = events;
    const step = first?.kind === "answered" ? first.payload.check : (first?.payload.remedy ?? "");
    const answers = events.map((event) => ({
      event: event.id,
      says: event.kind === "answered" ? answerSaid(tree, state, event) : RESULTS_SAID[event.payload.result],
      device: event.device,
    }));
    return { step, title: titleOf([...tree.checks, ...tree.remedies], step), answers };
  });
}

/** The likeliest cause that the remedy which cured has a link to. Rule [X7]. */
function curedCause(model: Model, state: DiagnosisState, shares: Float64Array): DiagnosisView["curedCause"] {
  const event = [...state.remedies.values()].findLast((tried) => tried.payload.result === "cured" && tried !== state.partCure?.event);
  if (!event) return null;
  const key = event.payload.remedy;
  const remedy = model.tree.remedies.find((one) => one.key === key);
  const ranked = model.causes.map((cause, index) => ({ cause, share: shares[index] ?? 0 })).sort((a, b) => b.share - a.share);
  const cause = ranked.find(({ cause }) => cause.curedBy[key] !== undefined) ?? ranked[0];
  return cause ? { cause: cause.cause.key, remedy: key, temporary: remedy?.temporary === true, proof: event.payload.proof ?? null } : null;
}
