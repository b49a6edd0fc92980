/** Seeded rolls for tests and benches: the same seed gives the same rolls on every machine. */
export type Dice = {
  /** From 0 up to 1. */
  readonly roll: () => number;
  readonly between: (least: number, most: number) => number;
  /** Standard normal, by Box and Muller. */
  readonly normal: () => number;
  readonly logNormal: (median: number, sd: number) => number;
  /** A whole number from 0 to under `count`. */
  readonly below: (count: number) => number;
};

/** Mulberry32: small, and good enough to draw faults with. */
export function dice(seed: number): Dice {
  let state = seed | 0;
  const roll = (): number => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const normal = (): number => Math.sqrt(-2 * Math.log(1 - roll())) * Math.cos(2 * Math.PI * roll());
  return {
    roll,
    normal,
    between: (least, most) => least + (most - least) * roll(),
    logNormal: (median, sd) => median * Math.exp(sd * normal()),
    below: (count) => Math.floor(roll() * count),
  };
}

/** A seed for each place of a list, unlike its neighbours'. */
export const seedAt = (seed: number, place: number): number => Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) + Math.imul(place + 1, 0xc2b2ae35);

/** The place in `weights` that a roll from 0 to 1 falls on. */
export function placeOf(weights: ArrayLike<number>, roll: number): number {
  let total = 0;
  for (let place = 0; place < weights.length; place++) total += weights[place]!;
  let left = roll * total;
  for (let place = 0; place < weights.length; place++) if ((left -= weights[place]!) < 0) return place;
  return Math.max(0, weights.length - 1);
}
