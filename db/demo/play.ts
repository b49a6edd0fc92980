import type { EngineProfile } from "@/lib/core/contract/engine";
import type { Answer, DiagnosisEvent, EventKind, EventOf, Multiplier } from "@/lib/core/contract/event";
import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { view } from "@/lib/core/diagnosis/show";
import type { StepShown } from "@/lib/core/diagnosis/view";
import type { Cause, Check, FaultTree } from "@/lib/core/tree/schema";
import { STRENGTHS } from "@/lib/core/tree/strength";
import { steadyId } from "./steady-id";

export type Play = {
  key: string;
  device: string;
  engineId: string;
  treeVersionId: string;
  tree: FaultTree;
  profile: EngineProfile;
  symptom: string;
  complaint: string;
  /** What is really wrong: every answer follows from it. */
  cause: string;
  beginsAt: Date;
  /** What the engine's log says of its odds before the first question. */
  multipliers: Multiplier[];
  /** Leave after so many steps, with nothing decided. */
  steps?: number;
  engineHours?: number | undefined;
  proved: boolean;
  note?: string | undefined;
};

const MOST_STEPS = 40;

/**
 * A diagnosis as a phone would have written it: the program asks, and the
 * answers are what the tree says the true cause gives, until a remedy cures it.
 */
export function play(run: Play): DiagnosisEvent[] {
  const { tree } = run;
  const cause = tree.causes.find((one) => one.key === run.cause);
  if (!cause) throw new Error(`the demo needs the cause "${run.cause}", which the tree does not have`);
  const models = keepModels();
  const events: DiagnosisEvent[] = [];
  let minutes = 0;
  const write = <K extends EventKind>(kind: K, payload: EventOf<K>["payload"], took = 1): void => {
    minutes += took;
    const sequence = events.length + 1;
    const madeAt = new Date(run.beginsAt.getTime() + minutes * 60_000).toISOString();
    const id = steadyId(`${run.key} event ${sequence}`);
    events.push({
      id,
      diagnosisId: steadyId(`${run.key} diagnosis`),
      device: run.device,
      sequence,
      madeAt,
      seen: {},
      kind,
      payload,
    } as EventOf<K>);
  };

  const { engineId, treeVersionId, profile, complaint } = run;
  write("begun", {
    engineId,
    treeVersionId,
    profile,
    situation: "alongside",
    person: "skipper-in-port",
    symptoms: [run.symptom],
    complaint,
    multipliers: run.multipliers,
    coreVersion: CORE_VERSION,
  });
  for (const rule of view(tree, events, models).rulesToAsk) write("rule-answered", { rule: rule.key, answer: "no" });

  for (let steps = 0; steps < MOST_STEPS; steps++) {
    if (steps === run.steps) return events;
    const now = view(tree, events, models);
    if (now.curedCause) {
      const { remedy, proof } = now.curedCause;
      const proofIfAny = run.proved && proof ? { proof } : {};
      const parts = (tree.remedies.find((one) => one.key === remedy)?.parts ?? []).map(({ key, title, quantity }) => ({
        key,
        title,
        quantity,
      }));
      write(
        "ended",
        {
          outcome: run.proved ? "cured" : "held",
          cause: cause.key,
          remedy,
          ...proofIfAny,
          engineHours: run.engineHours,
          minutes,
          parts,
          note: run.note,
        },
        4,
      );
      return events;
    }
    if (!now.step || now.step.kind === "call") break;
    answer(now.step);
  }
  write("ended", { outcome: "handed-over", parts: [], note: run.note, engineHours: run.engineHours });
  return events;

  function answer(step: StepShown): void {
    const took = Math.max(1, Math.round(step.minutes));
    const check = tree.checks.find((one) => one.key === step.key);
    if (step.kind === "check" && check)
      return write("answered", { check: check.key, answer: answerOf(check, step, cause as Cause), photos: [] }, took);
    const cures = cause?.curedBy[step.key];
    const result = cures !== undefined && strengthOf(cures) >= 0.5 ? "cured" : "no-change";
    write(
      "remedy-tried",
      { remedy: step.key, result, ...(result === "cured" && run.proved && step.proof ? { proof: step.proof } : {}), photos: [] },
      took,
    );
  }
}

/** The finding that the cause gives most, else the usual one; where there is a gauge, the middle of that finding's band. */
function answerOf(check: Check, step: StepShown, cause: Cause): Answer {
  const usual = check.findings.find((finding) => finding.usual) ?? check.findings[0];
  const links = Object.entries(cause.gives[check.key] ?? {})
    .map(([finding, link]) => ({ finding: finding.split("..")[0] ?? finding, weight: weightOf(link) }))
    .filter((link) => link.weight > 1)
    .sort((a, b) => b.weight - a.weight);
  const finding = links[0]?.finding ?? usual?.key ?? "";
  const band = step.reading?.bands.find((one) => one.finding === finding);
  if (!step.reading || !band) return { finding };
  const middle = (band.from + Math.min(band.to, band.from === 0 ? band.to : band.from * 1.4)) / 2;
  return { value: Number(middle.toPrecision(2)), unit: step.reading.unit };
}

/** How far a link moves a finding above what a sound engine shows: words over one half count as telling. */
function weightOf(link: Cause["gives"][string][string]): number {
  if (typeof link === "string" && link.startsWith("x")) return link.startsWith("x1/") ? 1 / Number(link.slice(3)) : Number(link.slice(1));
  return strengthOf(link as keyof typeof STRENGTHS | number) >= 0.5 ? 10 : 1;
}

const strengthOf = (strength: keyof typeof STRENGTHS | number): number => (typeof strength === "number" ? strength : STRENGTHS[strength]);
