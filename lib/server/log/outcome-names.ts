import "server-only";
import type { OutcomePayload } from "@/lib/core/contract/event";
import type { FieldError } from "@/lib/core/contract/problem";
import type { FaultTree } from "@/lib/core/tree/schema";

type Outcome = Pick<OutcomePayload, "cause" | "causeInWords" | "remedy" | "remedyInWords">;

/** What an outcome names, with the titles that the tree gives it now: a log is read long after a tree has changed. */
export function namesOf(outcome: Outcome, symptoms: readonly string[], tree: FaultTree) {
  const cause = tree.causes.find((one) => one.key === outcome.cause);
  const remedy = tree.remedies.find((one) => one.key === outcome.remedy);
  return {
    symptoms: symptoms.map((key) => ({ key, title: tree.symptoms.find((one) => one.key === key)?.title ?? key })),
    causeKey: outcome.cause ?? null,
    causeTitle: cause?.title ?? outcome.cause ?? (outcome.causeInWords || null),
    causeSystem: cause?.system ?? null,
    remedyKey: outcome.remedy ?? null,
    remedyTitle: remedy?.title ?? outcome.remedy ?? (outcome.remedyInWords || null),
    temporary: remedy?.temporary ?? false,
  };
}

/** Keys of an outcome that the tree does not have, as faults of its fields. */
export function unknownIn(outcome: Outcome & { symptoms: readonly string[] }, tree: FaultTree): FieldError[] {
  const errors: FieldError[] = [];
  const missing = (key: string | undefined, known: readonly { key: string }[]) =>
    key !== undefined && !known.some((one) => one.key === key);
  if (missing(outcome.cause, tree.causes))
    errors.push({ path: "cause", says: `The fault tree has no cause "${outcome.cause}". Say it in words instead.` });
  if (missing(outcome.remedy, tree.remedies))
    errors.push({ path: "remedy", says: `The fault tree has no remedy "${outcome.remedy}". Say it in words instead.` });
  for (const key of outcome.symptoms)
    if (missing(key, tree.symptoms)) errors.push({ path: "symptoms", says: `The fault tree has no symptom "${key}".` });
  return errors;
}
