import type { Evidence } from "./evidence";
import type { Gates, StepRef } from "./gates";
import type { CheckModel, Model } from "./model";

/** A cause under this share does not keep a pinned check in the queue. */
const HANGS_ON_IT = 0.01;

export type Pinned = {
  readonly ref: StepRef;
  readonly because: "clears-a-rule" | "what-changed" | "pinned";
  readonly gateTo: string | null;
};

/**
 * What goes before any reckoning: a check that lifts a rule in force, then what
 * was changed last, then the mechanic's own order for the symptom reported
 * first, and so on. Rules [G5], [N1], [N2].
 */
export function firstSteps(
  model: Model,
  evidence: Evidence,
  gates: Gates,
  shares: Float64Array,
  clearing: readonly string[],
): Pinned | null {
  const ready = (check: CheckModel | undefined, because: Pinned["because"]): Pinned | null => {
    if (!check || !gates.isFeasible(check) || gates.isDone({ kind: "check", key: check.key })) return null;
    const gate = gates.gateOf(check);
    if (gate.open) return { ref: { kind: "check", key: check.key }, because, gateTo: null };
    return gate.shut ? null : { ref: gate.first, because, gateTo: check.key };
  };
  for (const key of clearing) {
    const step = ready(model.checks[model.checkAt.get(key) ?? -1], "clears-a-rule");
    if (step) return step;
  }
  for (const check of model.checks.filter(({ check }) => check.asksWhatChanged).sort(byKey)) {
    const step = ready(check, "what-changed");
    if (step) return step;
  }
  for (const { symptom, present } of evidence.symptoms) {
    if (!present) continue;
    for (const check of pinsOf(model, symptom)) {
      const step = hangsOn(model, check, shares) ? ready(check, "pinned") : null;
      if (step) return step;
    }
  }
  return null;
}

const byKey = (a: CheckModel, b: CheckModel): number => (a.key < b.key ? -1 : 1);

const pinsOf = (model: Model, symptom: string): readonly CheckModel[] =>
  model.checks
    .filter(({ check }) => check.firstFor[symptom] !== undefined)
    .sort((a, b) => (a.check.firstFor[symptom] ?? 0) - (b.check.firstFor[symptom] ?? 0) || byKey(a, b));

const hangsOn = (model: Model, check: CheckModel, shares: Float64Array): boolean =>
  model.causes.some((cause, index) => (shares[index] ?? 0) > HANGS_ON_IT && cause.gives[check.key] !== undefined);
