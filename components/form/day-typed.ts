/** Today as a date field has it, in the zone of whoever types. */
export const today = (): string => dayOf(new Date());

/** The day of a moment as a date field has it, in the zone of whoever looks. */
export function dayOf(moment: string | Date): string {
  const now = new Date(moment);
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** A day as a moment: now for today, noon for any other, so that no zone makes it another day. */
export function momentOf(day: string): string {
  return (day === today() ? new Date() : new Date(`${day}T12:00:00`)).toISOString();
}

/** A day after today, where it is typed. */
export const isAhead = (day: string): boolean => day > today();

const two = (n: number) => String(n).padStart(2, "0");
