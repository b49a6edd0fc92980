import type { LogEntry } from "../contract/log";
import { causeIdentity, causesOf } from "./same-cause";

/** A line of a log, as far as repeat faults hang on it; every LogEntry is one. `engineHours` are hours since new. */
export type CaseEntry = Pick<LogEntry, "id" | "engineId" | "at" | "engineHours" | "hoursAreEstimated" | "outcome" | "cause" | "proof"> & {
  /** Ended with a remedy that only gets one home. */
  temporary?: boolean;
};

/** The cases of one cause on one engine up to a cure: one appearance of the fault (rule C4). */
export type Spell<E extends CaseEntry = CaseEntry> = {
  entries: [E, ...E[]];
  /** The case that ended in a cure; null while none has. */
  cure: E | null;
};

export type CauseHistory<E extends CaseEntry = CaseEntry> = { engineId: string; cause: string; spells: [Spell<E>, ...Spell<E>[]] };

/** Rule C1: something was confirmed. */
function isCase(entry: CaseEntry): boolean {
  return entry.cause !== null && (entry.outcome === "cured" || entry.outcome === "held" || entry.outcome === "handed-over");
}

/** Rule C3. */
function isCure(entry: CaseEntry): boolean {
  return isCase(entry) && (entry.outcome === "cured" || (entry.outcome === "held" && !entry.temporary));
}

export function isProved(entry: CaseEntry): boolean {
  return entry.outcome === "cured" && entry.proof !== null && entry.proof.trim() !== "";
}

/** The appearances of every cause on every engine, oldest first (rules C1 to C5), whatever the order of the entries. */
export function historiesOf<E extends CaseEntry>(entries: readonly E[]): CauseHistory<E>[] {
  const identity = causeIdentity(causesOf(entries));
  const histories = new Map<string, CauseHistory<E>>();
  for (const entry of [...entries].sort(inOrder)) {
    if (!entry.cause || !isCase(entry)) continue;
    const cause = identity(entry.cause);
    const cure = isCure(entry) ? entry : null;
    const history = histories.get(`${entry.engineId} ${cause}`);
    const open = history?.spells.at(-1);
    if (!history || !open)
      histories.set(`${entry.engineId} ${cause}`, { engineId: entry.engineId, cause, spells: [{ entries: [entry], cure }] });
    else if (open.cure) history.spells.push({ entries: [entry], cure });
    else {
      open.entries.push(entry);
      open.cure = cure;
    }
  }
  return [...histories.values()];
}

export function inOrder(a: Pick<CaseEntry, "at" | "id">, b: Pick<CaseEntry, "at" | "id">): number {
  return Date.parse(a.at) - Date.parse(b.at) || (a.id < b.id ? -1 : a.id > b.id ? 1 : 0);
}
