import "server-only";
import type { RepeatEvidence } from "@/lib/core/contract/repeat-evidence";
import { assess, type Assessment } from "@/lib/core/recurrence/assess";
import { evidenceInWords } from "@/lib/core/recurrence/evidence-words";
import type { FleetScope } from "@/lib/server/auth/scope";
import { readHistory } from "./lines";
import { repeatedCauses } from "./queries";
import { watchedEngines } from "./watched-engines";

/**
 * What chance could have made of the faults that came back on this engine. All engines are read: their hours are the fleet's own rate, and the
 * level is held over the fleet.
 */
export async function listEvidence(scope: FleetScope, engineId: string): Promise<RepeatEvidence[]> {
  const history = await readHistory(scope, { causes: await repeatedCauses(scope, undefined) });
  return assess(history.cases, watchedEngines(history, new Date().toISOString()))
    .filter((found) => found.engineId === engineId && found.times.length + Number(found.beginsWithFault) > 1)
    .map(evidence);
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
