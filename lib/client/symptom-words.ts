import type { Symptom } from "@/lib/core/tree/schema";
import { flatText, isWeak, saidIn } from "./plain-words";

/** Words that half of all complaints have. */
const WEAK_WEIGHT = 0.4;
/** A title says a symptom best, its detail a little less than what people say. */
const TITLE_COUNTS = 1.5;
const DETAIL_COUNTS = 0.7;

/** One way of saying a symptom: its plain words, and what they weigh together. */
export type Phrase = { plains: readonly string[]; weight: number };

/** How often a plain word, or two said together, stands in what is said of a symptom. */
export type SymptomWords = {
  key: string;
  phrases: readonly Phrase[];
  counts: ReadonlyMap<string, number>;
  pairs: ReadonlyMap<string, number>;
};

export type Vocabulary = {
  symptoms: readonly SymptomWords[];
  /** The words as they are written in the tree. */
  written: ReadonlySet<string>;
  has: (plain: string) => boolean;
  /** The rarer a word among the symptoms, the more it tells: log(1 + all symptoms / those that have it). */
  weigh: (plain: string) => number;
};

export const sum = (list: readonly number[]): number => list.reduce((total, one) => total + one, 0);

/** Words said beside one another, or with one between; the order counts only with "no". */
export function pairsOf(plains: readonly string[]): string[] {
  const pairs = plains.flatMap((one, at) =>
    plains
      .slice(at + 1, at + 3)
      .filter((other) => other !== one)
      .map((other) => (one > other && one !== "no" && other !== "no" ? `${other} ${one}` : `${one} ${other}`)),
  );
  return [...new Set(pairs)];
}

/** The words of a tree's symptoms, counted once for all look-ups. */
export function vocabularyOf(symptoms: readonly Symptom[]): Vocabulary {
  const written = new Set<string>();
  const usedBy = new Map<string, number>();
  const weights = new Map<string, number>();
  const weigh = (plain: string): number => {
    const known = weights.get(plain);
    if (known !== undefined) return known;
    const weight = isWeak(plain) ? WEAK_WEIGHT : Math.log(1 + symptoms.length / (usedBy.get(plain) ?? 1));
    weights.set(plain, weight);
    return weight;
  };
  const read = (text: string): string[] => {
    const said = saidIn(flatText(text));
    for (const { word } of said) written.add(word);
    return said.map(({ plain }) => plain);
  };
  const texts = symptoms.map(({ title, detail, phrases }) => ({ title: read(title), detail: read(detail), phrases: phrases.map(read) }));
  for (const { title, detail, phrases } of texts)
    for (const plain of new Set([title, detail, ...phrases].flat())) usedBy.set(plain, (usedBy.get(plain) ?? 0) + 1);

  const wordsOf = (key: string, { title, detail, phrases }: { title: string[]; detail: string[]; phrases: string[][] }): SymptomWords => {
    const counts = new Map<string, number>();
    const pairs = new Map<string, number>();
    const count = (plains: readonly string[], much: number) => {
      for (const plain of new Set(plains)) counts.set(plain, (counts.get(plain) ?? 0) + much);
      for (const pair of pairsOf(plains)) pairs.set(pair, (pairs.get(pair) ?? 0) + much);
    };
    count(title, TITLE_COUNTS);
    count(detail, DETAIL_COUNTS);
    for (const phrase of phrases) count(phrase, 1);
    const whole = [title, ...phrases].map((said) => [...new Set(said)]).map((plains) => ({ plains, weight: sum(plains.map(weigh)) || 1 }));
    return { key, counts, pairs, phrases: whole };
  };
  const known = texts.map((text, at) => wordsOf(symptoms[at]?.key ?? "", text));
  return { symptoms: known, written, has: (plain) => usedBy.has(plain), weigh };
}
