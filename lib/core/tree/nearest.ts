/** Edits (insert, drop, change) that turn one word into the other: Levenshtein's distance, one row at a time. */
function edits(a: string, b: string): number {
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
      next.push(Math.min(change, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
    }
    row = next;
  }
  return row[b.length] ?? 0;
}

/** The known word that was probably meant, or null when none is within a third of the word's length. */
export function nearest(word: string, known: Iterable<string>): string | null {
  let best: string | null = null;
  let fewest = Math.floor(word.length / 3) + 1;
  for (const candidate of known) {
    if (Math.abs(candidate.length - word.length) >= fewest) continue;
    const count = edits(word, candidate);
    if (count < fewest) [best, fewest] = [candidate, count];
  }
  return best;
}

/** "Did you mean ...?" or, with nothing near, what else to do. */
export function didYouMean(word: string, known: Iterable<string>, otherwise: string): string {
  const guess = nearest(word, known);
  return guess === null ? otherwise : `Did you mean "${guess}"?`;
}
