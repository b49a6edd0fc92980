import { isMap, sameValue } from "./same-value";

/** A field that two people changed, each to something else. */
export type Clash = { path: readonly string[]; base: unknown; mine: unknown; theirs: unknown };

type Keyed = { key: string };

/**
 * Joins two changes of one value. Maps are joined field by field, lists of
 * things with keys thing by thing; any other list or value is one whole. Where
 * both changed the same whole differently, theirs stays in the result and the
 * clash is reported: nobody's words are mixed, and none are lost.
 *
 * `undefined` is "not there", for all three.
 */
export function mergeValues(
  base: unknown,
  mine: unknown,
  theirs: unknown,
  path: readonly string[] = [],
): { value: unknown; clashes: Clash[] } {
  if (sameValue(mine, theirs) || sameValue(base, mine)) return { value: theirs, clashes: [] };
  if (sameValue(base, theirs)) return { value: mine, clashes: [] };
  if (isMap(mine) && isMap(theirs)) return mergeMaps(isMap(base) ? base : {}, mine, theirs, path);
  if (isKeyed(mine) && isKeyed(theirs)) return mergeLists(isKeyed(base) ? base : [], mine, theirs, path);
  return { value: theirs, clashes: [{ path, base, mine, theirs }] };
}

function mergeMaps(
  base: Readonly<Record<string, unknown>>,
  mine: Readonly<Record<string, unknown>>,
  theirs: Readonly<Record<string, unknown>>,
  path: readonly string[],
): { value: unknown; clashes: Clash[] } {
  const fields = [...new Set([...Object.keys(theirs), ...Object.keys(mine)])];
  const merged = fields.map((field) => [field, mergeValues(base[field], mine[field], theirs[field], [...path, field])] as const);
  return {
    value: Object.fromEntries(merged.filter(([, { value }]) => value !== undefined).map(([field, { value }]) => [field, value])),
    clashes: merged.flatMap(([, { clashes }]) => clashes),
  };
}

const isKeyed = (value: unknown): value is readonly Keyed[] =>
  Array.isArray(value) && value.every((item) => isMap(item) && typeof item.key === "string");

/** Theirs is the order; what only I added stands behind the neighbour it was put behind. */
function mergeLists(base: readonly Keyed[], mine: readonly Keyed[], theirs: readonly Keyed[], path: readonly string[]) {
  const [old, ours, others] = [base, mine, theirs].map((list) => new Map(list.map((item) => [item.key, item])));
  const clashes: Clash[] = [];
  const merged = new Map<string, unknown>();
  for (const key of mergedOrder(base, mine, theirs)) {
    const one = mergeValues(old?.get(key), ours?.get(key), others?.get(key), [...path, key]);
    clashes.push(...one.clashes);
    if (one.value !== undefined) merged.set(key, one.value);
  }
  return { value: [...merged.values()], clashes };
}

/** Every key of the three lists once, in the order of the side that moved things (theirs if both did). */
function mergedOrder(base: readonly Keyed[], mine: readonly Keyed[], theirs: readonly Keyed[]): string[] {
  const keys = (list: readonly Keyed[]): string[] => list.map(({ key }) => key);
  const shared = new Set(keys(base).filter((key) => keys(mine).includes(key) && keys(theirs).includes(key)));
  const inShared = (list: readonly Keyed[]): string =>
    keys(list)
      .filter((key) => shared.has(key))
      .join(" ");
  const theirsMoved = inShared(theirs) !== inShared(base);
  const [lead, other] = theirsMoved ? [theirs, mine] : [mine, theirs];
  const order = keys(lead);
  const known = new Set(order);
  keys(other).forEach((key, index, all) => {
    if (known.has(key)) return;
    const behind = all.slice(0, index).findLast((before) => known.has(before));
    order.splice(behind === undefined ? 0 : order.indexOf(behind) + 1, 0, key);
    known.add(key);
  });
  return order;
}
