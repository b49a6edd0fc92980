import type { EngineState } from "../tree/schema";
import { standingMinutes } from "./costs";
import type { Evidence, Standing } from "./evidence";
import type { CheckModel, Model, RemedyModel } from "./model";

export type StepRef = { readonly kind: "check" | "remedy"; readonly key: string };

/** May a step be done now, never, or only after another; then what that costs and how likely the way opens. */
export type Gate =
  | { readonly open: true }
  | { readonly open: false; readonly shut: true }
  | { readonly open: false; readonly shut: false; readonly first: StepRef; readonly minutes: number; readonly pass: number };

const OPEN: Gate = { open: true };
const SHUT: Gate = { open: false, shut: true };
/** Chains longer than this are a cycle, which the soundness rules refuse. */
const DEEPEST = 8;

/** Looks up what stands before a step. Rules [G1]-[G4]. */
export class Gates {
  readonly #model: Model;
  readonly #standing: Standing;
  readonly #shares: Float64Array;
  readonly #found = new Map<string, string | null>();
  readonly #tried = new Set<string>();

  constructor(model: Model, evidence: Evidence, standing: Standing, shares: Float64Array) {
    this.#model = model;
    this.#standing = standing;
    this.#shares = shares;
    for (const { check, finding } of evidence.findings) this.#found.set(check, finding);
    for (const { remedy } of evidence.remedies) this.#tried.add(remedy);
  }

  isDone(ref: StepRef): boolean {
    return ref.kind === "check" ? this.#found.has(ref.key) : this.#tried.has(ref.key);
  }

  /** Could this person do the step as the engine now stands, gates apart? Rule [G6]. */
  isFeasible(step: CheckModel | RemedyModel): boolean {
    const { ruledOut, lost } = this.#standing;
    const needs = statesOf(step);
    return (
      step.offered && !needs.some((state) => ruledOut.has(state)) && (stateOf(step) === "any" || !needs.some((state) => lost?.has(state)))
    );
  }

  gateOf(step: CheckModel | RemedyModel, depth = 0): Gate {
    if (depth > DEEPEST) return SHUT;
    let first: StepRef | null = null;
    let minutes = 0;
    let pass = 1;
    for (const before of ("check" in step ? step.check : step.remedy).after) {
      const ref: StepRef = "check" in before ? { kind: "check", key: before.check } : { kind: "remedy", key: before.remedy };
      const finding = "check" in before ? before.finding : undefined;
      const gate = this.#find(ref);
      if (this.isDone(ref)) {
        if (finding !== undefined && this.#found.get(ref.key) !== finding) return SHUT;
        continue;
      }
      if (!gate) {
        // What does not apply need not be done; but a finding that nobody can get opens nothing.
        if (finding !== undefined) return SHUT;
        continue;
      }
      if (!this.isFeasible(gate)) return SHUT;
      const own = this.gateOf(gate, depth + 1);
      if (!own.open && own.shut) return SHUT;
      first ??= own.open ? ref : own.first;
      minutes += gate.minutes + standingMinutes("check" in gate ? gate.check : gate.remedy, this.#standing) + (own.open ? 0 : own.minutes);
      pass *= (own.open ? 1 : own.pass) * (finding === undefined || !("check" in gate) ? 1 : this.#chanceOf(gate, finding));
    }
    return first ? { open: false, shut: false, first, minutes, pass } : OPEN;
  }

  #find(ref: StepRef): CheckModel | RemedyModel | undefined {
    const step =
      ref.kind === "check"
        ? this.#model.checks[this.#model.checkAt.get(ref.key) ?? -1]
        : this.#model.remedies[this.#model.remedyAt.get(ref.key) ?? -1];
    return step?.here ? step : undefined;
  }

  #chanceOf(check: CheckModel, finding: string): number {
    const row = check.rows[check.findingAt.get(finding) ?? -1];
    let chance = 0;
    row?.forEach((share, index) => (chance += share * (this.#shares[index] ?? 0)));
    return chance;
  }
}

export const stateOf = (step: CheckModel | RemedyModel): EngineState => ("check" in step ? step.check.engine : step.remedy.engine);

/** A cold start is tried cold and cranks all the same: what may not be cranked may not be asked for under another name. */
const statesOf = (step: CheckModel | RemedyModel): readonly EngineState[] => {
  const { cranks } = ("check" in step ? step.check : step.remedy).flags;
  return cranks === undefined ? [stateOf(step)] : [stateOf(step), "cranking"];
};
