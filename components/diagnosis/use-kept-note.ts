"use client";

import { useKeptForm } from "@/lib/client/screen/use-kept-form";
import { useHere } from "./here";

type Note = { note: string; photos: readonly string[] };

/** A note and pictures for a step of this diagnosis, kept from the first letter on; `drop` once they have gone with an answer. */
export function useKeptNote(of: string) {
  const { summary } = useHere();
  const [{ note, photos }, change, drop] = useKeptForm<Note>(`gudgeon.note.${summary.id}.${of}`, () => ({ note: "", photos: [] }));
  return {
    note,
    photos,
    onNote: (next: string) => change({ note: next }),
    onPhotos: (next: readonly string[]) => change({ photos: next }),
    drop,
  };
}
