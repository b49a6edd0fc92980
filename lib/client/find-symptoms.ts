import type { Symptom } from "@/lib/core/tree/schema";
import { complaintsOf, flatText } from "./plain-words";
import { symptomScorer, type Answer } from "./score-symptoms";
import { vocabularyOf } from "./symptom-words";

/**
 * A symptom that the words may mean. `score`: 0 is word for word, 1 is nothing alike. `fits`: near enough to be
 * ticked unasked. `weak`: the words do not say this, but it is among the nearest.
 */
export type SymptomHit = { key: string; score: number; fits: boolean; weak: boolean };

/** Less alike than this is a guess. */
const LEAST_LIKE = 0.38;
/** Near enough to stand as what was meant, until unticked. */
const LEAST_FIT = 0.68;
/** Less than this of a phrase said, and it is another complaint: "won't start" is not "won't start first time". */
const LEAST_OF_PHRASE = 0.65;
/** What tells less than this ticks nothing, unless it is word for word what people say. */
const LEAST_TOLD = 0.5;
const WORD_FOR_WORD = 0.99;
/** Two that are as near as this are not told apart by these words: a person picks. */
const TOO_CLOSE = 0.08;
/** What fits a part of a line has to be among so many of the whole line. */
const PLACES_IN_LINE = 2;
/** How far the whole line counts against its single complaints. */
const LINE_COUNTS = 0.5;
const MOST_HITS = 6;
const NEAREST = 3;

const mostAlike = (answers: readonly Answer[]): Answer[] =>
  answers.filter(({ like }) => like > 0).sort((a, b) => b.like - a.like || a.order - b.order);

/** What a single complaint ticks: the one symptom that fits it, where it fits alone. */
function ticked(answers: readonly Answer[]): string | null {
  const [best, next] = [...answers].sort((a, b) => b.fit - a.fit || a.order - b.order);
  if (!best || best.fit < LEAST_FIT || best.ofPhrase < LEAST_OF_PHRASE) return null;
  if (best.tells < LEAST_TOLD && best.fit < WORD_FOR_WORD) return null;
  return best.fit - (next?.fit ?? 0) > TOO_CLOSE ? best.key : null;
}

/**
 * Finds symptoms by what people type, misspelt or not, over titles, details and
 * the phrases people use. Several complaints in one line are looked up one by
 * one, and the line as a whole. At least the three nearest are given, marked
 * `weak` where the words do not say them; nothing only where no word is known.
 * The order depends on the words alone: better first, then as in the tree.
 */
export function symptomFinder(symptoms: readonly Symptom[]): (text: string) => SymptomHit[] {
  const score = symptomScorer(vocabularyOf(symptoms));
  return (text) => {
    const parts = complaintsOf(text).map(score);
    const line = parts.length > 1 ? score(flatText(text)) : (parts[0] ?? []);
    const inLine = new Set(
      mostAlike(line)
        .slice(0, Math.max(PLACES_IN_LINE, parts.length))
        .map(({ key }) => key),
    );
    const ticks = [...new Set(parts.map(ticked))].filter((key) => key !== null && inLine.has(key));
    const place = (key: string) => (ticks.includes(key) ? ticks.indexOf(key) : ticks.length);
    const all = line.map((answer, at) => {
      const best = Math.max(...parts.map((part) => part[at]?.like ?? 0));
      return { ...answer, like: (1 - LINE_COUNTS) * best + LINE_COUNTS * answer.like };
    });
    return mostAlike(all)
      .map(({ key, like }) => ({ key, score: 1 - like, fits: ticks.includes(key), weak: like < LEAST_LIKE && !ticks.includes(key) }))
      .sort((a, b) => place(a.key) - place(b.key))
      .filter(({ weak }, at) => !weak || at < NEAREST)
      .slice(0, MOST_HITS);
  };
}
