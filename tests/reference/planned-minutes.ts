import { believe } from "@/lib/core/diagnosis/believe";
import { callingMinutes } from "@/lib/core/diagnosis/calling-minutes";
import { NO_EVIDENCE, type Evidence } from "@/lib/core/diagnosis/evidence";
import type { Model } from "@/lib/core/diagnosis/model";

/** What is done next, given what is known. */
export type Choose = (model: Model, evidence: Evidence) => { readonly kind: "check" | "remedy" | "call"; readonly key: string };

/** What a way of going on costs, exactly: every answer followed, weighed by its chance. */
export function plannedMinutes(model: Model, choose: Choose): number {
  const memo = new Map<string, number>();
  const from = (evidence: Evidence): number => {
    const { findings, remedies } = evidence;
    const key = [...findings.map(({ check, finding }) => `${check}=${finding}`), ...remedies.map(({ remedy }) => remedy)].sort().join();
    const minutes = memo.get(key) ?? after(evidence);
    memo.set(key, minutes);
    return minutes;
  };
  const after = (evidence: Evidence): number => {
    const step = choose(model, evidence);
    const { shares } = believe(model, evidence);
    const chanceOf = (row: Float64Array): number => shares.reduce((sum, share, index) => sum + share * row[index]!, 0);
    if (step.kind === "call") return callingMinutes(model, shares);
    if (step.kind === "remedy") {
      const { minutes, cure } = model.remedies[model.remedyAt.get(step.key)!]!;
      const fails = 1 - chanceOf(cure);
      const failed = { ...evidence, remedies: [...evidence.remedies, { remedy: step.key, result: "no-change" as const }] };
      return minutes + (fails > 1e-15 ? fails * from(failed) : 0);
    }
    const { minutes, check, rows } = model.checks[model.checkAt.get(step.key)!]!;
    return check.findings.reduce((sum, { key }, at) => {
      const chance = chanceOf(rows[at]!);
      if (chance <= 0) return sum;
      return sum + chance * from({ ...evidence, findings: [...evidence.findings, { check: step.key, finding: key }] });
    }, minutes);
  };
  return from(NO_EVIDENCE);
}
