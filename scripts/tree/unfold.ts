import { CORE_VERSION } from "@/lib/core/diagnosis/core-version";
import { evidenceOf } from "@/lib/core/diagnosis/evidence-of";
import { reportedIn } from "@/lib/core/diagnosis/finding-weight";
import { fold } from "@/lib/core/diagnosis/fold";
import { keepModels } from "@/lib/core/diagnosis/keep-models";
import { logOf, type Payload } from "@/lib/core/diagnosis/log-of";
import type { Model } from "@/lib/core/diagnosis/model";
import { nextStep, type NextStep } from "@/lib/core/diagnosis/next-step";
import { outcomesOf } from "@/lib/core/diagnosis/outcomes";
import { settingOf } from "@/lib/core/diagnosis/setting-of";
import { rulesToAsk } from "@/lib/core/diagnosis/stop-rules";
import type { EventOf } from "@/lib/core/contract/event";
import type { FaultTree } from "@/lib/core/tree/schema";

export type Begin = Pick<EventOf<"begun">["payload"], "profile" | "situation" | "person" | "symptoms">;

/** One step of the order of questions, and where its likelier answers lead. */
export type Unfolded = {
  kind: NextStep["kind"];
  title: string;
  minutes: number;
  branches: { says: string; chance: number; then: Unfolded | null; possible: Possible[] }[];
  /** Answers too rare to follow, likeliest first. */
  rare: { says: string; chance: number }[];
};

export type Possible = { title: string; share: number };

/** How far to follow: steps deep, and answers at least so likely. */
export type Bounds = { depth: number; chance: number };

/** The order of questions for a complaint, as the planner would ask them, with every stop rule answered no. */
export function unfold(tree: FaultTree, begin: Begin, bounds: Bounds): { rules: string[]; first: Unfolded | null; possible: Possible[] } {
  const models = keepModels();
  const begun: Payload = {
    kind: "begun",
    payload: { ...begin, engineId: "engine", treeVersionId: "tree", multipliers: [], coreVersion: CORE_VERSION },
  };
  const rules = rulesToAsk(tree, fold(logOf([begun])));
  const start: Payload[] = [begun, ...rules.map(({ key }): Payload => ({ kind: "rule-answered", payload: { rule: key, answer: "no" } }))];

  const planAt = (log: readonly Payload[]) => {
    const state = fold(logOf(log));
    const model = models(tree, settingOf(tree, state));
    const evidence = evidenceOf(tree, state);
    return { model, evidence, step: nextStep(model, evidence) };
  };
  const follow = (log: readonly Payload[], depth: number): Unfolded => {
    const { model, evidence, step } = planAt(log);
    const answers = answersTo(model, step, reportedIn(evidence)).sort((a, b) => b.chance - a.chance);
    const likely = answers.filter(({ chance }, index) => index === 0 || chance >= bounds.chance);
    return {
      kind: step.kind,
      title: titleOf(model, step),
      minutes: Math.max(1, Math.round(step.minutes)),
      branches: likely.map(({ says, chance, event, ends }) => {
        const next = [...log, event];
        return { says, chance, possible: likeliest(planAt(next)), then: ends || depth <= 1 ? null : follow(next, depth - 1) };
      }),
      rare: answers.slice(likely.length).map(({ says, chance }) => ({ says, chance })),
    };
  };
  return { rules: rules.map(({ ask, title }) => ask ?? title), first: follow(start, bounds.depth), possible: likeliest(planAt(start)) };
}

type AnswerTo = { says: string; chance: number; event: Payload; ends: boolean };

function answersTo(model: Model, step: NextStep, reported: ReadonlySet<string>): AnswerTo[] {
  if (step.kind === "call") return [];
  const chanceOf = (row: Float64Array | undefined) => step.shares.reduce((sum, share, index) => sum + share * (row?.[index] ?? 0), 0);
  if (step.kind === "remedy") {
    const cured = chanceOf(model.remedies[model.remedyAt.get(step.key) ?? -1]?.cure);
    const answer = (result: "cured" | "no-change", says: string, chance: number): AnswerTo => ({
      says,
      chance,
      event: { kind: "remedy-tried", payload: { remedy: step.key, result, photos: [] } },
      ends: result === "cured",
    });
    return [answer("cured", "cured", cured), answer("no-change", "no change", 1 - cured)];
  }
  const check = model.checks[model.checkAt.get(step.key) ?? -1];
  if (check === undefined) return [];
  const { predict } = outcomesOf(model, check, reported);
  return check.check.findings.map(({ key, title }, index) => ({
    says: title,
    chance: chanceOf(predict[index]),
    event: { kind: "answered", payload: { check: step.key, answer: { finding: key }, photos: [] } },
    ends: false,
  }));
}

function titleOf(model: Model, { kind, key }: NextStep): string {
  if (kind === "call") return "Call for help";
  return (
    (kind === "check"
      ? model.checks[model.checkAt.get(key) ?? -1]?.check.title
      : model.remedies[model.remedyAt.get(key) ?? -1]?.remedy.title) ?? key
  );
}

function likeliest({ model, step }: { model: Model; step: NextStep }): Possible[] {
  const named = model.causes.map(({ title }, index) => ({ title, share: step.shares[index] ?? 0 }));
  return [...named, { title: "something not in this tree", share: step.shares[model.unknownAt] ?? 0 }]
    .sort((a, b) => b.share - a.share)
    .slice(0, 3);
}
