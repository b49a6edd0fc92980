import { callingMinutes } from "@/lib/core/diagnosis/calling-minutes";
import type { Model } from "@/lib/core/diagnosis/model";

/**
 * The least expected minutes to a cured engine, exactly: dynamic programming
 * over what has been answered and which remedies have failed, for small models
 * whose steps cost the same whatever was done before. Bellman's equation with
 * single faults: call; or ask; or try, where a cure ends it.
 */
export function leastMinutes(model: Model): number {
  return new Oracle(model).value(0, 0, 0);
}

class Oracle {
  readonly #model: Model;
  readonly #size: number;
  /** States by number: an answer a check (0: not asked), and a bit a remedy. */
  readonly #memo: Float64Array;
  readonly #answers: readonly number[];
  readonly #strides: readonly number[];
  /** What each hypothesis would cost, were it known from the start: nothing costs less. */
  readonly #known: Float64Array;
  /** Weights a depth, one after the other; and a place to try out what would follow. */
  readonly #weights: Float64Array;
  readonly #then: Float64Array;

  constructor(model: Model) {
    this.#model = model;
    this.#size = model.logPrior.length;
    this.#answers = model.checks.map(({ rows }) => rows.length + 1);
    this.#strides = this.#answers.map((_, at) => this.#answers.slice(0, at).reduce((product, one) => product * one, 1));
    this.#memo = new Float64Array(this.#answers.reduce((product, one) => product * one, 1) << model.remedies.length).fill(-1);
    this.#known = minutesIfKnown(model);
    this.#weights = new Float64Array((model.checks.length + model.remedies.length + 1) * this.#size);
    this.#weights.set(model.logPrior.map(Math.exp));
    this.#then = new Float64Array(this.#size);
  }

  /** Expected minutes from the weights that lie at `depth`. */
  value(depth: number, answered: number, tried: number): number {
    const { checks, remedies } = this.#model;
    const state = (answered << remedies.length) + tried;
    if (this.#memo[state]! >= 0) return this.#memo[state]!;
    const size = this.#size;
    const weights = this.#weights.subarray(depth * size, (depth + 1) * size);
    let total = 0;
    for (let index = 0; index < size; index++) total += weights[index]!;
    let best = this.#calling(weights, total);
    for (let at = 0; at < remedies.length; at++) {
      const { minutes, cure } = remedies[at]!;
      if (tried & (1 << at) || minutes + this.#leastAfter(weights, cure, true) / total >= best) continue;
      const left = this.#follow(depth, cure, true);
      best = Math.min(best, minutes + (left > 0 ? (left / total) * this.value(depth + 1, answered, tried | (1 << at)) : 0));
    }
    for (let at = 0; at < checks.length; at++) {
      const { minutes, rows } = checks[at]!;
      if (Math.floor(answered / this.#strides[at]!) % this.#answers[at]! > 0) continue;
      let least = minutes;
      for (const row of rows) least += this.#leastAfter(weights, row, false) / total;
      // What costs too much even if the answer told everything is left; so is what has become too dear on the way.
      for (let finding = 0; finding < rows.length && least < best; finding++) {
        const row = rows[finding]!;
        least -= this.#leastAfter(weights, row, false) / total;
        const chance = this.#follow(depth, row, false);
        if (chance > 0) least += (chance / total) * this.value(depth + 1, answered + (finding + 1) * this.#strides[at]!, tried);
      }
      best = Math.min(best, least);
    }
    return (this.#memo[state] = best);
  }

  #calling(weights: Float64Array, total: number): number {
    for (let index = 0; index < this.#size; index++) this.#then[index] = weights[index]! / total;
    return callingMinutes(this.#model, this.#then);
  }

  /** What follows cannot cost less: weights times the row, or what the row leaves, each at what it would cost if known. */
  #leastAfter(weights: Float64Array, row: Float64Array, fails: boolean): number {
    let sum = 0;
    for (let index = 0; index < this.#size; index++) sum += weights[index]! * (fails ? 1 - row[index]! : row[index]!) * this.#known[index]!;
    return sum;
  }

  /** Puts the weights that follow one deeper; returns their sum. */
  #follow(depth: number, row: Float64Array, fails: boolean): number {
    const from = depth * this.#size;
    const to = from + this.#size;
    let sum = 0;
    for (let index = 0; index < this.#size; index++)
      sum += this.#weights[to + index] = this.#weights[from + index]! * (fails ? 1 - row[index]! : row[index]!);
    return sum;
  }
}

/** Its remedies by minutes per chance, or a call where that is cheaper. */
function minutesIfKnown(model: Model): Float64Array {
  return model.helpersMinutes.map((mending, index) =>
    model.remedies
      .filter(({ cure }) => cure[index]! > 0)
      .sort((a, b) => b.minutes / b.cure[index]! - a.minutes / a.cure[index]!)
      .reduce((left, { minutes, cure }) => Math.min(left, minutes + (1 - cure[index]!) * left), model.callMinutes + mending),
  );
}
