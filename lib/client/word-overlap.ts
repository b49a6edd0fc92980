import Fuse from "fuse.js";

/** Words that every complaint has and that tell nothing apart. */
const EMPTY_WORDS = new Set(
  "a an the it its is was be i my me we our to of in on at by for from with when then than this that engine motor goes go will has have does do".split(
    " ",
  ),
);
/** A word nobody used in any phrase counts for something, so that odd words lower the score, but less than a known one. */
const UNKNOWN_WEIGHT = 0.6;
const WORD_THRESHOLD = 0.34;

type Word = { word: string; usedBy: Set<string> };

/**
 * How much of a complaint a symptom's own words cover, whatever their order:
 * 0 all of it, 1 nothing. Rare words count more than those of many symptoms.
 */
export function wordOverlap(phrases: readonly { key: string; says: string }[]): (part: string) => Map<string, number> {
  const words = new Map<string, Word>();
  for (const { key, says } of phrases) {
    for (const word of told(says)) {
      const known = words.get(word) ?? { word, usedBy: new Set() };
      known.usedBy.add(key);
      words.set(word, known);
    }
  }
  const symptoms = new Set(phrases.map(({ key }) => key)).size;
  const fuse = new Fuse([...words.values()], {
    keys: ["word"],
    includeScore: true,
    threshold: WORD_THRESHOLD,
    distance: 20,
    ignoreFieldNorm: true,
  });

  return (part) => {
    const covered = new Map<string, number>();
    let whole = 0;
    for (const word of told(part)) {
      const same = words.get(word);
      const near = same
        ? [{ item: same, score: 0 }]
        : fuse.search(word).filter(({ item }) => Math.abs(item.word.length - word.length) <= 2 + word.length / 4);
      const bestOf = new Map<string, number>();
      let weight = UNKNOWN_WEIGHT;
      for (const { item, score } of near) {
        const rarity = Math.log(1 + symptoms / item.usedBy.size);
        weight = Math.max(weight, rarity);
        for (const key of item.usedBy) bestOf.set(key, Math.max(bestOf.get(key) ?? 0, rarity * (1 - (score ?? 1))));
      }
      whole += weight;
      for (const [key, points] of bestOf) covered.set(key, (covered.get(key) ?? 0) + points);
    }
    return new Map([...covered].map(([key, points]) => [key, 1 - points / whole]));
  };
}

const told = (text: string): string[] => text.split(" ").filter((word) => word.length > 1 && !EMPTY_WORDS.has(word));
