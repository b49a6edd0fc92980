import type { Belief } from "./believe";

/** How sure the first place is: what the first cause holds, and how many causes it takes to hold most of it. */
export type HowSure = { readonly first: number; readonly toMost: number; readonly says: string };

/** "Most of it", of which it is counted how many causes hold it. */
const MOST = 0.8;
const SURE = 0.8;
const LIKELIER = 0.5;

/** How sure, in words from the same numbers. Rule [X11]. */
export function howSure({ shares }: Pick<Belief, "shares">): HowSure {
  const causes = [...shares.subarray(0, -1)].sort((a, b) => b - a);
  const first = causes[0] ?? 0;
  const unknown = shares.at(-1) ?? 0;
  let sum = 0;
  let toMost = 0;
  while (sum < MOST * (1 - unknown) && toMost < causes.length) sum += causes[toMost++]!;
  return { first, toMost, says: said(first, toMost, unknown) };
}

const of100 = (share: number): string => `${Math.round(share * 100)} of 100`;

function said(first: number, toMost: number, unknown: number): string {
  if (unknown > first) return `Something not in this tree is likelier than any one cause in it: ${of100(unknown)} against ${of100(first)}.`;
  if (first >= SURE) return `One cause holds ${of100(first)}: fairly sure.`;
  if (first >= LIKELIER) return `One cause holds ${of100(first)}: likelier than all others together, not sure.`;
  return `Still open: the likeliest holds ${of100(first)}, and it takes ${toMost} causes to hold most of it.`;
}
