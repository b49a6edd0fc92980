import type { WatchedEngine } from "@/lib/core/recurrence/fault-records";
import type { CaseEntry } from "@/lib/core/recurrence/spells";

/** Mulberry32: small, seeded, good enough to draw faults with. */
export function dice(seed: number): () => number {
  let state = seed | 0;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

const exponential = (roll: () => number) => -Math.log(1 - roll());

/** Gamma of mean 1 and a whole shape: engines differ, by 1 / sqrt(shape). */
function unlike(shape: number, roll: () => number): number {
  let sum = 0;
  for (let i = 0; i < shape; i++) sum += exponential(roll);
  return sum / shape;
}

export type SimulatedFleet = { entries: CaseEntry[]; engines: WatchedEngine[] };

const START = Date.UTC(2000, 0, 1);
const MS_PER_HOUR = 3600 * 1000;
/** Hours of life; the calendar runs a hundred times as fast as the engine. */
const CALENDAR = 100;
const momentAt = (hours: number) => new Date(START + hours * CALENDAR * MS_PER_HOUR).toISOString();

/**
 * A fleet over its life. Each engine has each cause at a rate of its own about the cause's; `beta` above 1 makes every one of them worsen (a power
 * law with the same number expected over the life).
 *
 * @param expected faults of one cause on one engine over its life, on average
 * @param shape how alike engines are in their rates: Infinity, all the same
 */
export function simulatedFleet(
  setting: { engines: number; causes: number; expected: number; hours: number; shape: number; beta?: number },
  roll: () => number,
): SimulatedFleet {
  const entries: CaseEntry[] = [];
  const engines = Array.from({ length: setting.engines }, (_, i) => ({
    id: `engine-${i}`,
    since: momentAt(0),
    now: momentAt(setting.hours),
    clock: { at: (moment: string) => ({ hours: (Date.parse(moment) - START) / MS_PER_HOUR / CALENDAR, estimated: false }) },
  }));
  for (const { id } of engines) {
    for (let cause = 0; cause < setting.causes; cause++) {
      const expected = setting.expected * (Number.isFinite(setting.shape) ? unlike(setting.shape, roll) : 1);
      for (let sum = exponential(roll); sum < expected; sum += exponential(roll)) {
        const hours = setting.hours * (sum / expected) ** (1 / (setting.beta ?? 1));
        entries.push(aCure(`${id}-${cause}-${sum}`, id, `cause-${cause}`, hours));
      }
    }
  }
  return { entries, engines };
}

const aCure = (id: string, engineId: string, cause: string, hours: number): CaseEntry => ({
  id,
  engineId,
  at: momentAt(hours),
  engineHours: hours,
  hoursAreEstimated: false,
  outcome: "cured",
  cause: { key: cause, title: cause, system: null },
  proof: "Ten minutes at full throttle",
});

/** The fleet as its log stood at so many hours. */
export function asOf({ entries, engines }: SimulatedFleet, hours: number): SimulatedFleet {
  const now = momentAt(hours);
  return { entries: entries.filter(({ at }) => at <= now), engines: engines.map((engine) => ({ ...engine, now })) };
}
