import { baseRateMinutes } from "@/lib/core/diagnosis/base-rate-order";
import { candidatesOf } from "@/lib/core/diagnosis/candidates";
import { settingFor } from "@/lib/core/diagnosis/case-evidence";
import { probabilityOf } from "@/lib/core/diagnosis/cause-row";
import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import { COSTS } from "@/lib/core/diagnosis/costs";
import { AT_REST, type Evidence } from "@/lib/core/diagnosis/evidence";
import { evidenceOf } from "@/lib/core/diagnosis/evidence-of";
import { reportedIn } from "@/lib/core/diagnosis/finding-weight";
import { fold } from "@/lib/core/diagnosis/fold";
import { Gates } from "@/lib/core/diagnosis/gates";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { logOf, type Payload } from "@/lib/core/diagnosis/log-of";
import type { CheckModel, Model } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { outcomesOf } from "@/lib/core/diagnosis/outcomes";
import { settingOf } from "@/lib/core/diagnosis/setting-of";
import { rulesToAsk } from "@/lib/core/diagnosis/stop-rules";
import type { Cause, FaultTree, KnownCase, Situation, Who } from "@/lib/core/tree/schema";

export type PlayedCause = {
  readonly cause: string;
  readonly symptom: string;
  readonly end: "cured" | "held" | "called";
  /** Called where nothing is left here that cures this cause: no remedy for these hands, or a rule that says to call. */
  readonly rightlyHandedOver: boolean;
  readonly minutes: number;
  readonly baseRateMinutes: number;
  readonly steps: readonly string[];
  /** Share of the true cause when it ended. */
  readonly share: number;
  /** Checks under ten minutes that would have told a nat for less than it costs whoever is called. */
  readonly cheapLeft: readonly string[];
};

/** A middling engine; what the cause applies to stands over it. */
const ENGINE: Readonly<Record<string, string>> = {
  cooling: "heat-exchanger",
  exhaust: "wet",
  injection: "in-line-pump",
  "pre-heat": "glow-plugs",
  "primary-filter": "fitted",
  "mechanical-lift-pump": "fitted",
  "electric-lift-pump": "not-fitted",
  turbo: "none",
  governor: "mechanical",
  voltage: "v12",
  "second-engine": "not-fitted",
};

/** So often does a remedy have to cure a cause to be called its cure. */
const CURES = 0.5;

/** Every cause that can show a symptom here, with the symptom it shows most. */
export function causesToPlay(tree: FaultTree, situation: Situation): readonly { cause: Cause; symptom: string }[] {
  return tree.causes.flatMap((cause) => {
    const [most] = Object.entries(cause.shows).sort((a, b) => probabilityOf(b[1]) - probabilityOf(a[1]));
    const here = cause.appliesTo?.situations?.includes(situation) ?? true;
    return most && here ? [{ cause, symptom: most[0] }] : [];
  });
}

/**
 * Plays the diagnosis of an engine that has this one cause: each check shows
 * what the cause most likely shows, each remedy does what the tree says of it.
 */
export function playCause(tree: FaultTree, cause: Cause, symptom: string, person: Who, situation: Situation): PlayedCause {
  const features = {
    ...ENGINE,
    ...Object.fromEntries(Object.entries(cause.appliesTo?.features ?? {}).map(([key, [first]]) => [key, first!])),
  };
  const known: KnownCase = {
    key: cause.key,
    title: cause.title,
    features,
    figures: {},
    situation,
    symptoms: [symptom],
    findings: [],
    causes: [cause.key],
    alsoAccept: [],
    source: "made for this test",
  };
  const models = keepModels();
  const { profile } = settingFor(known, person);
  const log: Payload[] = [
    {
      kind: "begun",
      payload: {
        engineId: "engine",
        treeVersionId: "tree",
        profile,
        situation,
        person,
        symptoms: [symptom],
        multipliers: [],
        coreVersion: CORE_VERSION,
      },
    },
  ];
  for (const rule of rulesToAsk(tree, fold(logOf(log)))) log.push({ kind: "rule-answered", payload: { rule: rule.key, answer: "no" } });
  const steps: string[] = [];
  let minutes = 0;
  for (;;) {
    const state = fold(logOf(log));
    const model = models(tree, settingOf(tree, state));
    const evidence = evidenceOf(tree, state);
    const step = nextStep(model, evidence);
    minutes += step.minutes;
    const at = model.causeAt.get(cause.key) ?? -1;
    const ended = (end: PlayedCause["end"]): PlayedCause => ({
      cause: cause.key,
      symptom,
      end,
      rightlyHandedOver: end === "called" && (evidence.standing?.mustCall === true || !curableHere(model, evidence, step.shares, cause)),
      minutes,
      baseRateMinutes: baseRateMinutes(tree, known, person),
      steps: [...steps, step.kind === "check" ? step.key : `[${step.key}]`],
      share: step.shares[at] ?? 0,
      cheapLeft: end === "called" ? cheapLeft(model, evidence, step.shares) : [],
    });
    if (step.kind === "call") return ended("called");
    if (step.kind === "check") {
      const check = model.checks[model.checkAt.get(step.key) ?? -1]!;
      const finding = likeliest(model, check, at, evidence);
      steps.push(`${step.key}=${finding}`);
      log.push({ kind: "answered", payload: { check: step.key, answer: { finding }, photos: [] } });
      continue;
    }
    const strength = cause.curedBy[step.key];
    if (strength !== undefined && probabilityOf(strength) >= CURES)
      return ended(tree.remedies.find(({ key }) => key === step.key)?.temporary ? "held" : "cured");
    steps.push(`[${step.key}]`);
    log.push({ kind: "remedy-tried", payload: { remedy: step.key, result: "no-change", photos: [] } });
  }
}

function likeliest(model: Model, check: CheckModel, at: number, evidence: Evidence): string {
  const { predict } = outcomesOf(model, check, reportedIn(evidence));
  const most = predict.reduce((best, row, finding) => ((row[at] ?? 0) > (predict[best]?.[at] ?? 0) ? finding : best), 0);
  return check.check.findings[most]?.key ?? "";
}

/** Is there a remedy for it that is not yet done, that these hands may do, and that is not shut for good? */
function curableHere(model: Model, evidence: Evidence, shares: Float64Array, cause: Cause): boolean {
  const gates = new Gates(model, evidence, evidence.standing ?? AT_REST, shares);
  return model.remedies.some((remedy) => {
    const strength = cause.curedBy[remedy.key];
    if (strength === undefined || probabilityOf(strength) < CURES || !gates.isFeasible(remedy)) return false;
    if (evidence.standing?.mayNotStart && remedy.remedy.tryOut.minutes > 0) return false;
    const gate = gates.gateOf(remedy);
    return gate.open || !gate.shut;
  });
}

/** Minutes that a look has to spare whoever is called, beyond its own, to be missed: causes under 1 in 500 are not reckoned with. */
const SPARES = 2;

/** Checks under ten minutes that would still tell a nat for less than it costs whoever is called. */
function cheapLeft(model: Model, evidence: Evidence, shares: Float64Array): readonly string[] {
  if (evidence.standing?.mustCall) return [];
  const gates = new Gates(model, evidence, evidence.standing ?? AT_REST, shares);
  return candidatesOf(model, evidence, gates, shares)
    .filter(({ minutes, information }) => minutes < 10 && COSTS.helperFinds * information - minutes > SPARES)
    .map(({ check }) => check.key);
}
