import { betaBelow } from "../statistics/beta";
import { historiesOf, type CaseEntry } from "./spells";

/** The longest that engines may fail apart to have failed together: a fill, a passage in company, one visit of a yard. */
const DAYS_TOGETHER = 14;
const MS_PER_DAY = 24 * 3600 * 1000;

/** One cause on several engines within days: fuel taken on together, the same yard, the same batch of a part (rules A1 to A3). */
export type AcrossFleet = {
  cause: string;
  title: string;
  system: string | null;
  engines: { engineId: string; at: string }[];
  /** From the first of them to the last. */
  days: number;
  /** P(so many within so few days of the last one), the fleet's cases of this cause spread evenly over its log; at most 1. */
  byChance: number;
};

/**
 * @param entries the fleet's log, in any order
 * @param since from when the fleet's log is kept
 * @returns newest first; a cause may stand there more than once
 */
export function acrossFleet(entries: readonly CaseEntry[], since: string): AcrossFleet[] {
  const byCause = new Map<string, { engineId: string; at: string; ms: number; title: string; system: string | null; id: string }[]>();
  for (const { engineId, cause, spells } of historiesOf(entries)) {
    const begun = spells.map(({ entries: [first] }) => ({
      engineId,
      at: first.at,
      ms: Date.parse(first.at),
      id: first.id,
      title: first.cause?.title ?? cause,
      system: first.cause?.system ?? null,
    }));
    byCause.set(cause, [...(byCause.get(cause) ?? []), ...begun]);
  }
  const found: AcrossFleet[] = [];
  for (const [cause, unordered] of byCause) {
    const cases = unordered.sort((a, b) => a.ms - b.ms || (a.id < b.id ? -1 : 1));
    for (let from = 0; from < cases.length;) {
      const first = cases[from];
      if (!first) break;
      // Each case is within days of the first: a slow trickle is no cluster.
      const together = cases.slice(from).filter((one) => one.ms - first.ms <= DAYS_TOGETHER * MS_PER_DAY);
      const engines = firstPerEngine(together);
      if (engines.length > 1) {
        const last = engines.at(-1) ?? first;
        const days = (last.ms - first.ms) / MS_PER_DAY;
        const watched = (last.ms - Date.parse(since)) / MS_PER_DAY;
        const before = cases.filter((one) => one.ms <= last.ms).length - 1;
        found.push({
          cause,
          title: first.title,
          system: first.system,
          engines: engines.map(({ engineId, at }) => ({ engineId, at })),
          days,
          byChance: watched > 0 ? atLeastOf(engines.length - 1, before, Math.min(1, Math.max(days, 1) / watched)) : 1,
        });
      }
      from += engines.length > 1 ? together.length : 1;
    }
  }
  return found.sort((a, b) => Date.parse(b.engines[0]?.at ?? "") - Date.parse(a.engines[0]?.at ?? "") || (a.cause < b.cause ? -1 : 1));
}

/** P(so many or more of n fall into a stretch of this share). */
const atLeastOf = (k: number, n: number, share: number) => (k > n ? 0 : betaBelow(share, k, n - k + 1));

function firstPerEngine<T extends { engineId: string }>(cases: readonly T[]): T[] {
  const seen = new Set<string>();
  return cases.filter(({ engineId }) => !seen.has(engineId) && seen.add(engineId));
}
