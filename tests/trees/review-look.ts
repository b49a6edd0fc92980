import { cautionsOf, safetyOf } from "@/lib/core/tree/safety-steps";
import type { Cause, Caution, Check, FaultTree, Remedy, StopRule, Symptom } from "@/lib/core/tree/schema";

/** Nothing known of the engine: what is written then is the most careful wording. */
const UNKNOWN = { features: {} };
const IN_LINE = { features: { injection: "in-line-pump" } };

/** Looks into a tree by key, and fails on a key that is not there: a renamed node may not slip through as "absent". */
export class Look {
  readonly tree: FaultTree;
  constructor(tree: FaultTree) {
    // Apostrophes are rounded when a tree's folder is read; the table is written with straight ones.
    this.tree = JSON.parse(JSON.stringify(tree).replaceAll("\u2019", "'")) as FaultTree;
  }

  check = (key: string): Check => named("check", this.tree.checks, key);
  remedy = (key: string): Remedy => named("remedy", this.tree.remedies, key);
  cause = (key: string): Cause => named("cause", this.tree.causes, key);
  symptom = (key: string): Symptom => named("symptom", this.tree.symptoms, key);
  rule = (key: string): StopRule => named("stop rule", this.tree.stopRules, key);
  caution = (key: string): Caution => named("caution", this.tree.cautions, key);

  steps = (): (Check | Remedy)[] => [...this.tree.checks, ...this.tree.remedies];

  /** What a person reads at a step of its own words: list, note, what a finding says, proof. */
  words = (step: Check | Remedy): string =>
    [
      step.title,
      ...step.steps,
      step.note ?? "",
      ...("findings" in step ? step.findings.flatMap(({ title, says }) => [title, says ?? ""]) : [step.proof]),
    ].join("\n");

  /** All of it: own words, the cautions over it, and what its flags write before and after. */
  shown = (step: Check | Remedy, engine: { features: Record<string, string> } = UNKNOWN): string => {
    const { first, last } = safetyOf(step, engine);
    return [...first, this.words(step), ...last, ...cautionsOf(step, this.tree, engine).map(({ says }) => says)].join("\n");
  };

  /** Keys of the cautions that a person sees over a step. */
  cautions = (step: Check | Remedy): string[] => cautionsOf(step, this.tree, UNKNOWN).map(({ key }) => key);

  ruleWords = (key: string): string => {
    const { title, ask, because, says, clearedWhen } = this.rule(key);
    return [title, ask ?? "", because, ...says, clearedWhen ?? ""].join("\n");
  };

  /** Is the rule's question asked with this symptom? */
  asks = (key: string, symptom: string): boolean => {
    const { ask, when } = this.rule(key);
    this.symptom(symptom);
    return ask !== undefined && (when.symptoms === "*" || when.symptoms.includes(symptom));
  };

  /** Does this finding bring the rule into force? */
  broughtBy = (key: string, check: string, finding: string): boolean => {
    this.finding(check, finding);
    return this.rule(key).when.findings.some((ref) => ref.check === check && ref.finding === finding);
  };

  finding = (check: string, finding: string) => named(`finding of ${check}`, this.check(check).findings, finding);

  /** The link from a cause to a finding, as written; undefined where there is none. */
  gives = (cause: string, check: string, finding: string): number | string | undefined => {
    this.finding(check, finding);
    return this.cause(cause).gives[check]?.[finding];
  };

  shows = (cause: string, symptom: string): boolean => {
    this.symptom(symptom);
    return this.cause(cause).shows[symptom] !== undefined;
  };

  /** The upper edge of a band for an engine with these features: the figure, or the one that stands where no healthy reading is known. */
  upTo = (check: string, finding: string, features: Record<string, string> = {}): number | undefined => {
    this.finding(check, finding);
    const band = this.check(check).reading?.bands.find(
      (one) =>
        one.finding === finding &&
        Object.entries(one.when?.features ?? {}).every(([key, options]) => options.includes(features[key] ?? "")),
    );
    if (band === undefined) throw new Error(`no band ${finding} of ${check} for ${JSON.stringify(features)}`);
    if (typeof band.to === "number") return band.to;
    return "otherwise" in band.to ? band.to.otherwise : band.to.times;
  };

  /** Only for engines whose injection is known to be one of these. */
  onlyInjection = (step: Check | Remedy, ...kinds: string[]): boolean => {
    const allowed = step.appliesTo?.features?.injection;
    return allowed !== undefined && allowed.every((kind) => kinds.includes(kind));
  };

  mechanic = (step: Check | Remedy): boolean => step.who === "mechanic" || step.who === "workshop";

  inLine = (step: Check | Remedy): string => this.shown(step, IN_LINE);
}

function named<T extends { key: string }>(kind: string, among: readonly T[], key: string): T {
  const found = among.find((one) => one.key === key);
  if (found === undefined) throw new Error(`the tree has no ${kind} "${key}"`);
  return found;
}
