import type { RepeatFault } from "../contract/log";
import { historiesOf, isProved, type CaseEntry, type CauseHistory, type Spell } from "./spells";

export type Upstream = RepeatFault["upstream"];

const MS_PER_DAY = 24 * 3600 * 1000;

/**
 * The faults that came back: the same cause again on the same engine after a
 * cure. Facts only (rules B1 to B6 of SPEC.md).
 *
 * @param entries lines of one fleet's log, of any engines, in any order; hours are hours since new
 * @param upstreamOf what brings a cause on, by its key (upstreamIn); default: nothing known
 */
export function cameBack(entries: readonly CaseEntry[], upstreamOf: (cause: string) => Upstream = () => []): RepeatFault[] {
  return historiesOf(entries)
    .filter((history) => history.spells.length > 1)
    .map((history) => repeat(history, upstreamOf))
    .sort((a, b) => b.count - a.count || lastSeen(b) - lastSeen(a) || (a.cause < b.cause ? -1 : 1));
}

function repeat({ engineId, cause, spells }: CauseHistory, upstreamOf: (cause: string) => Upstream): RepeatFault {
  const gaps = spells.slice(1).map((spell, i) => gap(spells[i] as Spell, spell));
  const gapsHours = gaps.flatMap((g) => (g.hours === null ? [] : [g.hours]));
  const all = spells.flatMap((spell) => spell.entries);
  // The tree's title where any entry has it: words are what people typed in its absence.
  const named = all.findLast((entry) => entry.cause?.key) ?? all.at(-1);
  return {
    engineId,
    cause,
    title: named?.cause?.title ?? cause,
    system: named?.cause?.system ?? null,
    count: spells.length,
    hours: spells.map((spell) => spell.entries[0].engineHours),
    hoursAreEstimated: all.some((entry) => entry.hoursAreEstimated),
    dates: spells.map((spell) => spell.entries[0].at),
    gapsHours: gapsHours.length === gaps.length ? gapsHours : [],
    gapsDays: gaps.map((g) => g.days),
    unprovedBefore: spells.slice(0, -1).filter((spell) => spell.cure && !isProved(spell.cure)).length,
    upstream: upstreamOf(cause),
  };
}

function gap(before: Spell, after: Spell): { hours: number | null; days: number } {
  const from = before.cure ?? before.entries[0];
  const to = after.entries[0];
  return { hours: hoursBetween(from, to), days: (Date.parse(to.at) - Date.parse(from.at)) / MS_PER_DAY };
}

/** Engine hours from one entry to a later one; null where either is unknown. Never less than nothing: estimated hours may disagree. */
export function hoursBetween(from: Pick<CaseEntry, "engineHours">, to: Pick<CaseEntry, "engineHours">): number | null {
  if (from.engineHours === null || to.engineHours === null) return null;
  return Math.max(0, to.engineHours - from.engineHours);
}

const lastSeen = (fault: RepeatFault) => Date.parse(fault.dates.at(-1) ?? "") || 0;
