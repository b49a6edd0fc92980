import { AKIN, EMPTY, NO, SAME, SAYINGS, WEAK } from "./thesaurus";

const split = (line: string): string[] => line.split(" ").filter((word) => word !== "");

/** Joins of two complaints in one line. */
const JOINS = /[,;.\n/+&!?:()]|\b(?:and|but|then|also|plus)\b/;
const NO_WORD = "no";

/** A word without its ending: "clicking", "clicked" and "clicks" are one, and so are "batteries" and "battery". */
export function stemOf(word: string): string {
  if (word.length < 4 || /\d/.test(word)) return word;
  const one = word
    .replace(/ies$/, "y")
    .replace(/(ss|sh|ch|x|zz)es$/, "$1")
    .replace(/([^s])s$/, "$1");
  const bare = one.length > 5 ? one.replace(/(?:ing|ed|ly|er)$/, "") : one.length > 4 ? one.replace(/(?:ed|ly)$/, "") : one;
  if (bare.length < 3) return word;
  // "stopped" is "stop", "rolling" is "roll"; a silent e goes from both "surge" and "surging".
  return bare.replace(/([bdgmnprt])\1$/, "$1").replace(/(.{3,})[ey]$/, "$1");
}

const EMPTY_WORDS = new Set(EMPTY.flatMap(split));
const meanings = new Map<string, string>();
const learn = (word: string, means: string) => {
  meanings.set(word, means);
  const stem = stemOf(word);
  if (!meanings.has(stem) && !EMPTY_WORDS.has(stem)) meanings.set(stem, means);
};
for (const word of split(NO)) meanings.set(word, NO_WORD);
for (const line of SAME) {
  const [means = "", ...others] = split(line);
  for (const word of [means, ...others]) learn(word, means);
}
const WEAK_WORDS: ReadonlySet<string> = new Set([NO_WORD, ...WEAK.flatMap(split).map(plainWord)]);

/** What a word comes to: its meaning in the thesaurus, or itself without its ending. */
export function plainWord(word: string): string {
  const stem = stemOf(word);
  return meanings.get(word) ?? meanings.get(stem) ?? stem;
}

/** Whether half of all complaints have this plain word: it counts, but little. */
export const isWeak = (plain: string): boolean => WEAK_WORDS.has(plain);

/** Every word the thesaurus knows. */
export const everydayWords = (): ReadonlySet<string> => new Set([...meanings.keys(), ...sayingWords]);

const akin = new Map<string, ReadonlySet<string>>();
for (const line of AKIN) {
  const all = split(line).map(plainWord);
  for (const one of all) akin.set(one, new Set([...(akin.get(one) ?? []), ...all.filter((other) => other !== one)]));
}

/** Plain words near in meaning to this one. */
export const wordsAkin = (plain: string): Iterable<string> => akin.get(plain) ?? [];

type Saying = { words: readonly string[]; means: string };
const sayingsBy = new Map<string, Saying[]>();
const sayingWords = new Set<string>();
for (const line of SAYINGS) {
  const [means = "", list = ""] = line.split(" = ");
  for (const saying of list.split(", ")) {
    const words = split(saying);
    const first = words[0] ?? "";
    for (const word of words) sayingWords.add(word);
    sayingsBy.set(
      first,
      [...(sayingsBy.get(first) ?? []), { words, means: plainWord(means) }].sort((a, b) => b.words.length - a.words.length),
    );
  }
}

/** A plain word and the word it was said with; a saying is one word. */
export type Said = { plain: string; word: string };

/** Text in small letters and single spaces, apostrophes and signs gone. */
export function flatText(text: string): string {
  return text
    .toLowerCase()
    .replace(/['\u2019`]/g, "")
    .replace(/[^\p{L}\p{N}]+/gu, " ")
    .trim();
}

/** The single complaints of a line: "wont rev, fadse when pushd" has two. */
export function complaintsOf(text: string): string[] {
  return text
    .toLowerCase()
    .replace(/['\u2019`]/g, "")
    .split(JOINS)
    .map(flatText)
    .filter((part) => part.length > 1);
}

/**
 * The words of a complaint that say something, in their order, as what they come
 * to. `mend` gives the known word that a misspelt one stands for.
 */
export function saidIn(flat: string, mend: (word: string) => string = (word) => word): Said[] {
  const typed = split(flat);
  const words = typed.map((word) => (sayingWords.has(word) || EMPTY_WORDS.has(word) ? word : mend(word)));
  const said: Said[] = [];
  for (let at = 0; at < words.length;) {
    const word = words[at] ?? "";
    const saying = sayingsBy.get(word)?.find((one) => one.words.every((part, i) => words[at + i] === part));
    if (saying) said.push({ plain: saying.means, word: saying.words.join(" ") });
    else if (word.length > 1 && !EMPTY_WORDS.has(word)) said.push({ plain: plainWord(word), word: typed[at] ?? word });
    at += saying?.words.length ?? 1;
  }
  return said;
}
