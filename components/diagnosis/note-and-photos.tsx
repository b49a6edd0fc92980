"use client";

import { Camera } from "lucide-react";
import { useState } from "react";
import { MOST_PHOTOS } from "@/lib/client/kept-with";
import { shrinkPhoto } from "@/lib/client/shrink-photo";
import { TextArea } from "@/components/ui/text-area";
import { useHere } from "./here";
import { Photo } from "./photo";

/** An event's note holds 4000 letters: how a cure was tried may be added to it. */
const MOST_NOTE = 3400;

type Props = {
  of: string;
  /** Pictures that go with the answer already. */
  before: number;
  note: string;
  onNote: (note: string) => void;
  photos: readonly string[];
  onPhotos: (photos: readonly string[]) => void;
};

/** A note and pictures, if wanted, folded away: they go with the answer that is given next. */
export function NoteAndPhotos({ of, before, note, onNote, photos, onPhotos }: Props) {
  const { ready } = useHere();
  const [wrong, setWrong] = useState<string | null>(null);
  const add = async (files: readonly File[]) => {
    setWrong(null);
    let now = photos;
    const room = Math.max(0, MOST_PHOTOS - before - photos.length);
    if (files.length > room) setWrong(`Only ${MOST_PHOTOS} pictures go with one answer. Keep the rest for a note of its own.`);
    for (const file of files.slice(0, room)) {
      try {
        now = [...now, await ready.store.addPhoto(await shrinkPhoto(file))];
        onPhotos(now);
      } catch (failure) {
        setWrong(failure instanceof Error ? failure.message : "This picture could not be kept.");
      }
    }
  };
  return (
    <details className="mt-3">
      <summary className="link flex min-h-12 items-center">
        Add a note or a photo{photos.length > 0 ? ` (${photos.length} added)` : ""}
      </summary>
      <div className="grid gap-3 pt-1">
        <TextArea
          id={`note-${of}`}
          label="Note"
          hint="It is kept with the answer you give next."
          value={note}
          maxLength={MOST_NOTE}
          onChange={(event) => onNote(event.target.value)}
        />
        <label className="relative inline-flex min-h-12 items-center justify-center gap-2 rounded-lg border-[1.5px] border-edge bg-sheet px-4 font-semibold has-focus-visible:outline-3 has-focus-visible:outline-brass">
          <Camera aria-hidden size={20} />
          Add a photo
          <input
            type="file"
            accept="image/jpeg,image/png,image/webp"
            multiple
            className="absolute inset-0 cursor-pointer opacity-0"
            onChange={(event) => {
              void add([...(event.target.files ?? [])]);
              event.target.value = "";
            }}
          />
        </label>
        {wrong && (
          <p role="alert" className="font-semibold text-lead">
            {wrong}
          </p>
        )}
        {photos.length > 0 && (
          <ul className="flex flex-wrap gap-2">
            {photos.map((id, index) => (
              <li key={id} className="grid gap-1">
                <Photo id={id} number={index + 1} />
                <button type="button" className="link min-h-12" onClick={() => onPhotos(photos.filter((other) => other !== id))}>
                  Leave out
                </button>
              </li>
            ))}
          </ul>
        )}
      </div>
    </details>
  );
}
