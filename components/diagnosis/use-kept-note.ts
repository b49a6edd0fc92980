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

/** Words typed into one field of a step, kept from the first letter until the step is answered. */
export function useKeptWords<T extends object>(of: string, empty: T): [T, (part: Partial<T>) => void, () => void] {
  const { summary } = useHere();
  return useKeptForm<T>(`gudgeon.typed.${summary.id}.${of}`, () => empty);
}
