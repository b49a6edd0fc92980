import type { CaseEntry } from "../../../lib/core/recurrence/spells";

let made = 0;

/** A cured, proved blocked filter on the one engine, unless said otherwise; `day` counts from 1 January 2026. */
export function aCase(day: number, engineHours: number | null, change: Partial<CaseEntry> = {}): CaseEntry {
  return {
    id: `0198c000-0000-7000-8000-${String(++made).padStart(12, "0")}`,
    engineId: "engine-1",
    at: new Date(Date.UTC(2026, 0, day)).toISOString(),
    engineHours,
    hoursAreEstimated: false,
    outcome: "cured",
    cause: { key: "primary-filter-blocked", title: "Primary filter blocked", system: "fuel-supply" },
    proof: "Ten minutes at full throttle",
    ...change,
  };
}

export const inWords = (title: string) => ({ key: null, title, system: null });
