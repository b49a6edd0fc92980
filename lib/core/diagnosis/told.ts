import type { RemedyResult } from "../contract/event";
import type { Evidence } from "./evidence";
import { heard, reportedAtFirst, reportedIn, spoken, type Spoken } from "./finding-weight";
import type { Model, RemedyModel } from "./model";

export type RemedyTold = { readonly remedy: RemedyModel; readonly result: Exclude<RemedyResult, "could-not"> };

/** What is known, as the model knows it, each kind in the order of its keys. */
export type Told = {
  /** `before`: told before anything was put right; `left`: told of what remains. null: not told then. */
  readonly symptoms: readonly { readonly symptom: string; readonly before: boolean | null; readonly left: boolean | null }[];
  readonly before: { readonly findings: readonly Spoken[]; readonly remedies: readonly RemedyTold[] };
  readonly left: { readonly findings: readonly Spoken[]; readonly remedies: readonly RemedyTold[] };
  /** The remedy that put right one of two; it stands in neither list. */
  readonly curedOne: RemedyModel | null;
};

/** Sorts out what is known. Rules [P2], [E2]-[E4], [M4]. */
export function toldOf(model: Model, evidence: Evidence): Told {
  const curedOne = model.remedies[model.remedyAt.get(evidence.curedOne ?? "") ?? -1] ?? null;
  const isLeft = (one: { readonly left?: unknown }): boolean => curedOne !== null && one.left !== undefined;
  const symptoms = byKey(
    evidence.symptoms.filter(({ symptom }) => model.symptoms.has(symptom)),
    ({ symptom }) => symptom,
  ).map((one) =>
    isLeft(one)
      ? { symptom: one.symptom, before: one.left?.before ?? null, left: one.present }
      : { symptom: one.symptom, before: one.present, left: null },
  );
  const now = reportedIn(evidence);
  const first = curedOne === null ? now : reportedAtFirst(evidence);
  const remedies = evidence.remedies.filter(({ remedy }) => remedy !== curedOne?.key);
  return {
    symptoms,
    curedOne,
    before: {
      findings: findingsTold(model, notIn(evidence.findings, isLeft), first),
      remedies: remediesTold(model, notIn(remedies, isLeft)),
    },
    left: { findings: findingsTold(model, evidence.findings.filter(isLeft), now), remedies: remediesTold(model, remedies.filter(isLeft)) },
  };
}

const notIn = <T>(items: readonly T[], picked: (item: T) => boolean): readonly T[] => items.filter((item) => !picked(item));

const byKey = <T>(items: readonly T[], keyOf: (item: T) => string): readonly T[] =>
  [...items].sort((a, b) => (keyOf(a) < keyOf(b) ? -1 : 1));

function findingsTold(model: Model, findings: Evidence["findings"], reported: ReadonlySet<string>): readonly Spoken[] {
  return heard(model, findings).flatMap((one) => spoken(one, reported) ?? []);
}

function remediesTold(model: Model, remedies: Evidence["remedies"]): readonly RemedyTold[] {
  return byKey(remedies, ({ remedy }) => remedy).flatMap(({ remedy: key, result }) => {
    const remedy = model.remedies[model.remedyAt.get(key) ?? -1];
    return remedy && result !== "could-not" ? [{ remedy, result }] : [];
  });
}
