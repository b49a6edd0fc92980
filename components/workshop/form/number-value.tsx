"use client";

import { useState } from "react";
import { TextField } from "@/components/ui/text-field";
import { readNumber } from "@/lib/core/units/read-number";
import type { Editing } from "./editing";
import { hintOf, labelOf } from "./field-words";

/** A number, typed with a point or a comma. What cannot be read stays as it was typed and says so. */
export function NumberValue({ name, path, value, onChange, bare }: Editing<number>) {
  const [typed, setTyped] = useState<string | null>(null);
  const shown = typed !== null && (readNumber(typed) ?? undefined) === value ? typed : value === undefined ? (typed ?? "") : String(value);
  const unread = typed !== null && typed.trim() !== "" && readNumber(typed) === null;
  return (
    <TextField
      id={path}
      label={bare ? <span className="visually-hidden">{labelOf(name)}</span> : labelOf(name)}
      hint={bare ? undefined : hintOf(name)}
      inputMode="decimal"
      className="dial max-w-40"
      value={unread ? typed : shown}
      error={unread ? "Write a number." : undefined}
      onChange={(event) => {
        setTyped(event.target.value);
        onChange(readNumber(event.target.value) ?? undefined);
      }}
    />
  );
}
