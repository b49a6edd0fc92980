/** As many pictures as one answer carries. */
export const MOST_PHOTOS = 12;

type Kept = { note?: string | undefined; photos: readonly string[] };

/** Note and pictures of an answer that takes the place of another: what was there stays, unless a new note is written over it. */
export function keptWith(before: Kept | undefined, now: { note: string; photos: readonly string[] }): { note?: string; photos: string[] } {
  const note = now.note || before?.note;
  return { ...(note ? { note } : {}), photos: [...(before?.photos ?? []), ...now.photos].slice(0, MOST_PHOTOS) };
}

/** As long as a proof may be. */
const MOST_PROOF = 500;

/** How a cure was proved: as the tree says, and what was seen. Where both are too long together, what was seen is kept whole. */
export function provedAs(proof: string, own: string): string {
  const both = own === "" ? proof : `${proof} ${own}`;
  return (both.length <= MOST_PROOF || own === "" ? both : own).slice(0, MOST_PROOF);
}
