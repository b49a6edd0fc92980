import type { Cause, Check, FaultTree, Finding, Remedy, StopRule, Symptom } from "../../../lib/core/tree/schema";

/** Parts of small trees for tests: only what a test says matters, the rest is filled in plainly. */
export const cause = (key: string, over: Partial<Cause> = {}): Cause => ({
  key,
  title: key.replaceAll("-", " "),
  system: "engine",
  is: `The fault "${key}".`,
  base: "occasional",
  onset: "either",
  shows: {},
  gives: {},
  curedBy: {},
  broughtOnBy: {},
  roots: [],
  sources: ["judgement"],
  ...over,
});

const step = (key: string) => ({
  key,
  title: key.replaceAll("-", " "),
  system: "engine",
  minutes: 5,
  access: "easy" as const,
  mess: "none" as const,
  harm: "none" as const,
  engine: "stopped" as const,
  who: "skipper-at-sea" as const,
  tools: [],
  flags: {},
  cautions: [],
  steps: ["Look."],
  after: [],
  sources: ["judgement"],
});

export const finding = (key: string, over: Partial<Finding> = {}): Finding => ({ key, title: key.replaceAll("-", " "), ...over });

export const check = (key: string, findings: readonly (string | Finding)[], over: Partial<Check> = {}): Check => ({
  ...step(key),
  ask: `${key}?`,
  findings: findings.map((one, index) => (typeof one === "string" ? finding(one, index === 0 ? { usual: true } : {}) : one)),
  firstFor: {},
  ...over,
});

export const remedy = (key: string, over: Partial<Remedy> = {}): Remedy => ({
  ...step(key),
  minutes: 20,
  parts: [],
  proof: "It runs as it should.",
  tryOut: { minutes: 10 },
  ...over,
});

export const symptom = (key: string): Symptom => ({
  key,
  title: key.replaceAll("-", " "),
  detail: "as said",
  system: "engine",
  phrases: ["one", "two", "three", "four", "five"],
  sources: ["judgement"],
});

export const stopRule = (key: string, over: Partial<StopRule> = {}): StopRule => ({
  key,
  title: key,
  kind: "stop",
  when: { symptoms: [], findings: [] },
  because: "It breaks.",
  says: ["Stop."],
  forbids: ["idling", "under-load"],
  runOnIfStoppingEndangers: true,
  clearedBy: [],
  sources: ["judgement"],
  ...over,
});

export const tree = (over: Partial<FaultTree>): FaultTree => ({
  format: 1,
  key: "small",
  title: "Small",
  about: "For tests.",
  systems: [{ key: "engine", title: "Engine" }],
  features: [],
  sources: [{ key: "judgement", title: "Judgement", standing: "judgement" }],
  cautions: [],
  symptoms: [symptom("weak")],
  checks: [],
  causes: [cause("worn")],
  remedies: [],
  stopRules: [],
  knownCases: [],
  ...over,
});
