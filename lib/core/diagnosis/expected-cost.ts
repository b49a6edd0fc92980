import type { CallPrice } from "./calling-minutes";
import type { Option } from "./options";

/** Below this share of the whole a remedy is not worth a place in the order. */
const NEGLIGIBLE = 1e-3;

/**
 * What is best to do when no more is asked: an option's place, or null to call;
 * and the option with the best cure chance per minute, whether it pays or not.
 */
export type BestTry = { readonly minutes: number; readonly option: number | null; readonly first: number | null };

/**
 * The expected cost to a cured engine when remedies are tried in the order of
 * cure chance per minute, and help is called where that is cheaper: the
 * estimate of what remains where no more is asked. One pass, exact for that
 * order, with overlapping and imperfect remedies (expected cost of repair after
 * Heckerman, Breese and Rommelse 1995; the call as in Lin 2015). Rules [N3], [N4], [C7].
 *
 * It is called once for each belief that is thought of: everything lies in
 * arrays made once, and what a reckoning finds is left in `minutes`, `option`
 * and `first` (-1: none).
 */
export class ExpectedCost {
  /** Those that can cure one of the hypotheses reckoned with. */
  readonly options: readonly Option[];
  minutes = 0;
  option = -1;
  first = -1;
  /** What a call costs in the end, for each hypothesis. */
  readonly #call: Float64Array;
  readonly #helperFinds: number;
  readonly #minutes: Float64Array;
  readonly #held: Float64Array;
  /** Links of option n: from linkFrom[n] to under linkFrom[n + 1]. */
  readonly #linkFrom: Int32Array;
  readonly #linkAt: Int32Array;
  readonly #linkCure: Float64Array;
  readonly #scratch: Float64Array;
  readonly #score: Float64Array;
  readonly #order: Int32Array;
  /** So many of the order were worth a place. */
  #count = 0;
  readonly #left: Float64Array;
  readonly #calls: Float64Array;

  /** @param kept the hypotheses reckoned with, by their index in the model; weights are given in this order. */
  constructor(all: readonly Option[], { callMinutes, helpersMinutes, helperFinds }: CallPrice, kept: readonly number[]) {
    const placeOf = new Int32Array(helpersMinutes.length).fill(-1);
    kept.forEach((index, place) => (placeOf[index] = place));
    this.options = all.filter(({ remedy }) => remedy.linkedAt.some((index) => placeOf[index]! >= 0));
    const count = this.options.length;
    this.#linkFrom = new Int32Array(count + 1);
    const links: number[] = [];
    const cures: number[] = [];
    this.options.forEach(({ remedy, comesOff }, place) => {
      remedy.linkedAt.forEach((index, link) => {
        if (placeOf[index]! < 0) return;
        links.push(placeOf[index]!);
        cures.push(remedy.linkedCure[link]! * comesOff);
      });
      this.#linkFrom[place + 1] = links.length;
    });
    this.#linkAt = Int32Array.from(links);
    this.#linkCure = Float64Array.from(cures);
    this.#minutes = Float64Array.from(this.options, ({ minutes }) => minutes);
    this.#held = Float64Array.from(this.options, ({ held }) => held);
    this.#call = Float64Array.from(kept, (index) => callMinutes + helpersMinutes[index]!);
    this.#helperFinds = helperFinds;
    this.#scratch = new Float64Array(kept.length);
    this.#score = new Float64Array(count);
    this.#order = new Int32Array(count);
    this.#left = new Float64Array(count + 1);
    this.#calls = new Float64Array(count + 1);
  }

  /** The first so many of the order that the last reckoning came to. */
  ranked(most: number): readonly number[] {
    return Array.from(this.#order.subarray(0, Math.min(most, this.#count)));
  }

  /** The same as {@link reckon}, as a value. */
  from(weights: Float64Array): BestTry {
    this.reckon(weights, 0, null);
    return { minutes: this.minutes, option: this.option < 0 ? null : this.option, first: this.first < 0 ? null : this.first };
  }

  /**
   * Expected minutes under weights that need not sum to 1, and the first thing to do.
   *
   * @param at where in `weights` they begin.
   * @param tried 1 for the options that are used up.
   */
  reckon(weights: Float64Array, at: number, tried: Uint8Array | null): void {
    const finds = this.#helperFinds;
    const scratch = this.#scratch;
    let total = 0;
    let calls = 0;
    let logs = 0;
    for (let index = 0; index < scratch.length; index++) {
      const weight = weights[at + index]!;
      scratch[index] = weight;
      total += weight;
      calls += weight * this.#call[index]!;
      if (finds > 0) logs += xLogX(weight);
    }
    this.minutes = 0;
    this.option = this.first = -1;
    this.#count = 0;
    if (total <= 0) return;
    const count = (this.#count = this.#rank(weights, at, total, tried));
    let left = total;
    for (let place = 0; place < count; place++) {
      this.#left[place] = left;
      this.#calls[place] = calls + this.#finding(left, logs);
      const option = this.#order[place]!;
      for (let link = this.#linkFrom[option]!; link < this.#linkFrom[option + 1]!; link++) {
        const index = this.#linkAt[link]!;
        const before = scratch[index]!;
        const after = before * (1 - this.#linkCure[link]!);
        scratch[index] = after;
        left -= before - after;
        calls -= (before - after) * this.#call[index]!;
        if (finds > 0) logs += xLogX(after) - xLogX(before);
      }
    }
    let remaining = calls + this.#finding(left, logs);
    let tries = false;
    for (let place = count - 1; place >= 0; place--) {
      const option = this.#order[place]!;
      const before = this.#left[place]!;
      const after = place + 1 < count ? this.#left[place + 1]! : left;
      const going = this.#minutes[option]! * before + this.#held[option]! * (before - after) + remaining;
      const calling = this.#calls[place]!;
      tries = going < calling;
      remaining = tries ? going : calling;
    }
    this.first = count > 0 ? this.#order[0]! : -1;
    this.option = tries ? this.first : -1;
    this.minutes = remaining / total;
  }

  /** What it costs whoever comes to find the cause: so much for each nat that weights with this sum, and this sum of w ln w, leave open. */
  #finding(total: number, logs: number): number {
    if (this.#helperFinds === 0 || total <= 0) return 0;
    return this.#helperFinds * Math.max(0, total * Math.log(total) - logs);
  }

  /** The chance that an option cures, under weights that sum to 1 and begin at `at`. */
  chanceOf(option: number, weights: Float64Array, at = 0): number {
    let chance = 0;
    for (let link = this.#linkFrom[option]!; link < this.#linkFrom[option + 1]!; link++)
      chance += weights[at + this.#linkAt[link]!]! * this.#linkCure[link]!;
    return chance;
  }

  /** Weights beginning at `at` once an option has failed. */
  fail(option: number, weights: Float64Array, at: number): void {
    for (let link = this.#linkFrom[option]!; link < this.#linkFrom[option + 1]!; link++) {
      const index = at + this.#linkAt[link]!;
      weights[index] = weights[index]! * (1 - this.#linkCure[link]!);
    }
  }

  /** What each hypothesis would cost, were it known: its remedies by minutes per chance, or a call where that is cheaper. Nothing can cost less. */
  ifKnown(): Float64Array {
    const curing: [minutes: number, cure: number][][] = Array.from(this.#call, () => []);
    for (let option = 0; option < this.options.length; option++)
      for (let link = this.#linkFrom[option]!; link < this.#linkFrom[option + 1]!; link++) {
        const cure = this.#linkCure[link]!;
        if (cure > 0) curing[this.#linkAt[link]!]!.push([this.#minutes[option]! + this.#held[option]! * cure, cure]);
      }
    return this.#call.map((call, index) =>
      curing[index]!.sort((a, b) => b[0] / b[1] - a[0] / a[1]).reduce(
        (left, [minutes, cure]) => Math.min(left, minutes + (1 - cure) * left),
        call,
      ),
    );
  }

  /** Puts the options worth trying first, best cure chance per minute first; ties by place, which is by key. Returns how many. */
  #rank(weights: Float64Array, at: number, total: number, tried: Uint8Array | null): number {
    const order = this.#order;
    const score = this.#score;
    let count = 0;
    for (let option = 0; option < order.length; option++) {
      if (tried !== null && tried[option] === 1) continue;
      const chance = this.chanceOf(option, weights, at);
      if (chance < NEGLIGIBLE * total) continue;
      const own = chance / (this.#minutes[option]! + (this.#held[option]! * chance) / total);
      score[option] = own;
      let place = count++;
      while (place > 0 && score[order[place - 1]!]! < own) {
        order[place] = order[place - 1]!;
        place--;
      }
      order[place] = option;
    }
    return count;
  }
}

const xLogX = (weight: number): number => (weight > 0 ? weight * Math.log(weight) : 0);
