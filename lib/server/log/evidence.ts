import "server-only";
import type { RepeatEvidence } from "@/lib/core/contract/repeat-evidence";
import { assess, type Assessment } from "@/lib/core/recurrence/assess";
import { evidenceInWords } from "@/lib/core/recurrence/evidence-words";
import type { WatchedEngine } from "@/lib/core/recurrence/fault-records";
import type { FleetScope } from "@/lib/server/auth/scope";
import { readHistory, type History } from "./lines";
import { repeatedCauses } from "./queries";

/**
 * What chance could have made of the faults that came back on this engine. All engines are read: their hours are the fleet's own rate, and the
 * level is held over the fleet.
 */
export async function listEvidence(scope: FleetScope, engineId: string): Promise<RepeatEvidence[]> {
  const history = await readHistory(scope, { causes: await repeatedCauses(scope, undefined) });
  const now = new Date().toISOString();
  return assess(
    history.cases,
    history.engines.map((engine) => watched(engine, history, now)),
  )
    .filter((found) => found.engineId === engineId && found.times.length + Number(found.beginsWithFault) > 1)
    .map(evidence);
}

function watched(engine: History["engines"][number], { cases, clocks, hoursNow }: History, now: string): WatchedEngine {
  const clock = clocks.get(engine.id);
  const begins = [
    engine.createdAt.toISOString(),
    clock?.first?.readAt,
    ...cases.flatMap((one) => (one.engineId === engine.id ? [one.at] : [])),
  ]
    .flatMap((moment) => moment ?? [])
    .sort((a, b) => Date.parse(a) - Date.parse(b));
  const hoursAt = (moment: string) => clock?.at(moment) ?? { hours: null, estimated: true };
  return {
    id: engine.id,
    // Before the first reading hours may not be known: the record begins where they are.
    since: begins.find((moment) => hoursAt(moment).hours !== null) ?? begins[0] ?? now,
    now,
    // A meter stands at its last reading until the next.
    clock: { at: (moment) => (moment === now ? { hours: hoursNow(engine.id), estimated: !engine.hasHourMeter } : hoursAt(moment)) },
  };
}

function evidence(found: Assessment): RepeatEvidence {
  const { engineId, cause, title, unit, estimated, times, now, unproved, trend, frequency } = found;
  const { verdict, mtbf, mtbfLimits, expected, byPoisson, byChance } = frequency;
  return {
    ...{ engineId, cause, title, unit, estimated, now, unproved, mtbf, mtbfLimits, expected, byPoisson, byChance },
    words: evidenceInWords(found),
    times: [...times],
    trend: trend.verdict,
    laplace: trend.laplace,
    chiSquare: trend.chiSquare,
    growth: trend.growth,
    frequency: verdict,
  };
}
