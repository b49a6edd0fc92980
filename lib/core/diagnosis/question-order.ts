import type { EventOf } from "../contract/event";
import type { FaultTree } from "../tree/schema";
import { CORE_VERSION } from "./core-version";
import { evidenceOf } from "./evidence-of";
import { fold } from "./fold";
import { keepModels } from "./keep-models";
import { logOf, type Payload } from "./log-of";
import type { Model } from "./model";
import { nextStep, type NextStep } from "./next-step";
import { possibleAnswers, type PossibleAnswer } from "./possible-answers";
import { settingOf } from "./setting-of";
import { rulesToAsk } from "./stop-rules";

/** What a diagnosis begins with: this engine, here, these hands, this complaint. */
export type Begin = Pick<EventOf<"begun">["payload"], "profile" | "situation" | "person" | "symptoms">;

export type LikelyCause = { readonly key: string; readonly title: string; readonly share: number };

/** One step of the order of questions, and where its likelier answers lead. */
export type OrderedStep = {
  readonly kind: NextStep["kind"];
  readonly key: string;
  readonly title: string;
  /** As the planner counts them. */
  readonly minutes: number;
  readonly branches: readonly OrderedBranch[];
  /** Answers too rare to follow, likeliest first. */
  readonly rare: readonly { readonly says: string; readonly chance: number }[];
};

export type OrderedBranch = {
  readonly says: string;
  readonly chance: number;
  /** What is likeliest after it. */
  readonly possible: readonly LikelyCause[];
  /** What comes next; null where it ends, or is too deep or too rare to follow. */
  then: OrderedStep | null;
};

export type QuestionOrder = {
  /** What the stop rules ask before all; the order goes on from "no" to each. */
  readonly rules: readonly string[];
  readonly first: OrderedStep;
  readonly possible: readonly LikelyCause[];
};

/** How far to follow: steps one after the other, answers at least so likely at their step, and steps in all. */
export type Bounds = { readonly depth: number; readonly chance: number; readonly steps: number };

type Open = {
  readonly branch: OrderedBranch;
  readonly log: readonly Payload[];
  readonly plan: Plan;
  readonly depth: number;
  readonly reach: number;
};

/**
 * The planner's policy for a complaint as an explicit tree of questions, for
 * the workshop and for a printed card. Branches likely to be met are followed
 * first, so a small bound keeps what matters. Rules [Q1]-[Q3].
 */
export function questionOrder(tree: FaultTree, begin: Begin, bounds: Bounds): QuestionOrder {
  const models = keepModels();
  const begun: Payload = {
    kind: "begun",
    payload: { ...begin, engineId: "engine", treeVersionId: "tree", multipliers: [], coreVersion: CORE_VERSION },
  };
  const rules = rulesToAsk(tree, fold(logOf([begun])));
  const start: Payload[] = [begun, ...rules.map(({ key }): Payload => ({ kind: "rule-answered", payload: { rule: key, answer: "no" } }))];
  const planAt = (log: readonly Payload[]): Plan => {
    const state = fold(logOf(log));
    const model = models(tree, settingOf(tree, state));
    const evidence = evidenceOf(tree, state);
    return { model, step: nextStep(model, evidence), answers: (step) => possibleAnswers(model, evidence, step) };
  };
  const open: Open[] = [];
  const follow = (plan: Plan, log: readonly Payload[], depth: number, reach: number): OrderedStep => {
    const answers = [...plan.answers(plan.step)].sort((a, b) => b.chance - a.chance);
    const likely = answers.filter(({ chance }, place) => place === 0 || chance >= bounds.chance);
    const branches = likely.map(({ says, chance, event, ends }): OrderedBranch => {
      const next = [...log, event];
      const then = ends ? null : planAt(next);
      const branch: OrderedBranch = { says, chance, possible: then ? likeliest(then) : [], then: null };
      if (then && depth < bounds.depth) open.push({ branch, log: next, plan: then, depth: depth + 1, reach: reach * chance });
      return branch;
    });
    return {
      kind: plan.step.kind,
      key: plan.step.key,
      title: titleOf(plan),
      minutes: plan.step.minutes,
      branches,
      rare: answers.slice(likely.length).map(({ says, chance }) => ({ says, chance })),
    };
  };
  const atFirst = planAt(start);
  const first = follow(atFirst, start, 1, 1);
  for (let steps = 1; steps < bounds.steps && open.length > 0; steps++) {
    const [next] = open.splice(
      open.reduce((best, one, place) => (one.reach > open[best]!.reach ? place : best), 0),
      1,
    );
    if (next) next.branch.then = follow(next.plan, next.log, next.depth, next.reach);
  }
  return { rules: rules.map(({ ask, title }) => ask ?? title), first, possible: likeliest(atFirst) };
}

type Plan = { readonly model: Model; readonly step: NextStep; readonly answers: (step: NextStep) => readonly PossibleAnswer[] };

function titleOf({ model, step: { kind, key } }: Plan): string {
  if (kind === "call") return "Call for help";
  const step = kind === "check" ? model.checks[model.checkAt.get(key) ?? -1]?.check : model.remedies[model.remedyAt.get(key) ?? -1]?.remedy;
  return step?.title ?? key;
}

/** So many causes are named. */
const NAMED = 3;

function likeliest({ model, step }: Plan): readonly LikelyCause[] {
  const causes = model.causes.map(({ key, title }, index) => ({ key, title, share: step.shares[index] ?? 0 }));
  const unknown = { key: "unknown", title: "something not in this tree", share: step.shares[model.unknownAt] ?? 0 };
  return [...causes, unknown].sort((a, b) => b.share - a.share || (a.key < b.key ? -1 : 1)).slice(0, NAMED);
}
