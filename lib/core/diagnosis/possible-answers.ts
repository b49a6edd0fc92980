import type { Evidence } from "./evidence";
import { reportedIn } from "./finding-weight";
import type { Payload } from "./log-of";
import type { Model } from "./model";
import type { NextStep } from "./next-step";
import { outcomesOf } from "./outcomes";

export type PossibleAnswer = {
  readonly says: string;
  /** How likely it is, as things are believed now. */
  readonly chance: number;
  /** The event that tells it. */
  readonly event: Payload;
  /** Nothing comes after it. */
  readonly ends: boolean;
};

/** What can be answered to a step, in the tree's order; to a call, nothing. */
export function possibleAnswers(model: Model, evidence: Evidence, step: NextStep): readonly PossibleAnswer[] {
  if (step.kind === "call") return [];
  const chanceOf = (row: Float64Array | undefined): number =>
    step.shares.reduce((sum, share, index) => sum + share * (row?.[index] ?? 0), 0);
  if (step.kind === "remedy") {
    const cured = chanceOf(model.remedies[model.remedyAt.get(step.key) ?? -1]?.cure);
    const answer = (result: "cured" | "no-change", says: string, chance: number): PossibleAnswer => ({
      says,
      chance,
      event: { kind: "remedy-tried", payload: { remedy: step.key, result, photos: [] } },
      ends: result === "cured",
    });
    return [answer("cured", "cured", cured), answer("no-change", "no change", 1 - cured)];
  }
  const check = model.checks[model.checkAt.get(step.key) ?? -1];
  if (!check) return [];
  const { predict } = outcomesOf(model, check, reportedIn(evidence));
  return check.check.findings.map(({ key, title }, index) => ({
    says: title,
    chance: chanceOf(predict[index]),
    event: { kind: "answered", payload: { check: step.key, answer: { finding: key }, photos: [] } },
    ends: false,
  }));
}
