import type { FaultTree, KnownCase, Who } from "../tree/schema";
import { settingFor } from "./case-evidence";
import { probabilityOf } from "./cause-row";
import { compile } from "./compile";
import { curedBy } from "./play-case";

/**
 * What a known case costs to someone who looks at nothing: the remedies of the
 * causes in the order of how common they are with these symptoms, and a call
 * once its price has been spent. The yardstick beside the planner. Rule [V3].
 *
 * @returns minutes.
 */
export function baseRateMinutes(tree: FaultTree, known: KnownCase, person: Who): number {
  const model = compile(tree, settingFor(known, person));
  const weightOf = (index: number): number =>
    known.symptoms.reduce((sum, symptom) => sum + Math.log(model.symptoms.get(symptom)?.[index] ?? 1), model.logPrior[index] ?? -Infinity);
  const causes = model.causes
    .map((cause, index) => ({ cause, weight: weightOf(index) }))
    .sort((a, b) => b.weight - a.weight || (a.cause.key < b.cause.key ? -1 : 1));
  const order = causes.flatMap(({ cause }) =>
    Object.entries(cause.curedBy)
      .sort((a, b) => probabilityOf(b[1]) - probabilityOf(a[1]) || (a[0] < b[0] ? -1 : 1))
      .map(([remedy]) => remedy),
  );
  const open = new Set(known.causes);
  let minutes = 0;
  for (const key of new Set(order)) {
    const remedy = model.remedies[model.remedyAt.get(key) ?? -1];
    if (!remedy?.offered) continue;
    if (minutes >= model.callMinutes) break;
    minutes += remedy.minutes;
    curedBy(tree, open, key).forEach((cause) => open.delete(cause));
    if (open.size === 0) return minutes;
  }
  return minutes + model.callMinutes;
}
