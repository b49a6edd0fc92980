import type { LogEntry } from "../contract/log";
import { hoursBetween } from "./came-back";
import { historiesOf, type CaseEntry } from "./spells";

/** What became of one line of the log (rules S1 to S3). */
export type Standing = Pick<LogEntry, "cameBackAfterHours" | "heldHours" | "timesHere">;

const NO_CASE: Standing = { cameBackAfterHours: null, heldHours: null, timesHere: 0 };

/**
 * The standing of every entry, by its id: whether its cure held, for how long, and the how-manieth time its cause is here.
 *
 * @param hoursNow hours since new of an engine at present; null where unknown
 */
export function standings(entries: readonly CaseEntry[], hoursNow: (engineId: string) => number | null): Map<string, Standing> {
  const result = new Map<string, Standing>(entries.map((entry) => [entry.id, NO_CASE]));
  for (const { engineId, spells } of historiesOf(entries)) {
    for (const [index, spell] of spells.entries()) {
      const next = spells[index + 1]?.entries[0];
      const last = spell.entries.at(-1);
      for (const entry of spell.entries) {
        const stands = entry === last && entry.outcome !== "handed-over";
        result.set(entry.id, {
          timesHere: index + 1,
          cameBackAfterHours: next && entry === spell.cure ? hoursBetween(entry, next) : null,
          heldHours: stands && !next ? hoursBetween(entry, { engineHours: hoursNow(engineId) }) : null,
        });
      }
    }
  }
  return result;
}

/**
 * How often a cause has appeared on an engine so far, for the moment when it is found again: "this has been here before".
 * `last` is the newest entry of it.
 */
export function hereBefore<E extends CaseEntry>(
  entries: readonly E[],
  engineId: string,
  cause: { key: string | null; title: string },
): { times: number; last: E | null } {
  const probe = {
    id: "",
    engineId,
    at: "9999-12-31T00:00:00Z",
    engineHours: null,
    hoursAreEstimated: false,
    outcome: "handed-over",
    cause: { ...cause, system: null },
    proof: null,
  } as const;
  const history = historiesOf<CaseEntry>([...entries, probe]).find((h) =>
    h.spells.some((spell) => spell.entries.some((entry) => entry === probe)),
  );
  const ids = new Set(history?.spells.flatMap((spell) => spell.entries.map((entry) => entry.id)));
  const earlier = history?.spells.filter((spell) => spell.entries[0] !== probe) ?? [];
  const last = [...entries]
    .filter((entry) => entry.engineId === engineId && ids.has(entry.id))
    .sort((a, b) => Date.parse(a.at) - Date.parse(b.at))
    .at(-1);
  return { times: earlier.length, last: last ?? null };
}
