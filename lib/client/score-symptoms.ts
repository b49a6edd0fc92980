import { everydayWords, isWeak, plainWord, saidIn, wordsAkin, type Said } from "./plain-words";
import { pairsOf, sum, type Phrase, type SymptomWords, type Vocabulary } from "./symptom-words";
import { wordFinder } from "./word-likeness";

/**
 * How one symptom answers one complaint. `like` orders (0 nothing alike, 1 word for word); `fit` is how well all
 * that was said is a way of saying the symptom, `ofPhrase` how much of that way of saying it was said, `tells` what
 * was said in rarities of a word that one symptom alone has: "won't start" tells little.
 */
export type Answer = { key: string; order: number; like: number; fit: number; ofPhrase: number; tells: number };

/** What a word that is near in meaning counts, of one that means the same. */
const AKIN_LIKE = 0.6;
/** Shares of what makes two alike: one phrase, words of all phrases, two words together. */
const SHARES = { phrase: 0.4, words: 0.35, pairs: 0.25 };
/** A word in so many phrases of a symptom counts half; in more, more. */
const HALF_AT = 0.7;
/** How far one phrase counts for a fit, against the words of all phrases. */
const PHRASE_FITS = 0.6;
/** A phrase that is said whole within a longer complaint counts so much, whatever else is said. */
const WHOLE_PHRASE = 0.8;

type Typed = { likes: ReadonlyMap<string, number>; weight: number; plain: string };
const often = (count: number): number => count / (count + HALF_AT);

/**
 * Scores all symptoms against one complaint. A word that no symptom has counts in
 * full against all of them, so that a complaint the tree does not know fits none.
 */
export function symptomScorer(vocabulary: Vocabulary): (complaint: string) => Answer[] {
  const { symptoms, weigh } = vocabulary;
  const everyday = everydayWords();
  const findWord = wordFinder([...vocabulary.written, ...everyday]);

  const isKnown = (word: string): boolean => everyday.has(word) || vocabulary.has(plainWord(word)) || isWeak(plainWord(word));

  /** What a word may stand for, and how likely: its meaning, those akin to it, and where it is unknown what it is a slip of. */
  const read = ({ plain, word }: Said): Typed => {
    const likes = new Map<string, number>();
    const add = (one: string, like: number) => likes.set(one, Math.max(like, likes.get(one) ?? 0));
    if (word.includes(" ") || isKnown(word)) add(plain, 1);
    else for (const { word: other, like } of findWord(word)) add(plainWord(other), like);
    const meant = [...likes];
    for (const [one, like] of meant) for (const other of wordsAkin(one)) add(other, like * AKIN_LIKE);
    const main = meant.reduce((a, b) => (b[1] > a[1] ? b : a), [plain, 0] as const)[0];
    return { likes, plain: main, weight: weigh(main) };
  };

  return (complaint) => {
    const inOrder = saidIn(complaint, (word) => (isKnown(word) ? word : (findWord(word)[0]?.word ?? word))).map(read);
    const typed = [...new Map(inOrder.map((one) => [one.plain, one])).values()];
    if (typed.every(({ plain }) => isWeak(plain))) return [];
    const whole = sum(typed.map(({ weight }) => weight)) || 1;
    const tells = whole / Math.log(1 + symptoms.length);
    const pairs = pairsOf(inOrder.map(({ plain }) => plain)).map((pair) => ({ pair, weight: sum(pair.split(" ").map(weigh)) }));
    const ofPairs = sum(pairs.map(({ weight }) => weight)) || 1;
    const meant = new Map<string, { at: number; like: number }[]>();
    typed.forEach(({ likes }, at) => likes.forEach((like, plain) => meant.set(plain, [...(meant.get(plain) ?? []), { at, like }])));

    const byPhrase = ({ plains, weight }: Phrase) => {
      const met = new Float64Array(typed.length);
      let said = 0;
      for (const plain of plains) {
        let most = 0;
        for (const { at, like } of meant.get(plain) ?? []) {
          met[at] = Math.max(met[at] ?? 0, like);
          most = Math.max(most, like);
        }
        said += most * weigh(plain);
      }
      if (said === 0) return { like: 0, precision: 0 };
      const recall = sum(typed.map((one, at) => one.weight * (met[at] ?? 0))) / whole;
      const precision = said / weight;
      const both = (2 * recall * precision) / (recall + precision);
      return { like: Math.max(both, precision > 0.99 && plains.length > 1 ? WHOLE_PHRASE : 0), precision };
    };

    const answer = ({ key, phrases, counts, pairs: known }: SymptomWords, order: number): Answer => {
      let [covered, touched] = [0, 0];
      for (const { likes, weight } of typed) {
        let [much, nearest] = [0, 0];
        for (const [plain, like] of likes) {
          const count = counts.get(plain);
          if (count === undefined) continue;
          much = Math.max(much, like * often(count));
          nearest = Math.max(nearest, like);
        }
        covered += (much * weight) / whole;
        touched += (nearest * weight) / whole;
      }
      if (touched === 0) return { key, order, like: 0, fit: 0, ofPhrase: 0, tells };
      const paired = sum(pairs.map(({ pair, weight }) => weight * often(known.get(pair) ?? 0))) / ofPairs;
      const best = phrases.map(byPhrase).reduce((a, b) => (b.like > a.like ? b : a), { like: 0, precision: 0 });
      return {
        key,
        order,
        like: SHARES.phrase * best.like + SHARES.words * covered + SHARES.pairs * paired,
        fit: PHRASE_FITS * best.like + (1 - PHRASE_FITS) * touched,
        ofPhrase: best.precision,
        tells,
      };
    };
    return symptoms.map(answer);
  };
}
