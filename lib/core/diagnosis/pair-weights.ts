import type { PairsModel } from "./model";
import type { PairTable } from "./pair-table";

/**
 * ln of the weights of all pairs while evidence comes in: each[a] + each[b] +
 * more[pair]. Exponentials are taken once, at the end.
 */
export class PairWeights {
  readonly causes: number;
  readonly #each: Float64Array;
  readonly #more: Float64Array;

  constructor(pairs: PairsModel) {
    this.causes = pairs.prior.each.length;
    this.#each = new Float64Array(this.causes);
    this.#more = new Float64Array(pairs.count);
    this.add(pairs.prior);
  }

  /** Takes in one piece of evidence. */
  add({ each, at, more }: PairTable): void {
    this.addEach(each);
    const into = this.#more;
    for (let place = 0; place < at.length; place++) into[at[place]!] = into[at[place]!]! + more[place]!;
  }

  /** Takes in evidence whose weight for a pair is the product of its weights for the two; numbers past the causes are not read. */
  addEach(logs: Float64Array): void {
    const into = this.#each;
    for (let a = 0; a < into.length; a++) into[a] = into[a]! + logs[a]!;
  }

  /**
   * The weights themselves, in the order of pairAt(), over e^`unit`.
   *
   * @param into room for one number a pair.
   * @returns their sum.
   */
  weights(unit: number, into: Float64Array): number {
    const count = this.causes;
    let most = -Infinity;
    for (let a = 0; a < count; a++) most = Math.max(most, this.#each[a]!);
    if (most === -Infinity) {
      into.fill(0);
      return 0;
    }
    const rise = new Float64Array(count);
    for (let a = 0; a < count; a++) rise[a] = Math.exp(this.#each[a]! - most);
    const scale = Math.exp(2 * most - unit);
    const more = this.#more;
    let at = 0;
    let sum = 0;
    for (let a = 0; a < count; a++) {
      const ofA = rise[a]! * scale;
      for (let b = a + 1; b < count; b++, at++) {
        const extra = more[at]!;
        const weight = extra === 0 ? ofA * rise[b]! : ofA * rise[b]! * Math.exp(extra);
        into[at] = weight;
        sum += weight;
      }
    }
    return sum;
  }
}
