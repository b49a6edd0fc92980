import type { LogEntry } from "@/lib/core/contract/log";
import type { Upstream } from "@/lib/core/recurrence/came-back";
import { hereBefore } from "@/lib/core/recurrence/standing";
import { upstreamIn } from "@/lib/core/recurrence/upstream";
import type { FaultTree } from "@/lib/core/tree/schema";

/** `times`: earlier appearances of the cause on this engine. `last`: the newest entry of it. */
export type BeenHere = { times: number; last: Pick<LogEntry, "at" | "engineHours"> | null; upstream: Upstream };

/** Was this cause on this engine before, and what lies upstream of it? From the part of the log that is on the phone, by the log's own rules. */
export function beenHere(log: readonly LogEntry[], tree: FaultTree, engineId: string, causeKey: string, thisDiagnosis: string): BeenHere {
  const title = tree.causes.find(({ key }) => key === causeKey)?.title ?? causeKey;
  const others = log.filter((entry) => entry.diagnosisId !== thisDiagnosis);
  return { ...hereBefore(others, engineId, { key: causeKey, title }), upstream: upstreamIn(tree)(causeKey) };
}
