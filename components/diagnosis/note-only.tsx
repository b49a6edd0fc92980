"use client";

import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { NoteAndPhotos } from "./note-and-photos";
import { useKeptNote } from "./use-kept-note";

/** A note that belongs to no step. */
export function NoteOnly({ onSaid }: { onSaid: () => void }) {
  const { record } = useHere();
  const { note, photos, onNote, onPhotos, drop } = useKeptNote("note-only");
  const empty = note.trim() === "" && photos.length === 0;
  return (
    <div>
      <NoteAndPhotos of="note-only" before={0} note={note} onNote={onNote} photos={photos} onPhotos={onPhotos} />
      {!empty && (
        <Button
          wide
          tone="strong"
          onClick={() => {
            void record("noted", { note: note.trim(), photos: [...photos] }).then(drop);
            onSaid();
          }}
        >
          Keep the note
        </Button>
      )}
    </div>
  );
}
