"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { NoteAndPhotos } from "./note-and-photos";

/** A note that belongs to no step. */
export function NoteOnly({ onSaid }: { onSaid: () => void }) {
  const { record } = useHere();
  const [note, setNote] = useState("");
  const [photos, setPhotos] = useState<readonly string[]>([]);
  const empty = note.trim() === "" && photos.length === 0;
  return (
    <div>
      <NoteAndPhotos of="note-only" note={note} onNote={setNote} photos={photos} onPhotos={setPhotos} />
      {!empty && (
        <Button
          wide
          tone="strong"
          onClick={() => {
            void record("noted", { note: note.trim(), photos: [...photos] });
            onSaid();
          }}
        >
          Keep the note
        </Button>
      )}
    </div>
  );
}
