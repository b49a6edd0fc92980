"use client";

import type { FieldErrors, UseFormRegister } from "react-hook-form";
import { TextField } from "@/components/ui/text-field";
import { durationInWords } from "@/lib/client/duration";
import { COSTS } from "@/lib/core/diagnosis/costs";
import type { BoatValues } from "./boat-values";

type Props = { register: UseFormRegister<BoatValues>; errors: FieldErrors<BoatValues> };

/** What is reckoned with where nothing is said. */
const usual = (where: keyof typeof COSTS.call): string => durationInWords(COSTS.call[where]);

const CALLS = [
  ["alongside", "Alongside"],
  ["atAnchor", "At anchor"],
  ["underWay", "Under way"],
] as const;

export function BoatFields({ register, errors }: Props) {
  return (
    <>
      <TextField
        id="boat-name"
        label="Name of the boat"
        maxLength={80}
        autoComplete="off"
        error={errors.name?.message}
        {...register("name")}
      />
      <fieldset className="grid gap-3">
        <legend className="font-semibold">
          How long until help is at the engine? <span className="font-normal text-ink-2">(optional)</span>
        </legend>
        <p className="text-sm text-ink-2">
          The longer help takes, the more is tried aboard before it is called. Left open, these count: {usual("alongside")} alongside,{" "}
          {usual("at-anchor")} at anchor, {usual("under-way")} under way.
        </p>
        <div className="grid gap-3 sm:grid-cols-3">
          {CALLS.map(([name, title]) => (
            <TextField
              key={name}
              id={`call-${name}`}
              label={`${title}, min`}
              inputMode="decimal"
              autoComplete="off"
              error={errors[name]?.message}
              {...register(name)}
            />
          ))}
        </div>
      </fieldset>
    </>
  );
}
