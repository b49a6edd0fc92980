import type { DiagnosisEvent } from "../contract/event";

/** What a device knew of each device's log, itself included, as far as the log tells. */
type Clock = ReadonlyMap<string, number>;

/** Events in an order that every device finds alike, and which of two came first. */
export type CausalOrder = {
  /** Each event once; an event never stands before one that its device knew of. */
  readonly events: readonly DiagnosisEvent[];
  /** Did the device that wrote `later` know of `earlier`? Never by wall clock. */
  readonly before: (earlier: DiagnosisEvent, later: DiagnosisEvent) => boolean;
};

/**
 * Orders a log by who knew what: device and sequence, and the heads each event
 * says it had seen. The same for any order of arrival and any repeats. Rules [F1], [F2], [F9].
 */
export function causalOrder(log: readonly DiagnosisEvent[]): CausalOrder {
  const events = distinct(log);
  const clocks = clocksOf(events);
  const known = new Map(events.map((event) => [event, sum(clocks.get(event.id))]));
  const before = (earlier: DiagnosisEvent, later: DiagnosisEvent): boolean =>
    earlier.device === later.device
      ? earlier.sequence < later.sequence
      : (clocks.get(later.id)?.get(earlier.device) ?? 0) >= earlier.sequence;
  return { events: [...events].sort((a, b) => (known.get(a) ?? 0) - (known.get(b) ?? 0) || byPlace(a, b)), before };
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
const byPlace = (a: DiagnosisEvent, b: DiagnosisEvent): number =>
  compare(a.device, b.device) || a.sequence - b.sequence || compare(a.id, b.id);

/** One event an id. Should two differ under one id, every device keeps the same one. */
function distinct(log: readonly DiagnosisEvent[]): readonly DiagnosisEvent[] {
  const byId = new Map<string, DiagnosisEvent>();
  for (const event of log) {
    const before = byId.get(event.id);
    if (!before || (before !== event && compare(JSON.stringify(event), JSON.stringify(before)) < 0)) byId.set(event.id, event);
  }
  return [...byId.values()].sort(byPlace);
}

function clocksOf(events: readonly DiagnosisEvent[]): ReadonlyMap<string, Clock> {
  const byDevice = new Map<string, DiagnosisEvent[]>();
  for (const event of events) byDevice.set(event.device, [...(byDevice.get(event.device) ?? []), event]);
  const done = new Map<string, Clock>();
  const busy = new Set<string>();
  const lastUpTo = (device: string, sequence: number): DiagnosisEvent | undefined =>
    byDevice.get(device)?.findLast((event) => event.sequence <= sequence);
  const clockOf = (event: DiagnosisEvent): Clock => {
    const ready = done.get(event.id);
    if (ready) return ready;
    // A log that says it saw its own future is taken at its word no further.
    if (busy.has(event.id)) return new Map();
    busy.add(event.id);
    const clock = new Map<string, number>();
    const raise = (device: string, sequence: number): void => void clock.set(device, Math.max(clock.get(device) ?? 0, sequence));
    const learn = (from: DiagnosisEvent | undefined): void => {
      if (from) for (const [device, sequence] of clockOf(from)) raise(device, sequence);
    };
    learn(lastUpTo(event.device, event.sequence - 1));
    for (const [device, claimed] of Object.entries(event.seen).sort((a, b) => compare(a[0], b[0]))) {
      if (device === event.device) continue;
      const head = believedHead(event, byDevice.get(device) ?? [], claimed);
      if (!head) continue;
      raise(device, head.sequence);
      learn(head);
    }
    clock.set(event.device, event.sequence);
    busy.delete(event.id);
    done.set(event.id, clock);
    return clock;
  };
  for (const event of [...events].sort((a, b) => a.sequence - b.sequence || byPlace(a, b))) clockOf(event);
  return done;
}

/**
 * The newest event of another device that this one is believed to have seen. A
 * head that the log does not have counts up to what there is, and never to an
 * event whose device says it saw this one before: a phone cannot claim what is
 * still to be said. Rule [F9].
 */
function believedHead(event: DiagnosisEvent, theirs: readonly DiagnosisEvent[], claimed: number): DiagnosisEvent | undefined {
  const upTo = theirs.filter(({ sequence }) => sequence <= claimed);
  if (upTo.at(-1)?.sequence === claimed) return upTo.at(-1);
  const answer = upTo.findIndex(({ seen }) => (seen[event.device] ?? 0) >= event.sequence);
  return answer < 0 ? upTo.at(-1) : upTo[answer - 1];
}

const sum = (clock: Clock | undefined): number => [...(clock?.values() ?? [])].reduce((total, sequence) => total + sequence, 0);
