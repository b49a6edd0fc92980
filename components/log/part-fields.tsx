"use client";

import { useFieldArray, type Control, type UseFormRegister } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { RepairGiven, RepairValues } from "./repair-values";

type Props = {
  control: Control<RepairValues, unknown, RepairGiven>;
  register: UseFormRegister<RepairValues>;
  /** By the place in the list: what is wrong with its quantity. */ wrong: (index: number) => string | undefined;
};

/** What was used up. */
export function PartFields({ control, register, wrong }: Props) {
  const { fields, append, remove } = useFieldArray({ control, name: "parts" });
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1 font-semibold">
        Parts used <span className="font-normal text-ink-2">(optional)</span>
      </legend>
      {fields.map((field, i) => (
        <div key={field.id} className="grid grid-cols-[minmax(0,1fr)_5rem_auto] items-end gap-2">
          <TextField id={`part-${i}`} label={`Part ${i + 1}`} maxLength={200} autoComplete="off" {...register(`parts.${i}.title`)} />
          <TextField id={`part-quantity-${i}`} label="How many" inputMode="decimal" error={wrong(i)} {...register(`parts.${i}.quantity`)} />
          <Button aria-label={`Take part ${i + 1} off`} onClick={() => remove(i)}>
            &minus;
          </Button>
        </div>
      ))}
      <div>
        <Button onClick={() => append({ key: "", title: "", quantity: "1" })}>Add a part</Button>
      </div>
    </fieldset>
  );
}
