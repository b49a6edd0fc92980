import { entropyOf } from "./outcomes";

/** What a call costs in minutes: its own price, the work of whoever comes for each hypothesis, and what each nat costs them. */
export type CallPrice = { readonly callMinutes: number; readonly helpersMinutes: Float64Array; readonly helperFinds: number };

/**
 * What a call costs in the end: its price, and what whoever comes still has to
 * find and to mend. So a look that is cheaper than theirs pays even where help
 * is called all the same. Rule [C7].
 *
 * @param shares of the hypotheses; they sum to 1.
 * @returns expected minutes.
 */
export function callingMinutes({ callMinutes, helpersMinutes, helperFinds }: CallPrice, shares: Float64Array): number {
  const mending = shares.reduce((sum, share, index) => sum + share * (helpersMinutes[index] ?? 0), 0);
  return callMinutes + mending + helperFinds * entropyOf(shares);
}
