import type { DiagnosisEvent } from "../contract/event";
import type { FaultTree } from "../tree/schema";
import { compile } from "./compile";
import { evidenceOf } from "./evidence-of";
import { fold } from "./fold";
import type { Compile } from "./keep-models";
import type { Payload } from "./log-of";
import { nextStep, type NextStep } from "./next-step";
import { settingOf } from "./setting-of";
import { rulesInForce, rulesToAsk } from "./stop-rules";
import { CANNOT_TELL, RESULTS_SAID } from "./words";

/** What would come next on one answer to the step that is due. */
export type AskedNext = {
  readonly says: string;
  /** A rule comes first: it is asked, or it is in force from then on. "end": it would be over. */
  readonly then: { readonly kind: "check" | "remedy" | "call" | "rule" | "end"; readonly key: string; readonly title: string };
};

const END = { kind: "end", key: "end", title: "The outcome is logged" } as const;

/**
 * What would be asked or tried next on each answer to a check or a remedy, by
 * saying each to the log and asking the planner. A next step for each answer:
 * to be worked out when somebody wants to see it. Rule [X12].
 *
 * @param step the step that is due; a call leads nowhere.
 */
export function askedNext(
  tree: FaultTree,
  log: readonly DiagnosisEvent[],
  step: Pick<NextStep, "kind" | "key">,
  models: Compile = compile,
): readonly AskedNext[] {
  const now = fold(log);
  const before = new Set([...rulesInForce(tree, now), ...rulesToAsk(tree, now)].map(({ key }) => key));
  return answersTo(tree, step).map(({ says, payload }) => {
    const state = fold([...log, toldNext(log, payload)]);
    const rule = [...rulesInForce(tree, state), ...rulesToAsk(tree, state)].find(({ key }) => !before.has(key));
    if (rule) return { says, then: { kind: "rule", key: rule.key, title: rule.title } };
    if (payload.kind === "remedy-tried" && payload.payload.result === "cured") return { says, then: END };
    const next = nextStep(models(tree, settingOf(tree, state)), evidenceOf(tree, state));
    return { says, then: { kind: next.kind, key: next.key, title: titleOf(tree, next) } };
  });
}

function answersTo(tree: FaultTree, { kind, key }: Pick<NextStep, "kind" | "key">): readonly { says: string; payload: Payload }[] {
  if (kind === "check") {
    const findings = tree.checks.find((check) => check.key === key)?.findings ?? [];
    const told = findings.map((finding): { says: string; payload: Payload } => ({
      says: finding.title,
      payload: { kind: "answered", payload: { check: key, answer: { finding: finding.key }, photos: [] } },
    }));
    return [
      ...told,
      { says: CANNOT_TELL, payload: { kind: "answered", payload: { check: key, answer: { cannotTell: true }, photos: [] } } },
    ];
  }
  if (kind === "call") return [];
  return (["cured", "better", "no-change", "could-not"] as const).map((result) => ({
    says: RESULTS_SAID[result],
    payload: { kind: "remedy-tried", payload: { remedy: key, result, photos: [] } },
  }));
}

/** The next event of a log, told by somebody who has seen all of it. It is never stored. */
function toldNext(log: readonly DiagnosisEvent[], payload: Payload): DiagnosisEvent {
  const seen: Record<string, number> = {};
  for (const { device, sequence } of log) seen[device] = Math.max(seen[device] ?? 0, sequence);
  const base = {
    id: "what-if",
    diagnosisId: log[0]?.diagnosisId ?? "",
    device: "what-if",
    sequence: 1,
    madeAt: log.at(-1)?.madeAt ?? "",
    seen,
  };
  return { ...base, ...payload } as DiagnosisEvent;
}

function titleOf(tree: FaultTree, { kind, key }: NextStep): string {
  if (kind === "call") return "Call for help";
  return [...tree.checks, ...tree.remedies].find((node) => node.key === key)?.title ?? key;
}
