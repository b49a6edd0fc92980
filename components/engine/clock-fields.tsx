"use client";

import type { FieldErrors, UseFormRegister } from "react-hook-form";
import { Choice } from "@/components/ui/choice";
import { TextField } from "@/components/ui/text-field";
import type { EngineValues } from "./engine-values";

type Props = { register: UseFormRegister<EngineValues>; errors: FieldErrors<EngineValues>; meter: "yes" | "no" };

const CHOICES = [
  ["yes", "It has an hour meter"],
  ["no", "It has none: hours are estimated, and said to be"],
] as const;

/** The engine's name, and what its hours are counted by. */
export function ClockFields({ register, errors, meter }: Props) {
  return (
    <>
      <TextField
        id="engine-name"
        label="What is it called aboard?"
        hint="“Main engine”, or “port” and “starboard” where there are two: each is an engine of its own."
        maxLength={80}
        autoComplete="off"
        error={errors.name?.message}
        {...register("name")}
      />
      <fieldset>
        <legend className="mb-1 font-semibold">Hours</legend>
        {CHOICES.map(([value, title]) => (
          <Choice key={value} type="radio" value={value} {...register("meter")}>
            {title}
          </Choice>
        ))}
      </fieldset>
      <TextField
        id="hours-per-year"
        label="Hours it runs in a usual year"
        hint={meter === "no" ? "From this its hours are estimated." : "Between readings of the meter, hours are estimated from this."}
        optional={meter === "yes"}
        inputMode="decimal"
        autoComplete="off"
        error={errors.hoursPerYear?.message}
        {...register("hoursPerYear")}
      />
    </>
  );
}
