/** Everyday words that say the same of an engine. */
const SAME: readonly string[] = [
  "slow slowly ages forever ever long sluggish",
  "start starts starting started fire fires fired catch catches",
  "stop stops stopped stopping die dies died dying quit quits stall stalls stalled",
  "rev revs rpm rpms revving revolution revolutions",
  "hot warm",
  "hard difficult reluctant badly bad",
];
const MEANS = new Map(SAME.flatMap((line) => line.split(" ").map((word) => [word, line.split(" ")[0] ?? word] as const)));

/** A word without its ending and with its everyday meaning: "clicking" and "clicks" are one, and so are "dies" and "stops". */
export function plainWord(word: string): string {
  const meant = MEANS.get(word);
  if (meant) return meant;
  const stem = word.length > 4 ? word.replace(/(?:ing|ies|ed|es|s|y)$/, "") : word.replace(/s$/, "");
  return stem.length > 2 ? (MEANS.get(stem) ?? stem) : word;
}

/** The everyday word that a typed one is a slip of the finger away from; itself where there is none. */
export function mendedWord(typed: string): string {
  if (typed.length < 6) return typed;
  const near = [...MEANS.keys()].find(
    (word) => word.length >= 6 && Math.abs(word.length - typed.length) < 2 && slipsBetween(word, typed) <= 1,
  );
  return near ?? typed;
}

/**
 * How alike a typed word is to one of the tree's: 1 the same or another form of it, 0 not at all. The
 * beginning of a word is a word not typed to its end; one slip of the finger is
 * allowed in four letters, two in eight.
 */
export function wordLikeness(typed: string, word: string): number {
  if (typed === word || plainWord(typed) === plainWord(word)) return 1;
  if (typed.length >= 3 && word.startsWith(typed)) return 0.85;
  const most = Math.max(typed.length, word.length);
  const allowed = most >= 8 ? 2 : most >= 4 ? 1 : 0;
  if (allowed === 0 || Math.abs(typed.length - word.length) > allowed || (most < 6 && typed[0] !== word[0])) return 0;
  const slips = slipsBetween(typed, word);
  return slips > allowed ? 0 : 1 - (0.6 * slips) / most;
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
