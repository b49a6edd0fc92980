import type { Check } from "../tree/schema";
import type { FindingLink } from "../tree/finding-link";
import { STRENGTHS } from "../tree/strength";
import { scaledToOne } from "./sound-row";

/** No finding is impossible: one slip must never kill a cause for good. Rule [L6]. */
export const LEAST = 0.001;

/** A strength as a probability. */
export const probabilityOf = (strength: keyof typeof STRENGTHS | number): number =>
  typeof strength === "number" ? strength : STRENGTHS[strength];

/** "x20" as 20, "x1/3" as a third; null for a strength. */
export function factorOf(link: FindingLink): number | null {
  if (typeof link !== "string") return null;
  const parts = /^x(1\/)?([0-9.]+)$/.exec(link);
  if (!parts) return null;
  const number = Number(parts[2]);
  return parts[1] ? 1 / number : number;
}

/** Findings from low to high where the check is a reading, else as written. */
const inOrder = (check: Pick<Check, "findings" | "reading">): readonly string[] => [
  ...new Set([...(check.reading?.bands.map((band) => band.finding) ?? []), ...check.findings.map((finding) => finding.key)]),
];

function span(spec: string, order: readonly string[]): readonly string[] {
  const [from, to] = spec.split("..");
  if (to === undefined) return [spec];
  const [a, b] = [order.indexOf(from ?? ""), order.indexOf(to)];
  return a < 0 || b < 0 ? [] : order.slice(Math.min(a, b), Math.max(a, b) + 1);
}

/**
 * How often each finding of a check is seen when this cause is there: the sound
 * engine's row, shifted by the cause's links. Rules [L2]-[L6].
 *
 * @param links finding or span of bands -> a strength, or a factor on the sound engine's odds.
 * @param sound soundRow(check).
 * @returns shares in the order of the findings, each at least about 0.001, with a sum of 1.
 */
export function causeRow(
  check: Pick<Check, "findings" | "reading">,
  links: Readonly<Record<string, FindingLink>>,
  sound: Float64Array,
): Float64Array {
  const order = inOrder(check);
  const at = new Map(check.findings.map((finding, index) => [finding.key, index]));
  const soundOf = (key: string): number => sound[at.get(key) ?? -1] ?? 0;
  const weight = Float64Array.from(sound);
  const fixed = new Float64Array(sound.length);
  const linked = new Map<string, number>();
  let strengths = 0;
  for (const [spec, link] of Object.entries(links)) {
    const members = span(spec, order).filter((key) => at.has(key));
    const soundShare = members.reduce((sum, key) => sum + soundOf(key), 0);
    if (soundShare <= 0) continue;
    const factor = factorOf(link);
    const share = factor === null ? probabilityOf(link as Parameters<typeof probabilityOf>[0]) : 0;
    for (const key of members) {
      const index = at.get(key) ?? 0;
      linked.set(key, factor ?? share / (1 - share) / (soundShare / Math.max(1 - soundShare, LEAST)));
      if (factor === null) {
        fixed[index] = (share * soundOf(key)) / soundShare;
        weight[index] = 0;
      } else weight[index] = soundOf(key) * factor;
    }
    strengths += share;
  }
  if (check.reading) spillToNeighbours(check, order, at, linked, weight);
  return withLeast(shared(fixed, strengths, weight));
}

/** In a reading, an unusual band beside a linked one gets the square root of its factor; the stronger of two. Rule [L5]. */
function spillToNeighbours(
  check: Pick<Check, "findings">,
  order: readonly string[],
  at: ReadonlyMap<string, number>,
  linked: ReadonlyMap<string, number>,
  weight: Float64Array,
): void {
  order.forEach((key, place) => {
    const index = at.get(key);
    if (index === undefined || linked.has(key) || check.findings[index]?.usual === true) return;
    const factors = [order[place - 1], order[place + 1]].map((beside) => (beside === undefined ? 1 : (linked.get(beside) ?? 1)));
    const strongest = factors.reduce((a, b) => (Math.abs(Math.log(b)) > Math.abs(Math.log(a)) ? b : a), 1);
    weight[index] = (weight[index] ?? 0) * Math.sqrt(strongest);
  });
}

/** Findings named by a strength have it; the rest is shared by weight. Rules [L3], [L4]. */
function shared(fixed: Float64Array, strengths: number, weight: Float64Array): Float64Array {
  const total = weight.reduce((sum, one) => sum + one, 0);
  const rest = Math.max(0, 1 - strengths);
  return scaledToOne(fixed.map((share, index) => share + (total > 0 ? (rest * (weight[index] ?? 0)) / total : 0)));
}

function withLeast(row: Float64Array): Float64Array {
  return row.some((share) => share < LEAST) ? scaledToOne(row.map((share) => Math.max(share, LEAST))) : row;
}
