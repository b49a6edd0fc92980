const FIRST_SECONDS = 2;
const LONGEST_SECONDS = 300;

/** Seconds until the next try after so many failures in a row; `dice` in 0..1 spreads phones that lost the same signal. */
export function backoffSeconds(failures: number, dice: number): number {
  const wait = Math.min(LONGEST_SECONDS, FIRST_SECONDS * 2 ** Math.max(0, failures - 1));
  return wait * (0.5 + dice / 2);
}
