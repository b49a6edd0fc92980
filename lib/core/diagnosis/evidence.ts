import type { RemedyResult } from "../contract/event";
import type { EngineState } from "../tree/schema";
import type { EngineStanding } from "./costs";

/** All that is known of one fault, in the tree's keys. Order never matters, but for pins: the symptom reported first leads. */
export type Evidence = {
  readonly symptoms: readonly SymptomTold[];
  /** `finding` null: asked, and it could not be told. `left`: seen once one of two faults was put right. */
  readonly findings: readonly { readonly check: string; readonly finding: string | null; readonly left?: true }[];
  readonly remedies: readonly { readonly remedy: string; readonly result: RemedyResult; readonly left?: true }[];
  /** The remedy, one of those above, that made it better and no more: what is marked `left` speaks of what remains. Rule [M4]. */
  readonly curedOne?: string;
  /** How things stand for the next step; absent: cold, stopped, nothing open, nothing forbidden. */
  readonly standing?: Standing;
};

/** `present`: as things stand now. `left`: told once one of two faults was put right; `before` is what had been told until then. */
export type SymptomTold = { readonly symptom: string; readonly present: boolean; readonly left?: { readonly before: boolean | null } };

export type Standing = EngineStanding & {
  /** Engine states that stop rules in force rule out. */
  readonly ruledOut: ReadonlySet<EngineState>;
  /** Engine states that cannot be had while the symptoms last; a step that only tries to crank can still be tried. */
  readonly lost?: ReadonlySet<EngineState>;
  /** A rule in force forbids starting: no repair can be tried out until it is lifted. */
  readonly mayNotStart: boolean;
  /** A rule in force says to call or to hand over. */
  readonly mustCall: boolean;
  /** Checks that would lift a rule in force. */
  readonly clearing: readonly string[];
};

export const NO_EVIDENCE: Evidence = { symptoms: [], findings: [], remedies: [] };

export const AT_REST: Standing = {
  hot: false,
  running: false,
  open: new Set(),
  ruledOut: new Set(),
  mayNotStart: false,
  mustCall: false,
  clearing: [],
};
