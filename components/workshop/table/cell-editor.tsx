"use client";

import { useEffect, useId, useRef, useState } from "react";
import { STRENGTHS } from "@/lib/core/tree/strength";

type Props = {
  label: string;
  begin: string;
  /** null: left as it was. False: what was typed is no strength, and stays. */
  onEnd: (text: string | null, then: { row: number; column: number }) => boolean;
};

/** The cell while it is typed into: words of the scale are offered. */
export function CellEditor({ label, begin, onEnd }: Props) {
  const [text, setText] = useState(begin);
  const [wrong, setWrong] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  const words = useId();
  useEffect(() => input.current?.focus(), []);
  // Ending moves on to a cell, and with that the field loses the focus: that is not a second ending.
  const ended = useRef(false);
  const end = (typed: string | null, then: { row: number; column: number }) => {
    if (ended.current) return;
    ended.current = true;
    ended.current = onEnd(typed, then);
    setWrong(!ended.current);
  };
  return (
    <>
      <input
        ref={input}
        list={words}
        aria-label={label}
        aria-invalid={wrong || undefined}
        title={wrong ? "A word of the scale, a share such as 0.4, or x20, x1/3." : undefined}
        className="w-28 rounded border-[1.5px] border-edge bg-sheet px-1 aria-invalid:border-lead"
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          setWrong(false);
        }}
        onBlur={() => end(text, { row: 0, column: 0 })}
        onKeyDown={(event) => {
          event.stopPropagation();
          if (event.key === "Escape") end(null, { row: 0, column: 0 });
          else if (event.key === "Enter") end(text, { row: 1, column: 0 });
          else if (event.key === "Tab") {
            event.preventDefault();
            end(text, { row: 0, column: event.shiftKey ? -1 : 1 });
          }
        }}
      />
      <datalist id={words}>
        {Object.keys(STRENGTHS).map((word) => (
          <option key={word} value={word} />
        ))}
      </datalist>
    </>
  );
}
