"use client";

import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";

/** A thing's fields in words, by their label. */
export type Lines = Readonly<Record<string, string>>;

type Props = { was: Lines; theirs: Lines; mine: Lines; onKeep: () => void; onTake: () => void; saving: boolean };

/** Somebody else changed the thing while this person did: what they changed, and the choice. */
export function StaleNotice({ was, theirs, mine, onKeep, onTake, saving }: Props) {
  const changed = Object.keys({ ...was, ...theirs }).filter((label) => was[label] !== theirs[label]);
  const mineToo = changed.filter((label) => mine[label] !== was[label] && mine[label] !== theirs[label]);
  return (
    <Notice tone="look" title="Somebody changed this while you did" live>
      <ul className="mt-1 list-disc pl-5">
        {changed.map((label) => (
          <li key={label}>
            {label}: {theirs[label] ?? "not given"} (it was: {was[label] ?? "not given"}
            {mineToo.includes(label) && `; you have: ${mine[label] ?? "not given"}`})
          </li>
        ))}
        {changed.length === 0 && <li>Nothing that stands on this page.</li>}
      </ul>
      <p className="mt-2">
        {mineToo.length > 0
          ? "Keep mine: what you changed is saved over theirs, the rest of theirs stays."
          : "Keep mine: both changes are saved, they do not touch each other."}
      </p>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button tone="strong" onClick={onKeep} disabled={saving}>
          Keep mine
        </Button>
        <Button onClick={onTake} disabled={saving}>
          Take theirs
        </Button>
      </div>
    </Notice>
  );
}
