import type { Answer, DiagnosisEvent, Multiplier, OutcomePayload, RemedyResult } from "../contract/event";
import type { EngineProfile } from "../contract/engine";
import type { EngineState, Reading, Signal, Situation, StopRule, Who } from "../tree/schema";

/**
 * What one screen of a diagnosis shows: everything that follows from the tree
 * and the log of events, worked out in one place (view() in show.ts), the same
 * on the phone, on the server and in the printed hand-over.
 */
export type DiagnosisView = {
  begun: boolean;
  situation: Situation;
  person: Who;
  profile: EngineProfile;
  multipliers: readonly Multiplier[];
  symptoms: readonly { key: string; title: string; present: boolean }[];
  /** Everything said so far, oldest first, for the list one tap away. */
  said: readonly Said[];
  /** Steps answered in two ways at once by two devices: belief uses neither until one is picked. */
  conflicts: readonly { step: string; title: string; answers: readonly { event: string; says: string; device: string }[] }[];
  /** Rules to be asked now, before anything else. */
  rulesToAsk: readonly RuleShown[];
  /** All rules that this engine can be asked of, in the tree's order, with the answers that stand. */
  rules: readonly RuleAnswered[];
  /** Rules in force: stay on each later screen until cleared. */
  rulesInForce: readonly RuleShown[];
  /** null: the log has ended, rules have yet to be asked, or nothing is left but to call. */
  step: StepShown | null;
  possible: Possible;
  crankSeconds: number;
  outcome: (OutcomePayload & { event: string; at: string }) | null;
  /** The cause that a tried remedy cured, for the outcome form. */
  curedCause: { cause: string; remedy: string; temporary: boolean; proof: string | null } | null;
  /** One of two faults was put right: by what, what it most likely was, and which of the symptoms told before are gone or not. null while none was. */
  putRight: {
    remedy: Named;
    cause: Named | null;
    gone: readonly string[];
    still: readonly string[];
  } | null;
  runsAgain: boolean;
};

export type Said = {
  event: string;
  kind: DiagnosisEvent["kind"];
  /** The check, remedy, rule or symptom. */
  key: string | null;
  title: string;
  /** "Black specks or slime", "31 kPa: high", "Can't tell", "No change". */
  says: string;
  at: string;
  device: string;
  note: string | null;
  photos: readonly string[];
  mayChange: boolean;
};

export type RuleShown = {
  key: string;
  title: string;
  kind: StopRule["kind"];
  ask: string | null;
  because: string;
  says: readonly string[];
  /** The one exception holds: run on to safety where stopping now endangers people or boat. */
  runOn: boolean;
  clearedWhen: string | null;
  /** As of a step. */
  drawing: string | null;
};

/** `due`: to be asked now. `found`: in force by what was found or cranked, not by a yes. `event`: the answer that a change takes the place of. */
export type RuleAnswered = RuleShown & { due: boolean; answer: "yes" | "no" | null; found: boolean; event: string | null };

export type CautionShown = { key: string; signal: Signal; says: string };

export type StepShown = {
  kind: "check" | "remedy" | "call";
  key: string;
  title: string;
  /** Why this step, in words from the numbers. */
  why: string;
  minutes: number;
  engine: EngineState;
  tools: readonly string[];
  parts: readonly { key: string; title: string; quantity: number }[];
  /** "if fitted": the profile does not say whether this engine has it. */
  ifFitted: boolean;
  cautions: readonly CautionShown[];
  /** Safety first and last steps stand in the list, in place, marked. */
  steps: readonly { text: string; safety: boolean }[];
  /** Key of a drawing; a tree newer than this program may name one that is not known here. */
  drawing: string | null;
  ask: string;
  answers: readonly { finding: string; title: string; withdraws: string | null }[];
  reading:
    | (Pick<Reading, "quantity" | "unit" | "from" | "to"> & {
        bands: readonly { finding: string; title: string; from: number; to: number }[];
      })
    | null;
  /** Seconds of cranking that it asks for, and what is left before the exhaust must be drained. */
  cranks: number | null;
  proof: string | null;
  temporary: boolean;
  who: Who;
  /** At a call: what is best to do here by whoever goes on all the same; null where nothing is left, or a rule says to call. */
  goOn: StepShown | null;
};

export type Possible = {
  /** Likeliest first; `of100` adds up to 100 over causes, others and unknown: an engine with two faults counts half for each. */
  causes: readonly PossibleCause[];
  /** How many causes are folded into "others", and their share. */
  others: { count: number; of100: number };
  unknown: { share: number; of100: number };
  /** How sure the first place is, in a sentence. */
  sure: string;
  /** "Perhaps two faults", with the likeliest two; null while the numbers do not say so, and once one of two was put right. */
  two: { share: number; of100: number; likeliest: readonly [Named, Named] } | null;
};

export type Named = { key: string; title: string };

export type PossibleCause = {
  key: string;
  title: string;
  is: string;
  share: number;
  of100: number;
  /** Of 100 engines like this, how many have it at all, alone or beside another fault. */
  inAll: number;
  /** What this engine's log says of it, and by how much that moved its weight; null where it says nothing. */
  ofThisEngine: { times: number; reason: string } | null;
  speaksFor: readonly EvidenceShown[];
  speaksAgainst: readonly EvidenceShown[];
  notChecked: readonly { check: string; title: string }[];
  behind: readonly { cause: string; title: string; share: number }[];
};

/** `factor`: by how much this evidence moved the odds of the cause. */
export type EvidenceShown = { title: string; says: string; factor: number };

export type StepAnswer = Answer;
export type StepResult = RemedyResult;
