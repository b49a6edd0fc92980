import { TELLS_NOTHING } from "./candidates";
import type { ExpectedCost } from "./expected-cost";
import type { PlanChecks } from "./plan-checks";

/** What the plan can do next, by place among the candidates or among the options. */
export type Act = { readonly kind: "check" | "remedy"; readonly place: number };

/** Within the plan a remedy less likely than this is left to the order of cure chance per minute. */
const WORTH_A_BRANCH = 0.15;
/** A belief come to less often than this is not followed. */
const HARDLY_EVER = 1e-4;
/** Ways that are followed from one belief: a check, and a remedy. */
const WAYS = 2;

/**
 * Thinks ahead on a tree of beliefs. Each belief has its most telling check for
 * the minutes and its likeliest cheap remedy for branches; where the tree ends,
 * remedies are tried in their order and help is called. Folded back, stopping
 * wherever that is cheaper, the value is what a real way of going on costs, so
 * it can be trusted against "call now". Beliefs likely to be met are followed
 * first. Rules [N3], [N5].
 *
 * Beliefs lie one after the other in arrays that are made once; each has its
 * children behind it, so folding back is one walk from the end.
 */
export class PlanAhead {
  readonly #cost: ExpectedCost;
  readonly #checks: PlanChecks;
  readonly #size: number;
  /** So many beliefs are there. */
  #count = 0;
  readonly #weights: Float64Array;
  /** Chance to come here, if what the plan begins with is done; and from the belief before. */
  readonly #reach: Float64Array;
  readonly #chance: Float64Array;
  /** What stopping to ask costs here, and the remedy that is then tried first. */
  readonly #trying: Float64Array;
  readonly #first: Int32Array;
  readonly #before: Int32Array;
  /** What led here: a check's place, or a remedy's counted down from -1. */
  readonly #by: Int32Array;
  readonly #followed: Uint8Array;
  /** For each belief and way: what it costs, and its children. */
  readonly #minutes: Float64Array;
  readonly #from: Int32Array;
  readonly #to: Int32Array;
  readonly #worth: Float64Array;
  readonly #seen: Uint8Array;
  readonly #tried: Uint8Array;

  /**
   * @param weights of the hypotheses reckoned with; they sum to 1.
   * @param beliefs the most that will be followed for one act.
   */
  constructor(checks: PlanChecks, cost: ExpectedCost, weights: Float64Array, beliefs: number) {
    this.#cost = cost;
    this.#checks = checks;
    this.#size = weights.length;
    const children = checks.mostRows + WAYS;
    const room = 1 + (1 + children + beliefs) * children;
    this.#weights = new Float64Array(room * weights.length);
    this.#weights.set(weights);
    this.#reach = new Float64Array(room);
    this.#chance = new Float64Array(room);
    this.#trying = new Float64Array(room);
    this.#worth = new Float64Array(room);
    this.#first = new Int32Array(room);
    this.#before = new Int32Array(room);
    this.#by = new Int32Array(room);
    this.#followed = new Uint8Array(room);
    this.#minutes = new Float64Array(room * WAYS);
    this.#from = new Int32Array(room * WAYS);
    this.#to = new Int32Array(room * WAYS);
    this.#seen = new Uint8Array(checks.count);
    this.#tried = new Uint8Array(cost.options.length);
    this.#reach[0] = 1;
    this.#before[0] = -1;
  }

  /**
   * Expected minutes if `act` is done next and `beliefs` beliefs are followed after it.
   *
   * @param second what is then done first, instead of what the plan would do.
   */
  worthOf(act: Act, beliefs: number, second?: Act): number {
    this.#count = 1;
    this.#begin(0);
    this.#follow(0, 0, act);
    const ends = this.#count;
    if (second)
      for (let node = 1; node < ends; node++) {
        this.#begin(node);
        this.#follow(node, 0, second);
      }
    for (let done = 0; done < beliefs; done++) {
      const node = this.#likeliestEnd();
      if (node < 0 || this.#reach[node]! < HARDLY_EVER) break;
      this.#begin(node);
      const check = this.#mostTelling(node);
      if (check >= 0) this.#ask(node, 0, check);
      const first = this.#first[node]!;
      if (first >= 0 && this.#cost.chanceOf(first, this.#weights, node * this.#size) > WORTH_A_BRANCH) this.#try(node, 1, first);
    }
    return this.#folded();
  }

  /** What has been asked and tried on the way to a belief that is about to be followed. */
  #begin(node: number): void {
    this.#followed[node] = 1;
    for (let way = 0; way < WAYS; way++) this.#from[node * WAYS + way] = this.#to[node * WAYS + way] = 0;
    this.#seen.fill(0);
    this.#tried.fill(0);
    for (let at = node; this.#before[at]! >= 0; at = this.#before[at]!) {
      const by = this.#by[at]!;
      if (by >= 0) this.#checks.mark(by, this.#seen);
      else this.#tried[-1 - by] = 1;
    }
  }

  #follow(node: number, way: number, act: Act): void {
    if (act.kind === "check") this.#ask(node, way, act.place);
    else this.#try(node, way, act.place);
  }

  #likeliestEnd(): number {
    let best = -1;
    let most = -1;
    for (let node = 1; node < this.#count; node++) {
      if (this.#followed[node] === 1 || this.#reach[node]! <= most) continue;
      most = this.#reach[node]!;
      best = node;
    }
    return best;
  }

  #mostTelling(node: number): number {
    const checks = this.#checks;
    checks.tell(this.#weights, node * this.#size, this.#seen);
    let best = -1;
    let most = 0;
    for (let place = 0; place < checks.count; place++) {
      if (this.#seen[place] === 1) continue;
      const information = checks.told[place]!;
      if (information < TELLS_NOTHING || information <= most * checks.minutes[place]!) continue;
      most = information / checks.minutes[place]!;
      best = place;
    }
    return best;
  }

  #ask(node: number, way: number, place: number): void {
    const size = this.#size;
    const weights = this.#weights;
    const { predict, weigh, rowFrom, learns, minutes } = this.#checks;
    const at = node * size;
    this.#minutes[node * WAYS + way] = minutes[place]!;
    this.#from[node * WAYS + way] = this.#count;
    for (let row = rowFrom[place]!; row < rowFrom[place + 1]!; row++) {
      const to = this.#count * size;
      let chance = 0;
      for (let index = 0; index < size; index++) {
        const weight = weights[at + index]!;
        chance += weight * predict[row * size + index]!;
        weights[to + index] = weight * weigh[row * size + index]!;
      }
      this.#come(node, place, chance * learns[place]!);
    }
    if (learns[place]! < 1) {
      weights.copyWithin(this.#count * size, at, at + size);
      this.#come(node, place, 1 - learns[place]!);
    }
    this.#to[node * WAYS + way] = this.#count;
  }

  #try(node: number, way: number, option: number): void {
    const size = this.#size;
    const { minutes, held } = this.#cost.options[option]!;
    const cured = this.#cost.chanceOf(option, this.#weights, node * size);
    this.#minutes[node * WAYS + way] = minutes + held * cured;
    this.#from[node * WAYS + way] = this.#count;
    this.#weights.copyWithin(this.#count * size, node * size, (node + 1) * size);
    this.#cost.fail(option, this.#weights, this.#count * size);
    this.#tried[option] = 1;
    this.#come(node, -1 - option, 1 - cured);
    this.#to[node * WAYS + way] = this.#count;
  }

  /** The next belief, whose weights lie there already: made to sum to 1, and what stopping there costs. */
  #come(before: number, by: number, chance: number): void {
    const node = this.#count++;
    const weights = this.#weights;
    const at = node * this.#size;
    let total = 0;
    for (let index = at; index < at + this.#size; index++) total += weights[index]!;
    if (total > 0) for (let index = at; index < at + this.#size; index++) weights[index] = weights[index]! / total;
    this.#before[node] = before;
    this.#by[node] = by;
    this.#chance[node] = chance;
    this.#reach[node] = this.#reach[before]! * chance;
    this.#followed[node] = 0;
    for (let way = 0; way < WAYS; way++) this.#from[node * WAYS + way] = this.#to[node * WAYS + way] = 0;
    this.#cost.reckon(weights, at, this.#tried);
    this.#trying[node] = this.#cost.minutes;
    this.#first[node] = this.#cost.first;
  }

  #folded(): number {
    const worth = this.#worth;
    for (let node = this.#count - 1; node > 0; node--) {
      worth[node] = this.#trying[node]!;
      for (let way = 0; way < WAYS; way++)
        if (this.#to[node * WAYS + way]! > this.#from[node * WAYS + way]!) worth[node] = Math.min(worth[node]!, this.#wayOf(node, way));
    }
    return this.#wayOf(0, 0);
  }

  #wayOf(node: number, way: number): number {
    let sum = this.#minutes[node * WAYS + way]!;
    for (let child = this.#from[node * WAYS + way]!; child < this.#to[node * WAYS + way]!; child++)
      sum += this.#chance[child]! * this.#worth[child]!;
    return sum;
  }
}
