"use client";

import { useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { titleFinder } from "@/lib/client/find-titles";

export type Pick = { key: string; title: string; under: string };
/** What was chosen: a thing of the tree by its key, or words where the key is "". */
export type Said = { key: string; words: string };

type Props = {
  id: string;
  label: string;
  hint: string;
  options: readonly Pick[];
  /** Shown before anything is typed. */ suggested?: readonly string[];
  value: Said;
  onChange: (value: Said) => void;
  error?: string | undefined;
};

/** One of the tree's own, found by a few words; or, where it has none that fits, the words themselves. */
export function PickOrSay({ id, label, hint, options, suggested = [], value, onChange, error }: Props) {
  const find = useMemo(() => titleFinder(options), [options]);
  const [wantsFocus, setWantsFocus] = useState(false);
  const chosen = options.find(({ key }) => key === value.key);
  if (chosen) {
    return (
      <div className="grid gap-1">
        <p className="font-semibold">{label}</p>
        <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-2 rounded-lg border-[1.5px] border-edge bg-shoal px-3 py-1">
          <span>
            {chosen.title} <span className="block text-sm text-ink-2">{chosen.under}</span>
          </span>
          <Button
            aria-label={`Change: ${chosen.title}`}
            onClick={() => {
              setWantsFocus(true);
              onChange({ key: "", words: "" });
            }}
          >
            Change
          </Button>
        </div>
      </div>
    );
  }
  const typed = value.words.trim();
  const hits = typed.length > 1 ? find(typed) : suggested.flatMap((key) => options.filter((option) => option.key === key));
  return (
    <div className="grid gap-2">
      <TextField
        id={id}
        label={label}
        hint={hint}
        autoComplete="off"
        maxLength={500}
        autoFocus={wantsFocus}
        value={value.words}
        error={error}
        onChange={(event) => onChange({ key: "", words: event.target.value })}
      />
      <p role="status" className="visually-hidden">
        {typed.length > 1 ? `${hits.length} found in the fault tree` : ""}
      </p>
      {hits.length > 0 && (
        <ul aria-label={`${label}: from the fault tree`} className="grid gap-1.5">
          {hits.map((hit) => (
            <li key={hit.key}>
              <button
                type="button"
                className="flex min-h-12 w-full flex-wrap items-baseline gap-x-2 rounded-lg border-[1.5px] border-rule bg-sheet px-3 py-2 text-left hover:bg-shoal"
                onClick={() => onChange({ key: hit.key, words: "" })}
              >
                {hit.title} <span className="text-sm text-ink-2">{hit.under}</span>
              </button>
            </li>
          ))}
        </ul>
      )}
      {typed.length > 1 && <p className="text-sm text-ink-2">Choose one, or leave it in your own words as it stands.</p>}
    </div>
  );
}
