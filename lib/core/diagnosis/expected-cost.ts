import { COSTS, standingMinutes } from "./costs";
import type { Standing } from "./evidence";
import type { Gates } from "./gates";
import type { Model, RemedyModel } from "./model";

/** Below this share of the whole a remedy is not worth a place in the order. */
const NEGLIGIBLE = 1e-3;

/** A remedy as it could be tried now, over the hypotheses that are reckoned with. */
export type Option = {
  /** The remedy's index in the model. */
  readonly at: number;
  /** With its try-out and what has to be done before it. */
  readonly minutes: number;
  /** Minutes still owed where it works. */
  readonly held: number;
  /** Places of the hypotheses that it has a link to, and the chance that it cures each. */
  readonly linkedAt: Int32Array;
  readonly cure: Float64Array;
};

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
 * Holds scratch space, since it is called once for each belief that is thought of.
 */
export class ExpectedCost {
  readonly options: readonly Option[];
  /** What a call costs in the end, for each hypothesis. */
  readonly #call: Float64Array;
  readonly #scratch: Float64Array;
  readonly #chance: Float64Array;
  readonly #score: Float64Array;
  readonly #order: Int32Array;
  readonly #left: Float64Array;
  readonly #calls: Float64Array;

  /** @param kept the hypotheses reckoned with, by their index in the model; weights are given in this order. */
  constructor(model: Model, gates: Gates, standing: Standing, kept: readonly number[]) {
    this.options = optionsOf(model, gates, standing, kept);
    this.#call = Float64Array.from(kept, (index) => model.callMinutes + (model.helpersMinutes[index] ?? 0));
    this.#scratch = new Float64Array(kept.length);
    const count = this.options.length;
    this.#chance = new Float64Array(count);
    this.#score = new Float64Array(count);
    this.#order = Int32Array.from({ length: count }, (_, index) => index);
    this.#left = new Float64Array(count + 1);
    this.#calls = new Float64Array(count + 1);
  }

  /**
   * Expected minutes under weights that need not sum to 1, and the first thing to do.
   *
   * @param tried places of options that are used up.
   */
  from(weights: Float64Array, tried: readonly number[] = []): BestTry {
    let total = 0;
    let calls = 0;
    let logs = 0;
    for (let index = 0; index < weights.length; index++) {
      const weight = weights[index]!;
      total += weight;
      calls += weight * this.#call[index]!;
      logs += xLogX(weight);
    }
    if (total <= 0) return { minutes: 0, option: null, first: null };
    const count = this.#rank(weights, total, tried);
    this.#scratch.set(weights);
    let left = total;
    for (let place = 0; place < count; place++) {
      this.#left[place] = left;
      this.#calls[place] = calls + finding(left, logs);
      const { linkedAt, cure } = this.options[this.#order[place]!]!;
      for (let link = 0; link < linkedAt.length; link++) {
        const at = linkedAt[link]!;
        const before = this.#scratch[at]!;
        const after = before * (1 - cure[link]!);
        this.#scratch[at] = after;
        left -= before - after;
        calls -= (before - after) * this.#call[at]!;
        logs += xLogX(after) - xLogX(before);
      }
    }
    let remaining = calls + finding(left, logs);
    let tries = false;
    for (let place = count - 1; place >= 0; place--) {
      const option = this.options[this.#order[place]!]!;
      const before = this.#left[place]!;
      const after = place + 1 < count ? this.#left[place + 1]! : left;
      const going = option.minutes * before + option.held * (before - after) + remaining;
      const calling = this.#calls[place]!;
      tries = going < calling;
      remaining = Math.min(going, calling);
    }
    const first = count > 0 ? this.#order[0]! : null;
    return { minutes: remaining / total, option: tries ? first : null, first };
  }

  /** The chance that an option cures, under weights that sum to 1. */
  chanceOf(option: number, weights: Float64Array): number {
    const { linkedAt, cure } = this.options[option]!;
    let chance = 0;
    for (let link = 0; link < linkedAt.length; link++) chance += weights[linkedAt[link]!]! * cure[link]!;
    return chance;
  }

  /** Puts the options worth trying first, best cure chance per minute first; ties by place, which is by key. Returns how many. */
  #rank(weights: Float64Array, total: number, tried: readonly number[]): number {
    const order = this.#order;
    let count = 0;
    for (let option = 0; option < this.options.length; option++) {
      const { minutes, held, linkedAt, cure } = this.options[option]!;
      let chance = 0;
      for (let link = 0; link < linkedAt.length; link++) chance += weights[linkedAt[link]!]! * cure[link]!;
      if (chance < NEGLIGIBLE * total || tried.includes(option)) continue;
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

const xLogX = (weight: number): number => (weight > 0 ? weight * Math.log(weight) : 0);

/** What it costs whoever comes to find the cause: so much for each nat that weights with this sum, and this sum of w ln w, leave open. */
const finding = (total: number, logs: number): number => (total > 0 ? COSTS.helperFinds * Math.max(0, total * Math.log(total) - logs) : 0);

function optionsOf(model: Model, gates: Gates, standing: Standing, kept: readonly number[]): readonly Option[] {
  const placeOf = new Map(kept.map((index, place) => [index, place]));
  const optionOf = (remedy: RemedyModel, at: number): readonly Option[] => {
    if (gates.isDone({ kind: "remedy", key: remedy.key }) || !gates.isFeasible(remedy)) return [];
    if (standing.mayNotStart && remedy.remedy.tryOut.minutes > 0) return [];
    const gate = gates.gateOf(remedy);
    if (!gate.open && gate.shut) return [];
    const links = [...remedy.linkedAt].flatMap((index, link) => {
      const place = placeOf.get(index);
      return place === undefined ? [] : [{ place, cure: (remedy.linkedCure[link] ?? 0) * remedy.share * (gate.open ? 1 : gate.pass) }];
    });
    if (links.length === 0) return [];
    return [
      {
        at,
        minutes: remedy.minutes + standingMinutes(remedy.remedy, standing) + (gate.open ? 0 : gate.minutes),
        held: remedy.remedy.temporary ? COSTS.heldOnly[model.setting.situation] : 0,
        linkedAt: Int32Array.from(links, ({ place }) => place),
        cure: Float64Array.from(links, ({ cure }) => cure),
      },
    ];
  };
  const keyOf = (option: Option): string => model.remedies[option.at]?.key ?? "";
  return model.remedies.flatMap(optionOf).sort((a, b) => (keyOf(a) < keyOf(b) ? -1 : 1));
}
