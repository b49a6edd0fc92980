import Fuse from "fuse.js";

/** A word of the tree or the thesaurus that a typed one may be. `like`: 1 the same, 0 nothing alike. */
export type Likeness = { word: string; like: number };

const MOST = 5;
/** Looser than the slips allowed below: the library gathers, the slips decide. */
const THRESHOLD = 0.34;
const UNFINISHED = 0.85;
const LEAST_UNFINISHED = 3;

/**
 * Finds the known words that a typed one may stand for: itself, the word it is
 * the beginning of (typed not to its end), or one it is a slip of the finger
 * away from. One slip is allowed in four letters, two in nine. Answers are kept,
 * so that a key pressed looks up one word.
 */
export function wordFinder(known: Iterable<string>): (typed: string) => readonly Likeness[] {
  const words = [...new Set(known)];
  const all = new Set(words);
  const fuse = new Fuse(words, { threshold: THRESHOLD, includeScore: true, ignoreFieldNorm: true });
  const kept = new Map<string, readonly Likeness[]>();
  return (typed) => {
    const before = kept.get(typed);
    if (before) return before;
    const found = all.has(typed) ? [{ word: typed, like: 1 }] : likeWords(typed);
    kept.set(typed, found);
    return found;
  };

  function likeWords(typed: string): readonly Likeness[] {
    if (typed.length < LEAST_UNFINISHED || /\d/.test(typed)) return [];
    const likes = fuse
      .search(typed, { limit: 60 })
      .map(({ item }) => ({ word: item, like: wordLikeness(typed, item) }))
      .filter(({ like }) => like > 0);
    const best = Math.max(0, ...likes.map(({ like }) => like));
    // A word far behind the nearest is not what was meant.
    return likes
      .filter(({ like }) => like > best - 0.1)
      .sort((a, b) => b.like - a.like || a.word.length - b.word.length || (a.word < b.word ? -1 : 1))
      .slice(0, MOST);
  }
}

/** How alike a typed word is to a known one: 1 the same, 0 not at all. */
export function wordLikeness(typed: string, word: string): number {
  if (typed === word) return 1;
  if (typed.length >= LEAST_UNFINISHED && word.startsWith(typed)) return UNFINISHED;
  const most = Math.max(typed.length, word.length);
  const allowed = most >= 9 ? 2 : most >= 4 ? 1 : 0;
  if (allowed === 0 || Math.abs(typed.length - word.length) > allowed || (most < 6 && typed[0] !== word[0])) return 0;
  const slips = slipsBetween(typed, word);
  return slips > allowed ? 0 : 1 - (1.2 * slips) / most;
}

/** Letters wrong, missing, too many, or two in the wrong order (optimal string alignment). */
function slipsBetween(a: string, b: string): number {
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, at) => at);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let least = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) least = Math.min(least, (before[j - 2] ?? 0) + 1);
      row.push(least);
    }
    before = last;
    last = row;
  }
  return last[b.length] ?? 0;
}
