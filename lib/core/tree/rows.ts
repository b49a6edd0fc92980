import type { Cause, Check, FindingLink, Strength } from "./schema";
import { STRENGTHS } from "./strength";

/** How often each finding of a check is seen, by finding key; adds up to 1. */
export type Row = ReadonlyMap<string, number>;

type Links = Cause["gives"][string];
type Findings = Pick<Check, "findings" | "reading">;

/** An unusual finding that a sound engine shows and nobody gave a figure for. */
export const UNUSUAL = 0.05;

/** A word of the scale as its probability; a number stands for itself. */
export const probabilityOf = (strength: Strength): number => (typeof strength === "number" ? strength : STRENGTHS[strength]);

/** "x20" is 20, "x1/3" a third; null for a strength. */
export function factorOf(link: FindingLink): number | null {
  if (typeof link !== "string" || !link.startsWith("x")) return null;
  const value = link.slice(1);
  return value.startsWith("1/") ? 1 / Number(value.slice(2)) : Number(value);
}

/**
 * What a sound engine shows: figures where they are given, 1 in 20 for each
 * other unusual finding, the rest for the usual one. Scaled to 1 where given
 * figures do not add up (soundness.ts reports them).
 */
export function soundRow(check: Findings): Row {
  const given = check.findings.reduce((sum, finding) => sum + (finding.sound ?? (finding.usual ? 0 : UNUSUAL)), 0);
  const rest = Math.max(0, 1 - given);
  return scaled(check.findings.map((finding) => [finding.key, finding.sound ?? (finding.usual ? rest : UNUSUAL)]));
}

/** Findings in the order of their bands, lowest first; null where the check has no reading. */
export const bandOrder = (check: Findings): string[] | null =>
  check.reading === undefined ? null : [...new Set(check.reading.bands.map((band) => band.finding))];

/** The findings a link's key means: itself, or a span of bands "low..high". Empty where the span is not one of this check's. */
export function findingsOfLink(check: Findings, key: string): string[] {
  const [from = key, to] = key.split("..");
  if (to === undefined) return [from];
  const order = bandOrder(check) ?? [];
  const [first, last] = [order.indexOf(from), order.indexOf(to)];
  return first < 0 || last < first ? [] : order.slice(first, last + 1);
}

/**
 * What an engine with this cause shows. A strength fixes its finding's share; a
 * factor multiplies the sound engine's odds; what is left is shared as a sound
 * engine would. In a reading an unusual band next to a linked one takes the
 * square root of its factor, for a gauge seldom stops at the line.
 */
export function causeRow(check: Findings, links: Links | undefined): Row {
  const sound = soundRow(check);
  if (links === undefined) return sound;
  const fixed = new Map<string, number>();
  const factors = new Map<string, number>();
  for (const [key, link] of Object.entries(links)) {
    const findings = findingsOfLink(check, key).filter((finding) => sound.has(finding));
    const factor = factorOf(link);
    const all = findings.reduce((sum, finding) => sum + (sound.get(finding) ?? 0), 0);
    for (const finding of findings) {
      if (factor !== null) factors.set(finding, factor);
      else fixed.set(finding, (probabilityOf(link as Strength) * (sound.get(finding) ?? 0)) / all);
    }
  }
  const weights = new Map(
    [...sound].map(([finding, share]) => [finding, share * (factors.get(finding) ?? besideFactor(check, finding, sound, fixed, factors))]),
  );
  const left = Math.max(0, 1 - sum(fixed.values()));
  const free = sum([...weights].filter(([finding]) => !fixed.has(finding)).map(([, weight]) => weight));
  return scaled([...weights].map(([finding, weight]) => [finding, fixed.get(finding) ?? (free === 0 ? 0 : (weight / free) * left)]));
}

/** The factor that an unlinked unusual band takes from its neighbours, the stronger of the two; 1 elsewhere. */
function besideFactor(check: Findings, finding: string, sound: Row, fixed: Row, factors: Row): number {
  const order = bandOrder(check);
  if (order === null || fixed.has(finding) || check.findings.find(({ key }) => key === finding)?.usual) return 1;
  const at = order.indexOf(finding);
  const neighbours = at < 0 ? [] : [order[at - 1], order[at + 1]];
  const taken = neighbours.map((key) => {
    if (key === undefined) return 1;
    const share = fixed.get(key);
    return Math.sqrt(factors.get(key) ?? (share === undefined ? 1 : odds(share) / odds(sound.get(key) ?? UNUSUAL)));
  });
  return taken.reduce((stronger, factor) => (Math.abs(Math.log(factor)) > Math.abs(Math.log(stronger)) ? factor : stronger), 1);
}

const odds = (share: number): number => share / (1 - share);
const sum = (values: Iterable<number>): number => [...values].reduce((all, value) => all + value, 0);

function scaled(entries: [string, number][]): Row {
  const all = sum(entries.map(([, share]) => share));
  return new Map(entries.map(([key, share]) => [key, all === 0 ? 1 / entries.length : share / all]));
}
