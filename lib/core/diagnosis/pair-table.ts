import { pairAt } from "./pairs";

/**
 * ln of what one piece of evidence weighs for every pair of causes, without a
 * number a pair: each[a] + each[b], and a correction where both members have
 * something to say. Most causes have no link to a given check, symptom or
 * remedy and are alike there, so that corrections are few.
 */
export type PairTable = {
  readonly each: Float64Array;
  /** Places of pairs, by pairAt(), and what has to be added there. */
  readonly at: Int32Array;
  readonly more: Float64Array;
};

/**
 * @param plain the causes that are alike here; one number a cause, not 0: alike.
 * @param log ln of the weight for a pair, the same whichever is named first; finite for a plain pair.
 */
export function pairTable(plain: ArrayLike<number>, log: (a: number, b: number) => number): PairTable {
  const count = plain.length;
  let like = 0;
  while (like < count && plain[like] === 0) like++;
  const half = like < count ? log(like, like) / 2 : 0;
  const each = new Float64Array(count);
  const special: number[] = [];
  for (let a = 0; a < count; a++) {
    if (plain[a] !== 0) each[a] = half;
    else {
      each[a] = like < count ? log(a, like) - half : 0;
      special.push(a);
    }
  }
  const at = new Int32Array((special.length * (special.length - 1)) / 2);
  const more = new Float64Array(at.length);
  let place = 0;
  for (let i = 0; i < special.length; i++)
    for (let j = i + 1; j < special.length; j++, place++) {
      const [a, b] = [special[i]!, special[j]!];
      at[place] = pairAt(a, b, count);
      more[place] = log(a, b) - each[a]! - each[b]!;
    }
  return { each, at, more };
}

/** Marks the causes that share the commonest of these values. */
export function alike(values: ArrayLike<number>, count: number): Uint8Array {
  const times = new Map<number, number>();
  for (let index = 0; index < count; index++) times.set(values[index]!, (times.get(values[index]!) ?? 0) + 1);
  const [commonest] = [...times].sort((a, b) => b[1] - a[1] || a[0] - b[0])[0] ?? [NaN];
  return Uint8Array.from({ length: count }, (_, index) => (values[index] === commonest ? 1 : 0));
}
