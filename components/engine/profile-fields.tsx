"use client";

import type { FieldErrors, UseFormRegister } from "react-hook-form";
import { Select } from "@/components/ui/select";
import { TextField } from "@/components/ui/text-field";
import type { Feature } from "@/lib/core/tree/schema";
import type { EngineValues } from "./engine-values";
import { FigureField } from "./figure-field";
import { FIGURES, HEALTHY } from "./figures";

type Props = { features: readonly Feature[]; register: UseFormRegister<EngineValues>; errors: FieldErrors<EngineValues> };

const twoColumns = "grid items-end gap-x-5 gap-y-4 md:grid-cols-2";

/** What the engine is. Nothing here has to be known; each answer saves a question or makes one sharper. */
export function ProfileFields({ features, register, errors }: Props) {
  return (
    <>
      <fieldset>
        <legend className="text-xl font-bold">What it has</legend>
        <p className="mb-4 text-sm text-ink-2">
          Leave at “Don’t know” what you are not sure of: the checks are then put so that both are allowed for.
        </p>
        <div className={twoColumns}>
          {features.map((feature) => (
            <Select
              key={feature.key}
              id={`feature-${feature.key}`}
              label={feature.ask}
              hint={feature.howToTell}
              options={[
                { value: "", title: "Don’t know" },
                ...feature.options.map((option) => ({ value: option.key, title: option.title })),
              ]}
              {...register(`features.${feature.key}`)}
            />
          ))}
        </div>
      </fieldset>
      <fieldset>
        <legend className="text-xl font-bold">The maker’s figures</legend>
        <p className="mb-4 text-sm text-ink-2">
          From the plate or the manual. A reading is then held against them and not against a guess.
        </p>
        <div className={twoColumns}>
          <TextField
            id="cylinders"
            label="Cylinders"
            inputMode="numeric"
            autoComplete="off"
            error={errors.cylinders?.message}
            {...register("cylinders")}
          />
          <TextField
            id="rated-kw"
            label="Power, kW"
            hint="1 hp is 0.75 kW."
            inputMode="decimal"
            autoComplete="off"
            error={errors.ratedKw?.message}
            {...register("ratedKw")}
          />
          {FIGURES.map((asked) => (
            <FigureField
              key={asked.key}
              asked={asked}
              at="figures"
              register={register}
              error={errors.figures?.[asked.key]?.typed?.message}
            />
          ))}
        </div>
      </fieldset>
      <fieldset>
        <legend className="text-xl font-bold">Its own readings when it is well</legend>
        <p className="mb-4 text-sm text-ink-2">Taken on a good day, they are the best thing to compare with on a bad one.</p>
        <div className={twoColumns}>
          {HEALTHY.map((asked) => (
            <FigureField
              key={asked.key}
              asked={asked}
              at="healthy"
              register={register}
              error={errors.healthy?.[asked.key]?.typed?.message}
            />
          ))}
        </div>
      </fieldset>
      <fieldset>
        <legend className="mb-3 text-xl font-bold">For ordering parts</legend>
        <div className={twoColumns}>
          <TextField id="maker" label="Maker" maxLength={80} autoComplete="off" error={errors.maker?.message} {...register("maker")} />
          <TextField id="model" label="Model" maxLength={80} autoComplete="off" error={errors.model?.message} {...register("model")} />
          <TextField
            id="serial-number"
            label="Serial number"
            maxLength={80}
            autoComplete="off"
            error={errors.serialNumber?.message}
            {...register("serialNumber")}
          />
        </div>
      </fieldset>
    </>
  );
}
