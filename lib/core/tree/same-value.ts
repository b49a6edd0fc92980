type Plain = Readonly<Record<string, unknown>>;

/** A map, as documents have them: no list, no null. */
export const isMap = (value: unknown): value is Plain => typeof value === "object" && value !== null && !Array.isArray(value);

/** Two values of a document say the same; the order of fields in a map and fields that are undefined make no difference. */
export function sameValue(a: unknown, b: unknown): boolean {
  if (a === b) return true;
  if (Array.isArray(a)) return Array.isArray(b) && a.length === b.length && a.every((item, index) => sameValue(item, b[index]));
  if (!isMap(a) || !isMap(b)) return false;
  return [...new Set([...Object.keys(a), ...Object.keys(b)])].every((field) => sameValue(a[field], b[field]));
}
