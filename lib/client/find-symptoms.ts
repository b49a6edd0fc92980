import Fuse from "fuse.js";
import type { Symptom } from "@/lib/core/tree/schema";
import { wordOverlap } from "./word-overlap";

/** A symptom that the words may mean. `score`: 0 is word for word, 1 is nothing alike. `fits`: near enough to be ticked unasked. */
export type SymptomHit = { key: string; score: number; fits: boolean };

/** Worse than this is noise. */
const WORST_SCORE = 0.5;
/** Near enough to stand as what was meant, until unticked. */
const FITTING_SCORE = 0.36;
const MOST_HITS = 6;
/** Joins of two complaints in one line. */
const JOINS = /[,;.\n/+&]|\b(?:and|but|then|also|plus)\b/;

/** One way to say a symptom. Fuse multiplies the scores of a list, so each stands alone. */
type Phrase = { key: string; order: number; says: string };

/** Lower case, no apostrophes, single spaces: "Won't  rev" and "wont rev" are one. */
const plain = (text: string): string =>
  text
    .toLowerCase()
    .replace(/['\u2019`]/g, "")
    .replace(/[^\p{L}\p{N}]+/gu, " ")
    .trim();

/** The single complaints of a line: "wont rev, fadse when pushd" has two. */
export function complaintsOf(text: string): string[] {
  return text
    .toLowerCase()
    .replace(/['\u2019`]/g, "")
    .split(JOINS)
    .map(plain)
    .filter((part) => part.length > 1);
}

/**
 * Finds symptoms by what people type, misspelt or not, over titles, details and
 * the phrases people use. Several complaints in one line are looked up one by
 * one. The order depends on the words alone: better first, then as in the tree.
 */
export function symptomFinder(symptoms: readonly Symptom[]): (text: string) => SymptomHit[] {
  const phrases: Phrase[] = symptoms.flatMap((symptom, order) =>
    [symptom.title, symptom.detail, ...symptom.phrases].map((says) => ({ key: symptom.key, order, says: plain(says) })),
  );
  const fuse = new Fuse(phrases, {
    keys: ["says"],
    includeScore: true,
    ignoreLocation: true,
    threshold: WORST_SCORE,
    ignoreFieldNorm: true,
  });
  const overlap = wordOverlap(phrases);
  const search = (part: string) => {
    const nearest = new Map<string, { key: string; order: number; score: number }>();
    const offer = (key: string, order: number, score: number) => {
      if (score <= WORST_SCORE && score < (nearest.get(key)?.score ?? 1)) nearest.set(key, { key, order, score });
    };
    for (const { item, score } of fuse.search(part)) offer(item.key, item.order, Math.max(score ?? 1, shortness(part, item.says)));
    const uncovered = overlap(part);
    symptoms.forEach(({ key }, order) => offer(key, order, uncovered.get(key) ?? 1));
    return [...nearest.values()].sort((a, b) => a.score - b.score || a.order - b.order);
  };

  return (text) => {
    const best = new Map<string, { score: number; order: number; leads: boolean }>();
    for (const part of complaintsOf(text)) {
      search(part).forEach(({ key, order, score }, place) => {
        const before = best.get(key);
        // One tick a complaint: the best that fits.
        const leads = (place === 0 && score <= FITTING_SCORE) || (before?.leads ?? false);
        best.set(key, { score: Math.min(score, before?.score ?? 1), order, leads });
      });
    }
    return [...best.entries()]
      .sort(([, a], [, b]) => Number(b.leads) - Number(a.leads) || a.score - b.score || a.order - b.order)
      .slice(0, MOST_HITS)
      .map(([key, { score, leads }]) => ({ key, score, fits: leads }));
  };
}

/** A word of three letters is found inside half of all phrases: the shorter a complaint against what it is compared with, the less it says. */
function shortness(part: string, says: string): number {
  return part.length >= 6 ? 0 : (1 - part.length / Math.max(says.length, part.length)) * 0.6;
}
