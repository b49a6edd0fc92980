import type { FaultTree, KnownCase, StopRule, Who } from "../tree/schema";
import { answerOf, settingFor } from "./case-evidence";
import { probabilityOf } from "./cause-row";
import { CORE_VERSION } from "./core-version";
import { evidenceOf } from "./evidence-of";
import { fold, type DiagnosisState } from "./fold";
import { keepModels } from "./keep-models";
import { logOf, type Payload } from "./log-of";
import { nextStep } from "./next-step";
import { settingOf } from "./setting-of";
import { rulesInForce, rulesToAsk } from "./stop-rules";

export type Played = {
  readonly minutes: number;
  readonly end: "cured" | "held" | "called";
  /** Kind and key of each step, in order. */
  readonly steps: readonly { readonly kind: "check" | "remedy" | "call"; readonly key: string; readonly minutes: number }[];
};

/** Somebody who is as sure as this of one cause puts it right, and says that the rule's reason is found. */
const SETTLED = 0.5;

/** More steps than any sound tree has. */
const STEPS_MOST = 1000;

/**
 * Plays a known case through the planner: a check that the case does not answer
 * is "can't tell" and costs its minutes, a true cause's remedy cures, a
 * temporary one holds, and a call ends it at its price. Rule [V2].
 */
export function playCase(tree: FaultTree, known: KnownCase, person: Who): Played {
  const models = keepModels();
  const log = startOf(known, person);
  for (const rule of rulesToAsk(tree, fold(logOf(log)))) log.push({ kind: "rule-answered", payload: { rule: rule.key, answer: "no" } });
  const open = new Set(known.causes);
  const lifted = new Set<string>();
  const steps: { kind: "check" | "remedy" | "call"; key: string; minutes: number }[] = [];
  const minutes = (): number => steps.reduce((sum, step) => sum + step.minutes, 0);
  while (steps.length < STEPS_MOST) {
    const state = fold(logOf(log));
    const model = models(tree, settingOf(tree, state));
    const step = nextStep(model, evidenceOf(tree, state));
    const lift = step.kind === "call" && likeliestShare(step.shares, model.unknownAt) > SETTLED ? liftable(tree, state, lifted) : undefined;
    if (lift) {
      lifted.add(lift.key);
      log.push({ kind: "rule-answered", payload: { rule: lift.key, answer: "cleared" } });
      continue;
    }
    steps.push({ kind: step.kind, key: step.key, minutes: step.minutes });
    if (step.kind === "call") return { minutes: minutes(), end: "called", steps };
    if (step.kind === "check") {
      const answer = ofWhatIsLeft(tree, known, open, step.key) ? answerOf(known, step.key) : null;
      log.push({ kind: "answered", payload: { check: step.key, answer: answer ?? { cannotTell: true }, photos: [] } });
      continue;
    }
    const cured = curedBy(tree, open, step.key);
    cured.forEach((cause) => open.delete(cause));
    if (open.size === 0)
      return { minutes: minutes(), end: tree.remedies.find(({ key }) => key === step.key)?.temporary ? "held" : "cured", steps };
    log.push({ kind: "remedy-tried", payload: { remedy: step.key, result: cured.length > 0 ? "better" : "no-change", photos: [] } });
  }
  throw new Error(`the case "${known.key}" did not end`);
}

/** A case was told of all its causes at once: what only those already put right would show is not seen again. */
function ofWhatIsLeft(tree: FaultTree, known: KnownCase, open: ReadonlySet<string>, check: string): boolean {
  const links = (keys: Iterable<string>): boolean => [...keys].some((key) => tree.causes.find((one) => one.key === key)?.gives[check]);
  return open.size === known.causes.length || links(open) || !links(known.causes);
}

const likeliestShare = (shares: Float64Array, unknownAt: number): number => Math.max(0, ...shares.subarray(0, unknownAt));

/** A rule in force that says how it is lifted by hand, and has not been yet. */
const liftable = (tree: FaultTree, state: DiagnosisState, lifted: ReadonlySet<string>): StopRule | undefined =>
  rulesInForce(tree, state).find(({ key, clearedWhen }) => clearedWhen !== undefined && !lifted.has(key));

/** Causes still open that the remedy rather cures than not. */
export const curedBy = (tree: FaultTree, open: ReadonlySet<string>, remedy: string): readonly string[] =>
  tree.causes
    .filter((cause) => open.has(cause.key) && cause.curedBy[remedy] !== undefined && probabilityOf(cause.curedBy[remedy]) >= 0.5)
    .map((cause) => cause.key);

function startOf(known: KnownCase, person: Who): Payload[] {
  const { profile, situation } = settingFor(known, person);
  const begun: Payload = {
    kind: "begun",
    payload: {
      engineId: "engine",
      treeVersionId: "tree",
      profile,
      situation,
      person,
      symptoms: known.symptoms,
      multipliers: [],
      coreVersion: CORE_VERSION,
    },
  };
  const told = known.findings.filter((finding) => finding.when === "start");
  return [
    begun,
    ...told.map(({ check }): Payload => ({
      kind: "answered",
      payload: { check, answer: answerOf(known, check) ?? { cannotTell: true }, photos: [] },
    })),
    ...(known.tried ?? [])
      .filter(({ when }) => when === "start")
      .map(({ remedy, result }): Payload => ({ kind: "remedy-tried", payload: { remedy, result, photos: [] } })),
  ];
}
