const MINUTE = 60_000;

/** "11 min", "2 h 10 min", "3 days": how long, as one would say it. */
export function durationInWords(minutes: number): string {
  const whole = Math.max(0, Math.round(minutes));
  if (whole < 60) return `${whole} min`;
  if (whole < 24 * 60) {
    const hours = Math.floor(whole / 60);
    const rest = whole % 60;
    return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
  }
  const days = Math.round(whole / (24 * 60));
  return days === 1 ? "1 day" : `${days} days`;
}

/** "12 min ago", "just now". A clock that was set back counts as now. */
export function agoInWords(moment: string, now: number): string {
  const minutes = (now - Date.parse(moment)) / MINUTE;
  return minutes < 1 ? "just now" : `${durationInWords(minutes)} ago`;
}

export const minutesBetween = (from: string, to: string | number): number =>
  Math.max(0, ((typeof to === "number" ? to : Date.parse(to)) - Date.parse(from)) / MINUTE);
