import type { Candidate } from "./candidates";

/** The checks of a plan as plain arrays over the hypotheses that are reckoned with, so that nothing is made while thinking. */
export class PlanChecks {
  readonly count: number;
  readonly minutes: Float64Array;
  /** Chance that there is something to look at, and that the way to it opens. */
  readonly learns: Float64Array;
  /** Rows of check n: from rowFrom[n] to under rowFrom[n + 1]. */
  readonly rowFrom: Int32Array;
  /** P(finding), a row after the other. */
  readonly predict: Float64Array;
  /** What belief multiplies by; the same array where they are one. */
  readonly weigh: Float64Array;
  /** The most children a check can have. */
  readonly mostRows: number;
  readonly told: Float64Array;
  readonly #size: number;
  readonly #sight: Int32Array;
  /** 1 where predict and weigh are the same: then `negEntropy` holds the sums of P ln P. */
  readonly #plain: Uint8Array;
  readonly #negEntropy: Float64Array;

  /** @param kept the hypotheses reckoned with, by their index in the model. */
  constructor(candidates: readonly Candidate[], kept: readonly number[]) {
    const size = (this.#size = kept.length);
    const count = (this.count = candidates.length);
    const rows = candidates.map(({ outcomes }) => outcomes.predict.length);
    this.minutes = Float64Array.from(candidates, ({ minutes }) => minutes);
    this.learns = Float64Array.from(candidates, ({ learns }) => learns);
    this.rowFrom = new Int32Array(count + 1);
    rows.forEach((of, place) => (this.rowFrom[place + 1] = this.rowFrom[place]! + of));
    this.mostRows = Math.max(0, ...rows);
    this.predict = new Float64Array(this.rowFrom[count]! * size);
    const same = candidates.every(({ outcomes }) => outcomes.weigh === outcomes.predict);
    this.weigh = same ? this.predict : new Float64Array(this.predict.length);
    this.told = new Float64Array(count);
    this.#plain = new Uint8Array(count);
    this.#negEntropy = new Float64Array(count * size);
    const sights = [...new Set(candidates.map(({ check }) => check.check.sameSight))].filter((sight) => sight !== undefined);
    this.#sight = Int32Array.from(candidates, ({ check }) => sights.indexOf(check.check.sameSight ?? ""));
    candidates.forEach(({ outcomes: { predict, weigh, negEntropy } }, place) => {
      for (let row = 0; row < predict.length; row++) {
        const at = (this.rowFrom[place]! + row) * size;
        for (let index = 0; index < size; index++) {
          this.predict[at + index] = predict[row]![kept[index]!]!;
          if (!same) this.weigh[at + index] = weigh[row]![kept[index]!]!;
        }
      }
      if (!negEntropy) return;
      this.#plain[place] = 1;
      for (let index = 0; index < size; index++) this.#negEntropy[place * size + index] = negEntropy[kept[index]!]!;
    });
  }

  /** Marks a check, and those that see the same thing. */
  mark(place: number, seen: Uint8Array): void {
    seen[place] = 1;
    const sight = this.#sight[place]!;
    if (sight < 0) return;
    for (let other = 0; other < this.count; other++) if (this.#sight[other] === sight) seen[other] = 1;
  }

  /**
   * Leaves in `told` how much each check that is not seen yet is expected to tell, in nats, under weights that sum to 1 and begin at `at`.
   * Numbers are left in the array, not returned: a fraction returned by a function takes room on the heap.
   */
  tell(weights: Float64Array, at: number, seen: Uint8Array): void {
    for (let place = 0; place < this.count; place++) {
      if (seen[place] === 1) continue;
      if (this.#plain[place] === 1) this.#quick(place, weights, at);
      else this.#slow(place, weights, at);
    }
  }

  #quick(place: number, weights: Float64Array, at: number): void {
    const size = this.#size;
    const own = place * size;
    let sum = 0;
    for (let index = 0; index < size; index++) sum += weights[at + index]! * this.#negEntropy[own + index]!;
    for (let row = this.rowFrom[place]!; row < this.rowFrom[place + 1]!; row++) {
      let chance = 0;
      for (let index = 0; index < size; index++) chance += weights[at + index]! * this.predict[row * size + index]!;
      if (chance > 0) sum -= chance * Math.log(chance);
    }
    this.told[place] = this.learns[place]! * Math.max(0, sum);
  }

  #slow(place: number, weights: Float64Array, at: number): void {
    const size = this.#size;
    let told = 0;
    for (let index = 0; index < size; index++) told -= xLogX(weights[at + index]!);
    for (let row = this.rowFrom[place]!; row < this.rowFrom[place + 1]!; row++) {
      let chance = 0;
      let total = 0;
      let logs = 0;
      for (let index = 0; index < size; index++) {
        const weight = weights[at + index]!;
        const then = weight * this.weigh[row * size + index]!;
        chance += weight * this.predict[row * size + index]!;
        total += then;
        logs += xLogX(then);
      }
      if (total > 0) told -= chance * (Math.log(total) - logs / total);
    }
    this.told[place] = this.learns[place]! * Math.max(0, told);
  }
}

const xLogX = (weight: number): number => (weight > 0 ? weight * Math.log(weight) : 0);
