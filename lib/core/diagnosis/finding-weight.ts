import type { Evidence } from "./evidence";
import type { CheckModel, Model } from "./model";

export type Heard = { readonly check: CheckModel; readonly finding: number };

/**
 * The findings that count, in the order of their keys: each known to the model,
 * and of those that see the same thing only the loudest (ties: the first key).
 * Rules [E2], [E3].
 */
export function heard(model: Model, findings: Evidence["findings"]): readonly Heard[] {
  const all: Heard[] = [];
  for (const { check: key, finding } of findings) {
    const check = model.checks[model.checkAt.get(key) ?? -1];
    const at = finding === null ? undefined : check?.findingAt.get(finding);
    if (check && at !== undefined) all.push({ check, finding: at });
  }
  all.sort((a, b) => (a.check.key < b.check.key ? -1 : 1));
  const loudestOf = new Map<string, Heard>();
  for (const one of all) {
    const sight = one.check.check.sameSight;
    if (sight === undefined) continue;
    const before = loudestOf.get(sight);
    if (!before || speaksLouder(one, before)) loudestOf.set(sight, one);
  }
  return all.filter((one) => one.check.check.sameSight === undefined || loudestOf.get(one.check.check.sameSight) === one);
}

const loudness = (one: Heard): number => one.check.loudness[one.finding] ?? 0;

/** Of two findings that see the same thing, does the first count? Ties: the first key. Rule [E3]. */
export const speaksLouder = (one: Heard, other: Heard): boolean =>
  loudness(one) > loudness(other) || (loudness(one) === loudness(other) && one.check.key < other.check.key);

/** Which findings of the check say again what has been reported; empty: none does. */
export function restating(check: CheckModel, reported: ReadonlySet<string>): readonly number[] {
  const again: number[] = [];
  check.check.findings.forEach((finding, index) => finding.restates !== undefined && reported.has(finding.restates) && again.push(index));
  return again;
}

/** Symptoms that are present, as things stand now. */
export const reportedIn = (evidence: Pick<Evidence, "symptoms">): ReadonlySet<string> =>
  new Set(evidence.symptoms.filter((one) => one.present).map((one) => one.symptom));

/** Symptoms that were reported before anything was put right. */
export const reportedAtFirst = (evidence: Pick<Evidence, "symptoms">): ReadonlySet<string> =>
  new Set(evidence.symptoms.filter((one) => (one.left ? one.left.before : one.present)).map((one) => one.symptom));

/** A finding that weighs something; `again`: the findings that say again what was reported, where it is one of several of its check. */
export type Spoken = Heard & { readonly again: readonly number[] };

/** A finding that restates a reported symptom weighs nothing (null); where several do, the choice between them counts. Rule [E4]. */
export function spoken(one: Heard, reported: ReadonlySet<string>): Spoken | null {
  const again = restating(one.check, reported);
  if (!again.includes(one.finding)) return { ...one, again: [] };
  return again.length === 1 ? null : { ...one, again };
}

/** ln of what a finding weighs for each single cause and the unknown, added to `into`. */
export function addSpoken({ check, finding, again }: Spoken, into: Float64Array): void {
  const row = check.logRows[finding]!;
  for (let index = 0; index < into.length; index++) into[index] = into[index]! + row[index]!;
  if (again.length === 0) return;
  for (let index = 0; index < into.length; index++) {
    let among = 0;
    for (const one of again) among += check.rows[one]?.[index] ?? 0;
    into[index] = into[index]! - Math.log(among);
  }
}

/** addSpoken, unless the finding weighs nothing. */
export function addFinding(one: Heard, reported: ReadonlySet<string>, into: Float64Array): void {
  const said = spoken(one, reported);
  if (said) addSpoken(said, into);
}
