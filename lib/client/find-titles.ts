import Fuse from "fuse.js";

export type Titled = { key: string; title: string };

const MOST_HITS = 6;
/** Misspelt words are found, other words are not. */
const THRESHOLD = 0.4;

/** Finds things by words of their titles, misspelt or not, the nearest first. */
export function titleFinder<T extends Titled>(things: readonly T[]): (typed: string) => T[] {
  const fuse = new Fuse(things, {
    keys: ["title"],
    threshold: THRESHOLD,
    ignoreLocation: true,
    ignoreFieldNorm: true,
    useTokenSearch: true,
  });
  return (typed) =>
    typed.trim().length < 2
      ? []
      : fuse
          .search(typed)
          .slice(0, MOST_HITS)
          .map(({ item }) => item);
}
