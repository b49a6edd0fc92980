"use client";

import { useState } from "react";
import type { OutcomeForm } from "@/lib/client/outcome-form";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";

/** What was used up, and so is missing aboard now. */
export function OutcomeParts({ form, change }: { form: OutcomeForm; change: (part: Partial<OutcomeForm>) => void }) {
  const [other, setOther] = useState("");
  const set = (index: number, quantity: number) =>
    change({ parts: form.parts.map((part, at) => (at === index ? { ...part, quantity } : part)) });
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">Parts used</legend>
      <ul className="grid gap-2">
        {form.parts.map((part, index) => (
          <li
            key={`${index} ${part.title}`}
            className="flex flex-wrap items-center justify-between gap-2 rounded-lg border border-rule bg-sheet px-3 py-1"
          >
            <span>{part.title}</span>
            <span className="inline-flex items-center gap-1">
              <Button
                className="min-w-12"
                aria-label={`One less: ${part.title}`}
                disabled={part.quantity === 0}
                onClick={() => set(index, part.quantity - 1)}
              >
                &minus;
              </Button>
              <span className="dial min-w-10 text-center" aria-live="polite">
                {part.quantity}
              </span>
              <Button className="min-w-12" aria-label={`One more: ${part.title}`} onClick={() => set(index, part.quantity + 1)}>
                +
              </Button>
            </span>
          </li>
        ))}
      </ul>
      <div className="mt-2 grid grid-cols-[minmax(0,1fr)_auto] items-end gap-2">
        <TextField
          id="other-part"
          label="Another part"
          optional
          value={other}
          maxLength={200}
          onChange={(event) => setOther(event.target.value)}
        />
        <Button
          disabled={other.trim() === ""}
          onClick={() => {
            change({ parts: [...form.parts, { key: null, title: other.trim(), quantity: 1 }] });
            setOther("");
          }}
        >
          Add
        </Button>
      </div>
    </fieldset>
  );
}
