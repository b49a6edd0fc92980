import type { RepeatFault } from "@/lib/core/contract/log";

export const wholeNumber = (n: number) => Math.round(n).toLocaleString("en-GB");

/** "Primary filter blocked: 7 times in 784 hours"; in days where the hours are not known. */
export function repeatInWords(repeat: RepeatFault): string {
  return `${repeat.title}: ${repeat.count} times in ${spanOf(repeat)}`;
}

function spanOf(repeat: RepeatFault): string {
  const first = repeat.hours[0];
  const last = repeat.hours.at(-1);
  if (repeat.gapsHours.length > 0 && typeof first === "number" && typeof last === "number") {
    return `${repeat.hoursAreEstimated ? "about " : ""}${wholeNumber(last - first)} hours`;
  }
  return `${wholeNumber(repeat.gapsDays.reduce((a, b) => a + b, 0))} days`;
}
