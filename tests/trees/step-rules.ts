import type { Check, FaultTree, Remedy } from "@/lib/core/tree/schema";

export type Step = { node: string; kind: "check" | "remedy"; step: Check | Remedy };

export const stepsOf = (tree: FaultTree): Step[] => [
  ...tree.checks.map((step) => ({ node: step.key, kind: "check" as const, step })),
  ...tree.remedies.map((step) => ({ node: step.key, kind: "remedy" as const, step })),
];

/** A step's own words, a sentence or clause at a time, so that a "never" speaks for its own clause only. */
export const clausesOf = ({ steps }: Check | Remedy): string[] =>
  steps.flatMap((text) => text.split(/(?<=[.;:])\s+/)).map((clause) => clause.replace(/[.;:]$/, ""));

/** Everything a person reads of a step: title, question, steps, what a finding says, note, proof. */
export const allWordsOf = (step: Check | Remedy): string[] => [
  step.title,
  ...step.steps,
  ...step.tools,
  ...(step.note === undefined ? [] : [step.note]),
  ...("proof" in step
    ? [step.proof]
    : [step.ask, ...step.findings.flatMap((one) => [one.title, ...(one.says === undefined ? [] : [one.says])])]),
];

export type Rule = {
  key: string;
  /** What the words ask of the step. */
  wants: string;
  speaks: (clause: string, step: Step) => boolean;
  holds: (step: Step) => boolean;
};

/** Only what plainly forbids excuses a clause; "no", "not" and "without" say too many other things. */
const FORBIDS = /\b(never|do not|don['\u2019]t|must not|nobody)\b/i;
const fuelFlag = ({ step: { flags } }: Step): boolean =>
  flags.opensFuelDirty === true || flags.opensFuelClean === true || flags.opensHighPressureFuel === true;
const skipper = ({ step: { who } }: Step): boolean => who === "skipper-at-sea" || who === "skipper-in-port";
/** Systems whose strainers, gauzes and lids hold fuel. */
const ofFuel = ({ step: { system } }: Step): boolean => ["fuel-supply", "fuel-quality", "injection"].includes(system);

const OPENS = /\b(slacken|loosen|undo|unscrew|crack|part|remove|take|takes|taken|taking|open|off|out|swap)\b/i;
const HIGH_PRESSURE = /\b(injectors?|unions?|steel pipes?|injection pipes?|high-pressure|delivery valves?|pump outlets?)\b/i;

export const STEP_RULES: readonly Rule[] = [
  {
    key: "skipper-high-pressure",
    wants: "a mechanic or a workshop, for it opens high-pressure fuel",
    speaks: (clause, step) => skipper(step) && HIGH_PRESSURE.test(clause) && OPENS.test(clause),
    holds: () => false,
  },
  {
    key: "high-pressure-flag",
    wants: "a fuel flag, for it opens injectors or their pipes",
    speaks: (clause, step) => !skipper(step) && HIGH_PRESSURE.test(clause) && OPENS.test(clause),
    holds: fuelFlag,
  },
  {
    key: "cranks",
    wants: "the flag cranks",
    // The crank, its pulley and its nut are things; what is done with the starter is cranking.
    speaks: (clause) =>
      /\b(crank(s|ed|ing)?|starter|burst)\b/i.test(clause.replaceAll(/\bcrank (pulley|nut|case)|against the crank\b/gi, "")),
    holds: ({ step }) => step.flags.cranks !== undefined,
  },
  {
    key: "raw-water",
    wants: "the flag opensRawWater or opensHoseBelowWater",
    speaks: (clause, step) =>
      /\b(seacocks?|exhaust cock|impellers?|elbow|exchangers?|muffler|silencer|raw-water|sea-water|end caps?)\b/i.test(clause) ||
      (/\bstrainer\b/i.test(clause) && !ofFuel(step)),
    holds: ({ step: { flags } }) => flags.opensRawWater === true || flags.opensHoseBelowWater === true,
  },
  {
    key: "coolant",
    wants: "the flag opensCoolant",
    speaks: (clause, { step }) =>
      /\b(cap off|pressure cap|header (tank|cap)|coolant cap|jacketed)\b/i.test(clause) ||
      (step.system === "cooling" && /\bcap\b/i.test(clause)),
    holds: ({ step }) => step.flags.opensCoolant === true,
  },
  {
    key: "fuel",
    wants: "a fuel flag",
    speaks: (clause, step) => /\b(bleed(s|er)?|bled|bleeding)\b/i.test(clause) || (ofFuel(step) && /\blids?\b/i.test(clause)),
    holds: fuelFlag,
  },
  {
    key: "bypass",
    wants: "a mechanic, for it works round a switch that guards people",
    speaks: (clause) =>
      /\b(bypass|bridg(e|es|ing)|jumpers?|short out|hot-wire|screwdriver across|neutral switch|interlock)\b/i.test(clause),
    holds: (step) => !skipper(step),
  },
];

/** Words that may stand only in a sentence that forbids. */
export const FORBIDDEN: readonly { key: string; word: RegExp; unless: RegExp }[] = [
  { key: "taste", word: /\b(tast(e|es|ed|ing)|lick|tongue)\b/i, unless: /\bnever taste\b|\btastes sweet\b/i },
  {
    key: "ether",
    word: /\b(ether|starting (fluid|spray)|start spray|easy[- ]start)\b/i,
    unless: /\b(never|no|not|explodes?|breaks?|forbid\w*|out of the)\b/i,
  },
  { key: "blow by mouth", word: /\bby mouth\b/i, unless: /\bnever by mouth|not by mouth\b/i },
  { key: "battery switch, running", word: /\bbattery switch\b.{0,40}\b(runs|running)\b/i, unless: /\b(never|nor|not)\b/i },
];

export const isForbidden = (clause: string): boolean => FORBIDS.test(clause);

/** What can be seen, read or counted, so that "proved" is more than "it works". */
export const OBSERVED =
  /\b(revs|rpm|throttle|figures?|seconds|minutes|hours|morning|starts?|speed|volts?|V|current|drop|dry|drips?|warm|bubbles?|vacuum|pressure|boost|compression|smoke|level|bowl|elements?|shaking|idle|beats?|code|goes hard|rush of air|runs to port)\b/i;
