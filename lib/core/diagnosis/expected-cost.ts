import { COSTS } from "./costs";
import type { Gates } from "./gates";
import { standingMinutes } from "./costs";
import type { Standing } from "./evidence";
import type { Model, RemedyModel } from "./model";

/** Below this share of the whole a remedy is not worth a place in the order. */
const NEGLIGIBLE = 1e-6;

type Option = { readonly at: number; readonly remedy: RemedyModel; readonly minutes: number; readonly pass: number; readonly held: number };

/** What is best to do when no more is asked: a remedy (its index in the model), or null to call. */
export type BestTry = { readonly minutes: number; readonly remedy: number | null };

/**
 * The expected cost to a cured engine when remedies are tried in the order of
 * cure chance per minute, and help is called where that is cheaper: the
 * estimate of what remains after a check. One pass, exact for that order, with
 * overlapping and imperfect remedies (expected cost of repair after Heckerman,
 * Breese and Rommelse 1995; the call as in Lin 2015). Rules [N3], [N4].
 *
 * Holds scratch space, since it is called once an outcome of each candidate.
 */
export class ExpectedCost {
  readonly #options: readonly Option[];
  readonly #call: number;
  readonly #scratch: Float64Array;
  readonly #chance: Float64Array;
  readonly #score: Float64Array;
  readonly #order: Int32Array;
  readonly #left: Float64Array;
  readonly #unknownAt: number;

  constructor(model: Model, gates: Gates, standing: Standing) {
    this.#options = optionsOf(model, gates, standing);
    this.#call = model.callMinutes;
    this.#unknownAt = model.unknownAt;
    this.#scratch = new Float64Array(model.logPrior.length);
    const count = this.#options.length;
    this.#chance = new Float64Array(count);
    this.#score = new Float64Array(count);
    this.#order = Int32Array.from({ length: count }, (_, index) => index);
    this.#left = new Float64Array(count + 1);
  }

  /** Expected minutes under weights that need not sum to 1, and the first thing to do. */
  from(weights: Float64Array): BestTry {
    let total = 0;
    for (let index = 0; index < weights.length; index++) total += weights[index]!;
    if (total <= 0) return { minutes: this.#call, remedy: null };
    const count = this.#rank(weights, total);
    this.#scratch.set(weights);
    let left = total;
    for (let place = 0; place < count; place++) {
      this.#left[place] = left;
      const { remedy, pass } = this.#options[this.#order[place]!]!;
      for (let link = 0; link < remedy.linkedAt.length; link++) {
        const at = remedy.linkedAt[link]!;
        const cured = this.#scratch[at]! * remedy.linkedCure[link]! * pass;
        this.#scratch[at] = this.#scratch[at]! - cured;
        left -= cured;
      }
    }
    let remaining = this.#call * left;
    let tries = false;
    for (let place = count - 1; place >= 0; place--) {
      const option = this.#options[this.#order[place]!]!;
      const before = this.#left[place]!;
      const after = place + 1 < count ? this.#left[place + 1]! : left;
      const going = option.minutes * before + option.held * (before - after) + remaining;
      const calling = this.#call * before;
      tries = going < calling;
      remaining = Math.min(going, calling);
    }
    return { minutes: remaining / total, remedy: count > 0 && tries ? this.#options[this.#order[0]!]!.at : null };
  }

  /** Cost to a cured engine for each hypothesis, if someone told which it is: no plan can do better. */
  known(): Float64Array {
    const offers: { ratio: number; minutes: number; cure: number }[][] = Array.from(this.#scratch, () => []);
    for (const { remedy, minutes, pass, held } of this.#options)
      remedy.linkedAt.forEach((at, link) => {
        const cure = (remedy.linkedCure[link] ?? 0) * pass;
        offers[at]?.push({ ratio: minutes / cure, minutes: minutes + held * cure, cure });
      });
    return Float64Array.from(offers, (ways, at) =>
      at === this.#unknownAt
        ? this.#call
        : ways.sort((a, b) => b.ratio - a.ratio).reduce((rest, way) => Math.min(rest, way.minutes + (1 - way.cure) * rest), this.#call),
    );
  }

  /** Puts the options worth trying first, best cure chance per minute first; ties by place, which is by key. Returns how many. */
  #rank(weights: Float64Array, total: number): number {
    const order = this.#order;
    let count = 0;
    for (let option = 0; option < this.#options.length; option++) {
      const { remedy, minutes, pass, held } = this.#options[option]!;
      let chance = 0;
      for (let link = 0; link < remedy.linkedAt.length; link++) chance += weights[remedy.linkedAt[link]!]! * remedy.linkedCure[link]!;
      chance *= pass;
      if (chance < NEGLIGIBLE * total) continue;
      this.#chance[option] = chance;
      const score = chance / (minutes + (held * chance) / total);
      this.#score[option] = score;
      let place = count++;
      while (place > 0 && this.#score[order[place - 1]!]! < score) {
        order[place] = order[place - 1]!;
        place--;
      }
      order[place] = option;
    }
    return count;
  }
}

function optionsOf(model: Model, gates: Gates, standing: Standing): readonly Option[] {
  const options: Option[] = [];
  model.remedies.forEach((remedy, at) => {
    if (gates.isDone({ kind: "remedy", key: remedy.key }) || !gates.isFeasible(remedy) || remedy.linkedAt.length === 0) return;
    const gate = gates.gateOf(remedy);
    if (!gate.open && gate.shut) return;
    const minutes = remedy.minutes + standingMinutes(remedy.remedy, standing) + (gate.open ? 0 : gate.minutes);
    const held = remedy.remedy.temporary ? COSTS.heldOnly[model.setting.situation] : 0;
    options.push({ at, remedy, minutes, pass: remedy.share * (gate.open ? 1 : gate.pass), held });
  });
  return options.sort((a, b) => (a.remedy.key < b.remedy.key ? -1 : 1));
}
