import type { LogEntry } from "@/lib/core/contract/log";
import type { FaultTree } from "@/lib/core/tree/schema";
import { STRENGTHS } from "@/lib/core/tree/strength";

export type BeenHere = {
  /** Earlier cases on this engine, oldest first. */
  earlier: readonly { at: string; engineHours: number | null }[];
  upstream: readonly { title: string; share: number | null }[];
};

/** Was this cause on this engine before, and what lies upstream of it? From the part of the log that is on the phone. */
export function beenHere(log: readonly LogEntry[], tree: FaultTree, engineId: string, causeKey: string, thisDiagnosis: string): BeenHere {
  const cause = tree.causes.find(({ key }) => key === causeKey);
  const titleOf = (key: string) => tree.causes.find((other) => other.key === key)?.title ?? key;
  return {
    earlier: log
      .filter((entry) => entry.engineId === engineId && entry.cause?.key === causeKey && entry.diagnosisId !== thisDiagnosis)
      .filter((entry) => entry.outcome === "cured" || entry.outcome === "held")
      .map(({ at, engineHours }) => ({ at, engineHours }))
      .sort((a, b) => a.at.localeCompare(b.at)),
    upstream: [
      ...Object.entries(cause?.broughtOnBy ?? {})
        .map(([key, strength]) => ({ title: titleOf(key), share: typeof strength === "number" ? strength : STRENGTHS[strength] }))
        .sort((a, b) => b.share - a.share),
      ...(cause?.roots ?? []).map((title) => ({ title, share: null })),
    ],
  };
}
