import { safetyOf, cautionsOf } from "../tree/safety-steps";
import type { Check, Remedy } from "../tree/schema";
import { bandsOf } from "../units/bands";
import { clockMinutes } from "./costs";
import { AT_REST, type Evidence } from "./evidence";
import { reportedIn } from "./finding-weight";
import type { Model } from "./model";
import type { NextStep } from "./next-step";
import { whyStep } from "./reasons";
import type { StepShown } from "./view";

/** A step as the screen shows it: cautions and safety steps in place, answers, bands in numbers. Rules [X4], [X5]. */
export function showStep(model: Model, evidence: Evidence, step: NextStep, clears: readonly string[]): StepShown {
  if (step.kind === "call")
    return {
      ...CALL,
      why: whyStep(model, evidence, step, clears, null),
      minutes: Math.round(step.minutes),
      goOn: step.goOn && showStep(model, evidence, step.goOn, clears),
    };
  const compiled =
    step.kind === "check" ? model.checks[model.checkAt.get(step.key) ?? -1] : model.remedies[model.remedyAt.get(step.key) ?? -1];
  if (!compiled) throw new Error(`the planner chose "${step.key}", which the model does not have`);
  const node: Check | Remedy = "check" in compiled ? compiled.check : compiled.remedy;
  const minutes = clockMinutes(node, evidence.standing ?? AT_REST);
  const safety = safetyOf(node, model.setting.profile);
  const marked = (texts: readonly string[], isSafety: boolean) => texts.map((text) => ({ text, safety: isSafety }));
  const shown = {
    key: node.key,
    title: node.title,
    why: whyStep(model, evidence, step, clears, minutes),
    minutes: Math.max(1, Math.round(minutes)),
    engine: node.engine,
    tools: node.tools,
    ifFitted: compiled.share < 1,
    cautions: cautionsOf(node, model.tree, model.setting.profile),
    steps: [...marked(safety.first, true), ...marked(node.steps, false), ...marked(safety.last, true)],
    drawing: node.drawing ?? null,
    cranks: node.flags.cranks ?? null,
    who: node.who,
    goOn: null,
  };
  return "ask" in node ? { ...shown, ...checkParts(model, evidence, node) } : { ...shown, ...remedyParts(node) };
}

function checkParts(model: Model, evidence: Evidence, check: Check) {
  const bands = check.reading ? bandsOf(check.reading, model.setting.profile, model.tree.features) : null;
  const titleOf = (key: string): string => check.findings.find((finding) => finding.key === key)?.title ?? key;
  return {
    kind: "check" as const,
    parts: [],
    ask: check.ask,
    answers: check.findings.map((finding) => ({
      finding: finding.key,
      title: finding.title,
      withdraws: withdraws(check, finding.key, evidence),
    })),
    reading:
      check.reading && bands
        ? {
            quantity: check.reading.quantity,
            unit: check.reading.unit,
            from: check.reading.from,
            to: check.reading.to,
            bands: bands.map((band) => ({ ...band, title: titleOf(band.finding) })),
          }
        : null,
    proof: null,
    temporary: false,
  };
}

/** The symptom that this finding contradicts: reported, restated by another finding here, and this is what a sound engine shows. */
function withdraws(check: Check, key: string, evidence: Evidence): string | null {
  const reported = reportedIn(evidence);
  const finding = check.findings.find((one) => one.key === key);
  const opposite = finding?.usual === true || check.findings.length === 2;
  if (!opposite || (finding?.restates !== undefined && reported.has(finding.restates))) return null;
  return (
    check.findings.find((other) => other.key !== key && other.restates !== undefined && reported.has(other.restates))?.restates ?? null
  );
}

function remedyParts(remedy: Remedy) {
  return {
    kind: "remedy" as const,
    parts: remedy.parts,
    ask: "Did it cure it?",
    answers: [],
    reading: null,
    proof: remedy.proof,
    temporary: remedy.temporary === true,
  };
}

const CALL: StepShown = {
  kind: "call",
  key: "call",
  title: "Call for help",
  why: "",
  minutes: 0,
  engine: "any",
  tools: [],
  parts: [],
  ifFitted: false,
  cautions: [],
  steps: [
    { text: "Make the boat safe: sail, anchor or a berth comes before the engine.", safety: true },
    { text: "Call, and read out or send the hand-over: what was seen, what was tried, what is still possible.", safety: false },
    { text: "Leave everything as it was found, and say what has been opened.", safety: false },
  ],
  ask: "What came of it?",
  answers: [],
  reading: null,
  drawing: null,
  cranks: null,
  proof: null,
  temporary: false,
  who: "skipper-at-sea",
  goOn: null,
};
