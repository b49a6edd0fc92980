"use client";

import { useState } from "react";
import { Field, inputLook } from "@/components/ui/field";
import { FindingLink, type FindingLink as Link } from "@/lib/core/tree/finding-link";
import { STRENGTHS } from "@/lib/core/tree/strength";

type Props = { id: string; label: string; value: Link; onChange: (value: Link) => void; factors: boolean };

const FACTORS = ["x60", "x20", "x5", "x1/3", "x1/10", "x1/50"] as const;

/** How often: a word of the scale, a share, or (for findings) times the odds of a sound engine. Other figures can be typed. */
export function StrengthValue({ id, label, value, onChange, factors }: Props) {
  const [typed, setTyped] = useState<string | null>(null);
  const listed = value in STRENGTHS || (factors && FACTORS.some((one) => one === value));
  const other = typed !== null || !listed;
  const read = typed === null ? null : readStrength(typed, factors);
  return (
    <Field
      id={id}
      label={<span className="visually-hidden">{label}</span>}
      error={typed !== null && read === null ? wants(factors) : undefined}
    >
      {(control) => (
        <div className="flex gap-1">
          <select
            className={inputLook}
            {...control}
            value={other ? "other" : value}
            onChange={(event) => {
              if (event.target.value === "other") return setTyped(String(value));
              setTyped(null);
              onChange(event.target.value as Link);
            }}
          >
            {Object.entries(STRENGTHS).map(([word, share]) => (
              <option key={word} value={word}>
                {word} ({share})
              </option>
            ))}
            {factors &&
              FACTORS.map((factor) => (
                <option key={factor} value={factor}>
                  {factor.slice(1)} times as often as sound
                </option>
              ))}
            <option value="other">a figure</option>
          </select>
          {other && (
            <input
              aria-label={`${label}: figure`}
              className={`${inputLook} dial max-w-24`}
              value={typed ?? String(value)}
              onChange={(event) => {
                setTyped(event.target.value);
                const link = readStrength(event.target.value, factors);
                if (link !== null) onChange(link);
              }}
            />
          )}
        </div>
      )}
    </Field>
  );
}

/** "0.4", "0,4", "x20"; null: neither. */
function readStrength(text: string, factors: boolean): Link | null {
  const plain = text.trim().replace(",", ".");
  const parsed = FindingLink.safeParse(plain.startsWith("x") ? plain : Number(plain));
  if (!parsed.success || plain === "" || (!factors && typeof parsed.data === "string" && parsed.data.startsWith("x"))) return null;
  return parsed.data;
}

const wants = (factors: boolean): string =>
  factors ? "A share between 0 and 1, or times as often: x20, x1/3." : "A share between 0 and 1.";
