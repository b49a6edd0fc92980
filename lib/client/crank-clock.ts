/** Small starters are turned for seconds; a longer burst is a clock that was forgotten. */
const LONGEST_BURST = 60;
/** What is reckoned where the phone's clock was set back meanwhile. */
const USUAL_BURST = 10;

/** Whole seconds of a burst that is over, from the phone's clock in ms. Never less than what was turned, as far as can be known. */
export function burstSeconds(from: number, to: number): number {
  if (to < from) return USUAL_BURST;
  return Math.min(LONGEST_BURST, Math.ceil((to - from) / 1000));
}
