import * as z from "zod";
import { SafetyFlags } from "./safety-flags";
import { FindingLink, Strength } from "./finding-link";
import { BASE_RATES, type BaseRate } from "./strength";

/**
 * The fault tree as a document: the one shape that is written as YAML, stored,
 * sent, compared and compiled. What a shape cannot say (nothing unreachable,
 * bands without gaps, no cycle) is said by the soundness rules in soundness.ts.
 */

/** Kebab-case, stable for ever, never used again for another thing. */
export const Key = z
  .string()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "a key is lower-case words joined by hyphens")
  .max(80);

const Text = z.string().trim().min(1).max(2000);
const Line = z.string().trim().min(1).max(200);

/** A source's key, then where in it: "en2 p. 3-23". "judgement" and "common-practice" are sources too. */
export const Citation = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*( .+)?$/, "a citation is a source's key, then where in it");
const Citations = z.array(Citation).min(1);

export const Situation = z.enum(["alongside", "at-anchor", "under-way"]);
export type Situation = z.infer<typeof Situation>;

/** All named features must have one of the named options, and the situation must be one of those named. */
export const AppliesTo = z.strictObject({
  features: z.record(Key, z.array(Key).min(1)).optional(),
  situations: z.array(Situation).min(1).optional(),
});
export type AppliesTo = z.infer<typeof AppliesTo>;

/** What an engine may or may not have; the profile form asks these. */
export const Feature = z.strictObject({
  key: Key,
  title: Line,
  ask: Line,
  /** `share`: how many of all engines have it, for an engine whose owner does not know. Default: even among the options. */
  options: z.array(z.strictObject({ key: Key, title: Line, share: z.number().gt(0).lt(1).optional() })).min(2),
  /** How to tell, in plain words. */
  howToTell: Text.optional(),
  sources: Citations.optional(),
});
export type Feature = z.infer<typeof Feature>;

/** Figures of an engine that a band may hang on. */
export const EngineFigure = z.enum(["ratedRpm", "noLoadRpm", "idleRpm", "openingTemperatureC"]);
export type EngineFigure = z.infer<typeof EngineFigure>;

/** This engine's own readings when well. */
export const HealthyReading = z.enum([
  "topRpmInGear",
  "filterVacuumKpa",
  "startSeconds",
  "crankingVolts",
  "cruiseTemperatureC",
  "oilPressureKpa",
]);
export type HealthyReading = z.infer<typeof HealthyReading>;

/** The edge of a band: a number in the reading's unit, a factor of an engine figure, or this engine's healthy reading plus a number. */
export const Edge = z.union([
  z.number(),
  z.strictObject({ of: EngineFigure, times: z.number().positive() }),
  z.strictObject({ healthy: HealthyReading, plus: z.number(), otherwise: z.number() }),
]);
export type Edge = z.infer<typeof Edge>;

export const Quantity = z.enum([
  "pressure",
  "temperature",
  "temperature-difference",
  "voltage",
  "current",
  "resistance",
  "speed",
  "time",
  "volume",
  "flow",
  "length",
  "ratio",
  "concentration",
  "density",
  "count",
]);
export type Quantity = z.infer<typeof Quantity>;

export const Reading = z.strictObject({
  quantity: Quantity,
  /** A unit symbol of lib/core/units, in which the edges are written. */
  unit: z.string().min(1).max(20),
  from: z.number(),
  to: z.number(),
  /** One row a band; `when` picks the rows for this engine (24 V, turbo). Together they cover the scale once. */
  bands: z.array(z.strictObject({ finding: Key, from: Edge, to: Edge, when: AppliesTo.optional() })).min(2),
});
export type Reading = z.infer<typeof Reading>;

export const EngineState = z.enum(["any", "cold", "stopped", "cranking", "idling", "under-load"]);
export type EngineState = z.infer<typeof EngineState>;

export const Who = z.enum(["skipper-at-sea", "skipper-in-port", "mechanic", "workshop"]);
export type Who = z.infer<typeof Who>;

const Precedence = z.union([z.strictObject({ check: Key, finding: Key.optional() }), z.strictObject({ remedy: Key })]);

/** What checks and remedies have in common: a thing that hands do. */
const step = {
  key: Key,
  title: Line,
  system: Key,
  minutes: z.number().positive().max(600),
  access: z.enum(["easy", "moderate", "hard"]),
  mess: z.enum(["none", "some", "much"]).default("none"),
  /** What it risks: air in the suction side, dirt in the injection, a hose open below water. */
  harm: z.enum(["none", "opens-suction", "opens-injection", "opens-hose-below-water"]).default("none"),
  /** Something that has to be opened first, paid for once while it stays open. */
  opens: z.strictObject({ area: Key, minutes: z.number().positive() }).optional(),
  engine: EngineState,
  /** The least of the people who may do it. */
  who: Who,
  tools: z.array(Line).default([]),
  flags: SafetyFlags.default({}),
  cautions: z.array(Key).default([]),
  steps: z.array(Text).min(1).max(12),
  /** One of the drawings of drawings.ts, where words are not enough. */
  drawing: Key.optional(),
  after: z.array(Precedence).default([]),
  appliesTo: AppliesTo.optional(),
  sources: Citations,
  note: Text.optional(),
};

export const Finding = z.strictObject({
  key: Key,
  title: Line,
  /** The one a sound engine shows most. Just one a check. */
  usual: z.literal(true).optional(),
  /** How often a sound engine shows it; unusual ones default to 1 in 20. */
  sound: z.number().gt(0).lt(1).optional(),
  /** This finding says the same as that symptom. */
  restates: Key.optional(),
  /** What to tell the person who finds it, at once. */
  says: Text.optional(),
});
export type Finding = z.infer<typeof Finding>;

export const Check = z.strictObject({
  ...step,
  /** The question over the answers: "What is in the bowl?" */
  ask: Line,
  findings: z.array(Finding).min(2).max(9),
  reading: Reading.optional(),
  /** Checks with the same sightKey see the same thing and count once, the stronger. */
  sameSight: Key.optional(),
  /** The mechanic's own order, where he insists: lower comes first. */
  firstFor: z.record(Key, z.number().int().min(1)).default({}),
  /** Not bound to an engine's parts: "what was touched last". */
  asksWhatChanged: z.literal(true).optional(),
});
export type Check = z.infer<typeof Check>;

/** What is renewed by hours or months, whichever comes first, and which causes that keeps away. */
export const Upkeep = z
  .strictObject({
    everyHours: z.number().positive().max(20_000).optional(),
    everyMonths: z.number().positive().max(240).optional(),
    guards: z.array(Key).min(1),
    sources: Citations,
  })
  .refine(({ everyHours, everyMonths }) => (everyHours ?? everyMonths) !== undefined, "upkeep is due by hours, by months, or by both");
export type Upkeep = z.infer<typeof Upkeep>;

export const Remedy = z.strictObject({
  ...step,
  /** Where the remedy is upkeep too: done by itself from time to time, it keeps causes away. */
  upkeep: Upkeep.optional(),
  parts: z.array(z.strictObject({ key: Key, title: Line, quantity: z.number().int().positive().default(1) })).default([]),
  /** How the cure is proved. */
  proof: Text,
  tryOut: z.strictObject({ minutes: z.number().nonnegative().max(2000), situations: z.array(Situation).min(1).optional() }),
  /** Gets one home; the cause stays open. */
  temporary: z.literal(true).optional(),
});
export type Remedy = z.infer<typeof Remedy>;

const rates = Object.keys(BASE_RATES) as [BaseRate, ...BaseRate[]];

export const Cause = z.strictObject({
  key: Key,
  title: Line,
  system: Key,
  /** What it is, in a sentence. */
  is: Text,
  base: z.union([z.enum(rates), z.number().positive().max(100)]),
  onset: z.enum(["gradual", "sudden", "either"]),
  shows: z.record(Key, Strength),
  /** check key -> finding key (or "from..to", a span of bands) -> how it shifts that finding. */
  gives: z.record(Key, z.record(z.string().regex(/^[a-z0-9-]+(\.\.[a-z0-9-]+)?$/), FindingLink)).default({}),
  curedBy: z.record(Key, Strength),
  broughtOnBy: z.record(Key, Strength).default({}),
  /** What to put right at the root, in words, where no cause of the tree says it. */
  roots: z.array(Line).default([]),
  appliesTo: AppliesTo.optional(),
  sources: Citations,
  note: Text.optional(),
});
export type Cause = z.infer<typeof Cause>;

export const Symptom = z.strictObject({
  key: Key,
  title: Line,
  /** When or how, under the title: "in gear, at full throttle". */
  detail: Line,
  system: Key,
  /** What people really say, misspelt too. */
  phrases: z.array(Line).min(5),
  /** Why few engines show it, where few do: causes that have no link to it would weigh too much otherwise (soundness rule strays-heavy). */
  rare: Text.optional(),
  /** Engine states that cannot be had while it lasts: an engine that does not start shows nothing under load. */
  rulesOut: z.array(EngineState).optional(),
  sources: Citations,
});
export type Symptom = z.infer<typeof Symptom>;

/** The signal words, in the sense of ANSI Z535 and ISO 3864. */
export const Signal = z.enum(["danger", "warning", "caution", "notice"]);
export type Signal = z.infer<typeof Signal>;

export const Caution = z.strictObject({ key: Key, signal: Signal, says: Text, sources: Citations });
export type Caution = z.infer<typeof Caution>;

export const FindingRef = z.strictObject({ check: Key, finding: Key });

export const StopRule = z.strictObject({
  key: Key,
  title: Line,
  kind: z.enum(["stop", "no-crank", "call", "hand-over"]),
  /** Asked with these symptoms; in force at once on these findings or after so many seconds of cranking. "*": with any symptom. */
  when: z.strictObject({
    symptoms: z.union([z.literal("*"), z.array(Key)]).default([]),
    findings: z.array(FindingRef).default([]),
    crankSeconds: z.number().positive().optional(),
  }),
  /** The question on the first screen; a rule that only findings or cranking bring into force has none. */
  ask: Line.optional(),
  /** Why it matters. */
  because: Text,
  /** What to do, first thing first. */
  says: z.array(Text).min(1),
  /** Steps in these engine states are gone while the rule is in force. */
  forbids: z.array(EngineState).default([]),
  /** Run on to safety at the lowest useful power if stopping now endangers people or boat. */
  runOnIfStoppingEndangers: z.boolean(),
  clearedBy: z.array(FindingRef).default([]),
  /** What one has to say to clear it by hand, where no check does: "The exhaust has been drained". */
  clearedWhen: Line.optional(),
  /** One of the drawings of drawings.ts, where words are too slow to read. */
  drawing: Key.optional(),
  appliesTo: AppliesTo.optional(),
  sources: Citations,
});
export type StopRule = z.infer<typeof StopRule>;

export const Source = z.strictObject({
  key: Key,
  title: Line,
  detail: Text.optional(),
  /** Read by us, or recalled. */
  standing: z.enum(["read", "from-memory", "common-practice", "judgement"]),
});
export type Source = z.infer<typeof Source>;

export const KnownCase = z.strictObject({
  key: Key,
  title: Line,
  features: z.record(Key, Key).default({}),
  figures: z.partialRecord(EngineFigure, z.number().positive()).default({}),
  situation: Situation.default("alongside"),
  symptoms: z.array(Key),
  findings: z.array(
    z.strictObject({
      check: Key,
      finding: Key.optional(),
      value: z.number().optional(),
      unit: z.string().optional(),
      when: z.enum(["start", "after"]).default("after"),
      /** The look that settled it. */
      confirms: z.literal(true).optional(),
    }),
  ),
  /** Remedies that had been tried, or were tried on the way, and did not cure it. */
  tried: z
    .array(z.strictObject({ remedy: Key, result: z.enum(["no-change", "better"]), when: z.enum(["start", "after"]).default("after") }))
    .optional(),
  causes: z.array(Key).min(1),
  alsoAccept: z.array(z.strictObject({ cause: Key, reason: Line })).default([]),
  source: Line,
});
export type KnownCase = z.infer<typeof KnownCase>;

export const FaultTree = z.strictObject({
  format: z.literal(1),
  key: Key,
  title: Line,
  about: Text,
  systems: z.array(z.strictObject({ key: Key, title: Line })).min(1),
  features: z.array(Feature),
  sources: z.array(Source),
  cautions: z.array(Caution),
  symptoms: z.array(Symptom).min(1),
  checks: z.array(Check),
  causes: z.array(Cause).min(1),
  remedies: z.array(Remedy),
  stopRules: z.array(StopRule),
  knownCases: z.array(KnownCase).default([]),
  /** Likely rivals that no check can tell apart, and why that is so, or why it does not matter. */
  inseparable: z.array(z.strictObject({ causes: z.tuple([Key, Key]), because: Text })).optional(),
});
export type FaultTree = z.infer<typeof FaultTree>;
