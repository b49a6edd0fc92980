import type { FindingLink, Strength } from "@/lib/core/tree/finding-link";
import { causeRow, factorOf } from "@/lib/core/diagnosis/cause-row";
import { soundRow } from "@/lib/core/diagnosis/sound-row";
import type { Cause, Check, Who } from "@/lib/core/tree/schema";
import { STRENGTHS } from "@/lib/core/tree/strength";

/** A strength as a mechanic reads it: the word, a count of 100, or times a sound engine's odds. */
export function linkInWords(link: FindingLink | Strength): string {
  if (typeof link === "number") {
    const word = Object.entries(STRENGTHS).find(([, share]) => share === link)?.[0];
    return word ?? `${Math.round(link * 100)} of 100`;
  }
  if (!/^x\d/.test(link)) return link;
  return `${link.slice(1)} times the odds of a sound engine`;
}

/**
 * How much a finding tells, in the one figure that stands wherever it is spoken of: how many times as often it is seen
 * with the cause as in a sound engine; with the tree's own word before it. `spec`: a finding, or a span of bands.
 */
export function findingInWords(check: Check | undefined, links: Cause["gives"][string], spec: string): string {
  const link = links[spec];
  if (link === undefined) return "";
  if (!check) return linkInWords(link);
  const sound = soundRow(check);
  const row = causeRow(check, links, sound);
  const [from = "", to = from] = spec.split("..");
  const at = (key: string) => check.findings.findIndex((finding) => finding.key === key);
  const [first, last] = [Math.min(at(from), at(to)), Math.max(at(from), at(to))];
  const share = (shares: Float64Array) => shares.slice(first, last + 1).reduce((sum, one) => sum + one, 0);
  if (first < 0 || share(sound) === 0) return linkInWords(link);
  const times = `\u00d7${ratioInFigures(share(row) / share(sound))}`;
  return factorOf(link) === null ? `${linkInWords(link)}, ${times}` : times;
}

/** "14", and where it is seen less often "0.3". */
export const ratioInFigures = (ratio: number): string => (ratio >= 1.5 ? String(Math.round(ratio)) : ratio.toFixed(1));

export const WHO: Readonly<Record<Who, string>> = {
  "skipper-at-sea": "Skipper, at sea too",
  "skipper-in-port": "Skipper, in port",
  mechanic: "Mechanic",
  workshop: "Workshop",
};

export const ENGINE_STATES = {
  any: "any state",
  cold: "cold",
  stopped: "stopped",
  cranking: "cranking",
  idling: "idling",
  "under-load": "under load",
} as const;
