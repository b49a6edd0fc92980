import type { Evidence } from "./evidence";
import { addFinding, heard, reportedIn } from "./finding-weight";
import type { Model } from "./model";

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
    const logs = model.logSymptoms.get(symptom);
    if (!logs) continue;
    told = true;
    const row = present ? logs.present : logs.absent;
    for (let index = 0; index < model.unknownAt; index++) log[index] = log[index]! + row[index]!;
  }
  if (told && model.unknownAt > 0) log[model.unknownAt] = log[model.unknownAt]! + meanOverCauses(model, log);
}

/** ln of the mean, over the causes, of the likelihood of all symptoms together: the unknown keeps its share whatever is reported. Rule [K2]. */
function meanOverCauses(model: Model, log: Float64Array): number {
  let most = -Infinity;
  for (let index = 0; index < model.unknownAt; index++) most = Math.max(most, log[index]!);
  let sum = 0;
  for (let index = 0; index < model.unknownAt; index++) sum += Math.exp(log[index]! - most);
  return Math.log(sum) + most - model.logPriorOfCauses;
}

function addRemedies(model: Model, remedies: Evidence["remedies"], log: Float64Array): void {
  for (const { remedy, result } of byKey(remedies, (one) => one.remedy)) {
    const tried = model.remedies[model.remedyAt.get(remedy) ?? -1];
    if (!tried || result === "could-not") continue;
    const row = tried.logResults[result];
    for (let index = 0; index < log.length; index++) log[index] = log[index]! + row[index]!;
  }
}

/** Logs of weights as shares, in place. */
function normalised(log: Float64Array): Float64Array {
  let most = -Infinity;
  for (const one of log) if (one > most) most = one;
  // Only "cured" can rule everything out, in a tree where nothing applies; then nothing is learnt.
  if (most === -Infinity) return new Float64Array(log.length).fill(1 / log.length);
  let total = 0;
  for (let index = 0; index < log.length; index++) {
    const weight = Math.exp(log[index]! - most);
    log[index] = weight;
    total += weight;
  }
  for (let index = 0; index < log.length; index++) log[index] = log[index]! / total;
  return log;
}
