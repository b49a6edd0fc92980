/** A finger that bounces in a seaway taps twice within this. */
export const GUARD_MS = 400;

/**
 * Lets taps through one by one. A second tap on the same control within the guard
 * is the same tap; one on another control is meant. What comes onto the screen
 * under the finger (the next question where the last one stood) has to ask
 * `settlesIn` and take nothing until then.
 */
export class TapGuard {
  #last = { at: -Infinity, on: "" };

  /** May this tap do its work? `on`: which control, or which row of buttons that move up when one is used. `now` in ms. */
  allows(on: string, now: number): boolean {
    if (on === this.#last.on && now - this.#last.at < GUARD_MS) return false;
    this.#last = { at: now, on };
    return true;
  }

  /** Milliseconds until something that has just come onto the screen may be tapped. */
  settlesIn(now: number): number {
    return Math.max(0, this.#last.at + GUARD_MS - now);
  }
}
