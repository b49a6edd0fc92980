import type { LogQuery } from "@/lib/core/contract/log";

export const FILTERS = ["boat", "engine", "system", "outcome"] as const;
/** What the log is narrowed to, as the address has it. */
export type Filters = Partial<Record<(typeof FILTERS)[number], string>>;

export const OUTCOME_TITLES: Readonly<Record<NonNullable<LogQuery["outcome"]>, string>> = {
  open: "Open",
  cured: "Cured",
  held: "Held for now",
  "handed-over": "Handed over",
  "by-itself": "Ran again by itself",
  "broken-off": "Broken off",
};

/** Reads an address; what is said twice or left empty is not said. */
export function filtersOf(search: Readonly<Record<string, string | string[] | undefined>>): Filters {
  return Object.fromEntries(
    FILTERS.flatMap((name) => {
      const value = search[name];
      return typeof value === "string" && value !== "" ? [[name, value]] : [];
    }),
  );
}
