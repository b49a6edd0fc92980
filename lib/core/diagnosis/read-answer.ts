import type { Answer, EventOf } from "../contract/event";
import type { Check, FaultTree } from "../tree/schema";
import { findingOf } from "../units/finding-of";
import { convert, findUnit } from "../units/units";
import type { DiagnosisState } from "./fold";
import type { Setting } from "./model";

/** The finding that an answer stands for; null: none could be told. Rule [F5]. */
export function findingFrom(tree: FaultTree, state: Pick<DiagnosisState, "profile">, event: EventOf<"answered">): string | null {
  const check = tree.checks.find((one) => one.key === event.payload.check);
  return check ? readAnswer(check, event.payload.answer, state.profile, tree.features) : null;
}

/** As findingFrom, for an answer alone. A value in a unit that does not fit tells nothing. */
export function readAnswer(check: Check, answer: Answer, profile: Setting["profile"], features: FaultTree["features"]): string | null {
  if ("finding" in answer) return check.findings.some((finding) => finding.key === answer.finding) ? answer.finding : null;
  if (!("value" in answer) || !check.reading) return null;
  const unit = findUnit(answer.unit);
  if (!unit || unit.quantity !== findUnit(check.reading.unit)?.quantity) return null;
  return findingOf(check.reading, convert(answer.value, unit.symbol, check.reading.unit), profile, features);
}
