import "server-only";
import type { DiagnosisEvent } from "@/lib/core/contract/event";
import type { FaultTree } from "@/lib/core/tree/schema";
import { convert, findUnit } from "@/lib/core/units/units";

/**
 * Why an event cannot belong to a diagnosis made with this tree, in words; null
 * when it can. Devices send answers in the tree's own keys; what the answers
 * mean is worked out here as there.
 */
export function refusalOf(event: DiagnosisEvent, tree: FaultTree): string | null {
  switch (event.kind) {
    case "begun":
      return firstOf(event.payload.symptoms.map((key) => unknown("symptom", key, tree.symptoms)));
    case "symptom-told":
      return unknown("symptom", event.payload.symptom, tree.symptoms);
    case "rule-answered":
      return unknown("stop rule", event.payload.rule, tree.stopRules);
    case "remedy-tried":
      return unknown("remedy", event.payload.remedy, tree.remedies);
    case "feature-told": {
      const feature = tree.features.find((f) => f.key === event.payload.feature);
      return feature
        ? unknown(`option of "${feature.key}"`, event.payload.option, feature.options)
        : unknown("feature", event.payload.feature, []);
    }
    case "ended": {
      const { cause, remedy } = event.payload;
      return firstOf([cause ? unknown("cause", cause, tree.causes) : null, remedy ? unknown("remedy", remedy, tree.remedies) : null]);
    }
    case "answered":
      return answerRefusal(event.payload, tree);
    default:
      return null;
  }
}

type Answered = Extract<DiagnosisEvent, { kind: "answered" }>["payload"];

function answerRefusal({ check: key, answer }: Answered, tree: FaultTree): string | null {
  const check = tree.checks.find((c) => c.key === key);
  if (!check) return unknown("check", key, []);
  if ("finding" in answer) return unknown(`finding of "${check.title}"`, answer.finding, check.findings);
  if (!("value" in answer)) return null;
  const { reading } = check;
  if (!reading) return `"${check.title}" is not read off an instrument: answer with one of its findings.`;
  const unit = findUnit(answer.unit);
  if (!unit) return `"${answer.unit}" is not a unit known here.`;
  if (unit.quantity !== reading.quantity) return `"${answer.unit}" does not measure ${reading.quantity}, which "${check.title}" asks for.`;
  const value = convert(answer.value, answer.unit, reading.unit);
  if (value < reading.from || value > reading.to)
    return `${answer.value} ${answer.unit} is off the scale of "${check.title}": ${reading.from} to ${reading.to} ${reading.unit}.`;
  return null;
}

const unknown = (what: string, key: string, known: readonly { key: string }[]): string | null =>
  known.some((one) => one.key === key) ? null : `This version of the tree has no ${what} "${key}".`;

const firstOf = (refusals: readonly (string | null)[]): string | null => refusals.find((says) => says !== null) ?? null;
