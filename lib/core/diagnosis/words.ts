import type { RemedyResult } from "../contract/event";
import type { Situation } from "../tree/schema";

/** What a diagnosis says in fixed words; everything else it says is the tree's. */
export const RESULTS_SAID: Readonly<Record<RemedyResult, string>> = {
  cured: "Cured",
  better: "Better, not cured",
  "no-change": "No change",
  "could-not": "Could not do it",
};

export const SITUATIONS_SAID: Readonly<Record<Situation, string>> = {
  alongside: "Alongside",
  "at-anchor": "At anchor",
  "under-way": "Under way",
};

export const CANNOT_TELL = "Can\u2019t tell, or can\u2019t get to it";
export const NOT_FITTED = "Not fitted";

/** A figure as a gauge shows it: three digits that count, no trailing zeros. */
export const figureSaid = (value: number): string => String(Number(value.toPrecision(4)));

/** Minutes for people: single ones to an hour, then quarters. */
export function minutesSaid(minutes: number): string {
  if (minutes < 1) return "under a minute";
  if (minutes < 60) return `about ${Math.round(minutes)} min`;
  const quarters = Math.round(minutes / 15) / 4;
  return `about ${quarters} h`;
}
