import type { EngineProfile } from "../contract/engine";
import type { Multiplier, RemedyResult } from "../contract/event";
import type { Cause, Check, FaultTree, Remedy, Situation, Who } from "../tree/schema";
import type { PairTable } from "./pair-table";

/** What a tree is compiled for: this engine, here, with these hands. */
export type Setting = {
  readonly profile: Pick<EngineProfile, "features" | "figures" | "healthy">;
  readonly situation: Situation;
  readonly person: Who;
  readonly multipliers?: readonly Multiplier[];
  /** What a call for help costs here, in minutes; absent: COSTS.call. */
  readonly callMinutes?: number;
  /** Tools and parts that are not aboard, as the tree names them. */
  readonly notAboard?: readonly string[];
  /** "one": pairs of causes are left out, to set a planner beside one that knows of none. Absent: "two". */
  readonly faults?: "one" | "two";
};

/** All pairs of causes, in the order of pairAt(), before anything is told. */
export type PairsModel = { readonly count: number; readonly prior: PairTable };

/** What a compiled check and a compiled remedy have in common. */
export type StepModel = {
  readonly key: string;
  /** Share of engines like this one that have what it works on; under 1 the step says "if fitted". */
  readonly share: number;
  /** Can it be done in this situation at all? What cannot may still be told. */
  readonly here: boolean;
  /** May it be asked of this person, here, with what is aboard? What is not offered may still be told. */
  readonly offered: boolean;
  /** fixedMinutes, and the fetching of what is not aboard. */
  readonly minutes: number;
};

export type CheckModel = StepModel & {
  readonly check: Check;
  readonly findingAt: ReadonlyMap<string, number>;
  readonly sound: Float64Array;
  /** rows[finding][hypothesis] = P(finding given hypothesis). */
  readonly rows: readonly Float64Array[];
  readonly logRows: readonly Float64Array[];
  /** Sum over findings of P ln P for each hypothesis, so that information needs no logarithm a cause. */
  readonly negEntropy: Float64Array;
  /** How loud each finding speaks: the largest change of log-odds against a sound engine over all causes. */
  readonly loudness: Float64Array;
  /** Has any cause a link to it? */
  readonly linked: boolean;
};

export type RemedyModel = StepModel & {
  readonly remedy: Remedy;
  /** cure[hypothesis] = P(cured given hypothesis). */
  readonly cure: Float64Array;
  /** ln of what each result of trying it weighs for each hypothesis. */
  readonly logResults: Readonly<Record<Exclude<RemedyResult, "could-not">, Float64Array>>;
  /** The hypotheses with a link, and their chance. */
  readonly linkedAt: Int32Array;
  readonly linkedCure: Float64Array;
};

/**
 * A tree ready for arithmetic. Hypotheses are sets of causes: single ones, the
 * last one empty for "something not in this tree", and beside them all pairs.
 */
export type Model = {
  readonly tree: FaultTree;
  readonly setting: Setting;
  readonly causes: readonly Cause[];
  readonly hypotheses: readonly (readonly string[])[];
  readonly causeAt: ReadonlyMap<string, number>;
  /** Index of "something not in this tree". */
  readonly unknownAt: number;
  readonly logPrior: Float64Array;
  /** null: no pairs are reckoned with. */
  readonly pairs: PairsModel | null;
  /** ln of the prior share of all causes together, pairs included. */
  readonly logPriorOfCauses: number;
  /** P(symptom given hypothesis); the unknown's place is not used, see believe(). */
  readonly symptoms: ReadonlyMap<string, Float64Array>;
  /** ln of that, and of its complement. */
  readonly logSymptoms: ReadonlyMap<string, { readonly present: Float64Array; readonly absent: Float64Array }>;
  readonly checks: readonly CheckModel[];
  readonly checkAt: ReadonlyMap<string, number>;
  readonly remedies: readonly RemedyModel[];
  readonly remedyAt: ReadonlyMap<string, number>;
  readonly callMinutes: number;
  /** Minutes of work that is left to whoever is called, for each hypothesis. */
  readonly helpersMinutes: Float64Array;
  /** Minutes that whoever is called needs for each nat that is open. */
  readonly helperFinds: number;
  /** How sure it is beforehand that this person can tell what is asked: so many of so many. */
  readonly tells: { readonly told: number; readonly asked: number };
};
