"use client";

import type { FieldErrors, UseFormRegister } from "react-hook-form";
import { TextField } from "@/components/ui/text-field";
import type { BoatValues } from "./boat-values";

type Props = { register: UseFormRegister<BoatValues>; errors: FieldErrors<BoatValues> };

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
        <legend className="font-semibold">What a call for help costs here</legend>
        <p className="text-sm text-ink-2">
          In minutes of waiting and trouble. The longer it is, the more is tried aboard before help is called. Leave it open for the usual
          figures.
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
