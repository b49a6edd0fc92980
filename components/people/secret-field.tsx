"use client";

import { clsx } from "clsx";
import { useState } from "react";
import { Field, inputLook } from "@/components/ui/field";

type Props = {
  id: string;
  name: string;
  label: string;
  hint?: string;
  autoComplete: "current-password" | "new-password";
  error?: string | undefined;
};

/** A password; shown while one types, for whoever wants to see it. */
export function SecretField({ id, name, label, hint, autoComplete, error }: Props) {
  const [shown, setShown] = useState(false);
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      {(control) => (
        <span className="relative">
          <input
            type={shown ? "text" : "password"}
            name={name}
            required
            autoComplete={autoComplete}
            autoCapitalize="none"
            spellCheck={false}
            className={clsx(inputLook, "pr-20")}
            {...control}
          />
          <button
            type="button"
            aria-pressed={shown}
            aria-label="Show what is typed"
            onClick={() => setShown(!shown)}
            className="link absolute inset-y-0 right-0 min-w-16 px-3 text-sm"
          >
            {shown ? "Hide" : "Show"}
          </button>
        </span>
      )}
    </Field>
  );
}
