import type { Belief } from "./believe";
import type { DiagnosisState } from "./fold";
import type { Model } from "./model";
import type { DiagnosisView } from "./view";

/** What a remedy that left a symptom has put right, as far as the numbers tell. Rule [X9]. */
export function putRightShown(model: Model, { partCure, symptoms }: DiagnosisState, { putRight }: Belief): DiagnosisView["putRight"] {
  if (!partCure) return null;
  const key = partCure.event.payload.remedy;
  const likeliest = model.causes
    .map((cause, index) => ({ cause, share: putRight?.[index] ?? 0 }))
    .reduce((best, one) => (one.share > best.share ? one : best), { cause: null as Model["causes"][number] | null, share: 0 }).cause;
  const titled = (present: boolean): readonly string[] =>
    symptoms
      .filter((one) => one.present === present && (present || one.left?.before === true))
      .map(({ symptom }) => model.tree.symptoms.find((one) => one.key === symptom)?.title ?? symptom);
  return {
    remedy: { key, title: model.tree.remedies.find((one) => one.key === key)?.title ?? key },
    cause: likeliest && { key: likeliest.key, title: likeliest.title },
    gone: titled(false),
    still: titled(true),
  };
}
