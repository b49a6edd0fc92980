import type { RemedyResult } from "../contract/event";
import type { Evidence } from "./evidence";
import { addFinding, heard, reportedIn } from "./finding-weight";
import type { Model } from "./model";

/** "Better, not cured" is as likely as a fifth of a cure while only single causes are weighed. */
const BETTER = 0.2;
/** Even what is not in the tree can get a little better by chance. */
const BETTER_LEAST = 0.002;

/** Shares over the model's hypotheses, the unknown last; they sum to 1. */
export type Belief = { readonly shares: Float64Array };

/**
 * How strongly each hypothesis is believed after all that is known.
 *
 * One cause is taken to be at fault, and findings to be independent once it is
 * known; SPEC.md says where that misleads. Works in logarithms, since a long
 * session multiplies enough small numbers to reach zero. What is known is taken
 * in the order of its keys, so the order of telling cannot change a single bit.
 * Rules [P1]-[P4], [E1]-[E4], [K2].
 */
export function believe(model: Model, evidence: Evidence): Belief {
  const log = Float64Array.from(model.logPrior);
  addSymptoms(model, evidence.symptoms, log);
  const reported = reportedIn(evidence);
  for (const one of heard(model, evidence.findings)) addFinding(one, reported, log);
  addRemedies(model, evidence.remedies, log);
  return { shares: normalised(log) };
}

const byKey = <T>(items: readonly T[], keyOf: (item: T) => string): readonly T[] =>
  [...items].sort((a, b) => (keyOf(a) < keyOf(b) ? -1 : 1));

function addSymptoms(model: Model, symptoms: Evidence["symptoms"], log: Float64Array): void {
  let told = false;
  for (const { symptom, present } of byKey(symptoms, (one) => one.symptom)) {
    const row = model.symptoms.get(symptom);
    if (!row) continue;
    told = true;
    for (let index = 0; index < model.unknownAt; index++) {
      const share = row[index] ?? 0;
      log[index] = (log[index] ?? 0) + (present ? Math.log(share) : Math.log1p(-share));
    }
  }
  if (told && model.unknownAt > 0) log[model.unknownAt] = (log[model.unknownAt] ?? 0) + meanOverCauses(model, log);
}

/** ln of the mean, over the causes, of the likelihood of all symptoms together: the unknown keeps its share whatever is reported. Rule [K2]. */
function meanOverCauses(model: Model, log: Float64Array): number {
  let most = -Infinity;
  for (let index = 0; index < model.unknownAt; index++) most = Math.max(most, log[index] ?? -Infinity);
  let sum = 0;
  let prior = 0;
  for (let index = 0; index < model.unknownAt; index++) {
    sum += Math.exp((log[index] ?? 0) - most);
    prior += Math.exp(model.logPrior[index] ?? 0);
  }
  return Math.log(sum) + most - Math.log(prior);
}

function addRemedies(model: Model, remedies: Evidence["remedies"], log: Float64Array): void {
  for (const { remedy, result } of byKey(remedies, (one) => one.remedy)) {
    const cure = model.remedies[model.remedyAt.get(remedy) ?? -1]?.cure;
    if (!cure || result === "could-not") continue;
    for (let index = 0; index < log.length; index++) log[index] = (log[index] ?? 0) + Math.log(resultShare(result, cure[index] ?? 0));
  }
}

function resultShare(result: Exclude<RemedyResult, "could-not">, cure: number): number {
  if (result === "cured") return cure;
  return result === "better" ? Math.max(BETTER_LEAST, BETTER * cure) : 1 - cure;
}

function normalised(log: Float64Array): Float64Array {
  let most = -Infinity;
  for (const one of log) if (one > most) most = one;
  // Only "cured" can rule everything out, in a tree where nothing applies; then nothing is learnt.
  if (most === -Infinity) return new Float64Array(log.length).fill(1 / log.length);
  const shares = log.map((one) => Math.exp(one - most));
  let total = 0;
  for (const share of shares) total += share;
  for (let index = 0; index < shares.length; index++) shares[index] = (shares[index] ?? 0) / total;
  return shares;
}
