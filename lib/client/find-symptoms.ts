import type { Symptom } from "@/lib/core/tree/schema";
import { mendedWord, plainWord, wordLikeness } from "./word-likeness";

/** A symptom that the words may mean. `score`: 0 is word for word, 1 is nothing alike. `fits`: near enough to be ticked unasked. */
export type SymptomHit = { key: string; score: number; fits: boolean };

/** Worse than this is noise. */
const WORST_SCORE = 0.62;
/** Near enough to stand as what was meant, until unticked. */
const FITTING_SCORE = 0.35;
/** Two that are as near as this are not told apart by these words: a person picks. */
const TOO_CLOSE = 0.08;
const MOST_HITS = 6;
/** Joins of two complaints in one line. */
const JOINS = /[,;.\n/+&]|\b(?:and|but|then|also|plus)\b/;
/** Words that tell nothing apart. */
const EMPTY_WORDS = words(
  "a an the it its is was be i my me we our to of in on at by for from with when then than this that engine motor will has have does do",
);
/** Words that half of all complaints have: they count, but little. */
const WEAK_WORDS = words(
  "no not wont doesnt cant isnt out up off over again just only all back goes go get gets more any now so very put takes",
);
const WEAK_WEIGHT = 0.4;
/** How far the words of one phrase count against those of all phrases of a symptom. */
const PHRASE_COUNTS = 0.6;
/** A phrase that is said whole within a longer complaint counts so much, whatever else is said. */
const WHOLE_PHRASE = 0.8;
/** Less than this of a phrase said, and it is another complaint: "won't start" is not "won't start first time". */
const LEAST_OF_PHRASE = 0.5;

function words(list: string): ReadonlySet<string> {
  return new Set(list.split(" "));
}

/** The single complaints of a line: "wont rev, fadse when pushd" has two. */
export function complaintsOf(text: string): string[] {
  return text
    .toLowerCase()
    .replace(/['\u2019`]/g, "")
    .split(JOINS)
    .map((part) => part.replace(/[^\p{L}\p{N}]+/gu, " ").trim())
    .filter((part) => part.length > 1);
}

const told = (text: string): string[] => [
  ...new Set(
    complaintsOf(text)
      .flatMap((part) => part.split(" "))
      .filter((word) => word.length > 1 && !EMPTY_WORDS.has(word)),
  ),
];

/** A symptom's words, with what they plainly mean; `all`: those of the detail as well. */
type Known = { key: string; phrases: readonly (readonly string[])[]; all: readonly string[] };

/**
 * Finds symptoms by what people type, misspelt or not, over titles, details and
 * the phrases people use. Several complaints in one line are looked up one by
 * one. A word that no symptom has counts in full against all of them, so that a
 * complaint the tree does not know ticks nothing. The order depends on the words
 * alone: better first, then as in the tree.
 */
export function symptomFinder(symptoms: readonly Symptom[]): (text: string) => SymptomHit[] {
  const known: Known[] = symptoms.map(({ key, title, detail, phrases }) => {
    const each = [title, ...phrases].map(told);
    return { key, phrases: each.map((phrase) => phrase.map(plainWord)), all: [...new Set([...each.flat(), ...told(detail)])] };
  });
  const vocabulary = new Map(known.flatMap(({ all }) => all).map((word) => [word, plainWord(word)]));
  const usedBy = new Map<string, number>();
  for (const { all } of known)
    for (const word of new Set(all.map((one) => vocabulary.get(one) ?? one))) usedBy.set(word, (usedBy.get(word) ?? 0) + 1);
  const weigh = (plain: string): number => (WEAK_WORDS.has(plain) ? WEAK_WEIGHT : Math.log(1 + known.length / (usedBy.get(plain) ?? 1)));
  const sum = (list: readonly number[]): number => list.reduce((total, one) => total + one, 0);

  /** How near each word of the tree is to a typed one; those that are not near at all are left out. */
  const likesOf = (typed: string): ReadonlyMap<string, number> =>
    new Map([...vocabulary.keys()].map((word) => [word, wordLikeness(typed, word)] as const).filter(([, like]) => like > 0));

  const likenessTo = ({ phrases, all }: Known, typed: readonly { word: string; likes: ReadonlyMap<string, number> }[]) => {
    // A misspelt word weighs what the word weighs that it stands for.
    const near = typed.map(({ word, likes }) => {
      let best = { plain: plainWord(word), like: 0 };
      for (const other of all) {
        const like = likes.get(other) ?? 0;
        if (like > best.like) best = { plain: vocabulary.get(other) ?? other, like };
      }
      return { ...best, weight: weigh(best.plain) };
    });
    const whole = sum(near.map(({ weight }) => weight)) || 1;
    const covered = sum(near.map(({ like, weight }) => like * weight)) / whole;
    const said = new Set(near.filter(({ like }) => like > 0).map(({ plain }) => plain));
    const inPhrase = phrases.map((phrase) => {
      const recall = sum(near.map(({ plain, like, weight }) => (phrase.includes(plain) ? like * weight : 0))) / whole;
      const precision = sum(phrase.map((word) => (said.has(word) ? weigh(word) : 0))) / (sum(phrase.map(weigh)) || 1);
      const both = recall + precision === 0 ? 0 : (2 * recall * precision) / (recall + precision);
      return { like: Math.max(both, precision > 0.99 && phrase.length > 1 ? WHOLE_PHRASE : 0), precision };
    });
    const best = inPhrase.reduce((most, one) => (one.like > most.like ? one : most), { like: 0, precision: 0 });
    return { like: PHRASE_COUNTS * best.like + (1 - PHRASE_COUNTS) * covered, ofPhrase: best.precision };
  };

  const search = (part: string) => {
    const typed = told(part)
      .map((word) => (vocabulary.has(word) ? word : mendedWord(word)))
      .map((word) => ({ word, likes: likesOf(word) }));
    if (typed.every(({ word }) => WEAK_WORDS.has(word))) return [];
    return known
      .map((symptom, order) => {
        const { like, ofPhrase } = likenessTo(symptom, typed);
        return { key: symptom.key, order, score: 1 - like, fits: 1 - like <= FITTING_SCORE && ofPhrase >= LEAST_OF_PHRASE };
      })
      .filter(({ score }) => score <= WORST_SCORE)
      .sort((a, b) => a.score - b.score || a.order - b.order);
  };

  return (text) => {
    const best = new Map<string, { score: number; order: number; leads: boolean }>();
    for (const part of complaintsOf(text)) {
      const found = search(part);
      const clear = (found[1]?.score ?? 1) - (found[0]?.score ?? 1) > TOO_CLOSE;
      found.forEach(({ key, order, score, fits }, place) => {
        const before = best.get(key);
        // One tick a complaint: the best that fits, where it is the best alone.
        const leads = (place === 0 && clear && fits) || (before?.leads ?? false);
        best.set(key, { score: Math.min(score, before?.score ?? 1), order, leads });
      });
    }
    return [...best.entries()]
      .sort(([, a], [, b]) => Number(b.leads) - Number(a.leads) || a.score - b.score || a.order - b.order)
      .slice(0, MOST_HITS)
      .map(([key, { score, leads }]) => ({ key, score, fits: leads }));
  };
}
