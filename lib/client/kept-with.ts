/** As many pictures as one answer carries. */
export const MOST_PHOTOS = 12;

type Kept = { note?: string | undefined; photos: readonly string[] };

/** Note and pictures of an answer that takes the place of another: what was there stays, unless a new note is written over it. */
export function keptWith(before: Kept | undefined, now: { note: string; photos: readonly string[] }): { note?: string; photos: string[] } {
  const note = now.note || before?.note;
  return { ...(note ? { note } : {}), photos: [...(before?.photos ?? []), ...now.photos].slice(0, MOST_PHOTOS) };
}
