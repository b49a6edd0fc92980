"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { uuidv7 } from "uuidv7";
import { CorrectedMeanwhile } from "@/components/form/corrected-meanwhile";
import { FormEnd } from "@/components/form/form-end";
import { useSave } from "@/components/form/use-save";
import { Choice } from "@/components/ui/choice";
import { Form } from "@/components/ui/form";
import { Segmented } from "@/components/ui/segmented";
import { Select } from "@/components/ui/select";
import { TextArea } from "@/components/ui/text-area";
import { TextField } from "@/components/ui/text-field";
import { sendJson } from "@/lib/client/exchange/request";
import type { Repair } from "@/lib/core/contract/log";
import { PartFields } from "./part-fields";
import { PickOrSay, type Said } from "@/components/form/pick-or-say";
import type { RepairChoices } from "./repair-choices";
import { newRepair, NO_REPAIR, repairChange, RepairValues, valuesOf } from "./repair-values";

type Props = {
  fleetId: string;
  engineId: string;
  hasHourMeter: boolean;
  choices: RepairChoices;
  /** A repair that stands in the log already, to be corrected. */ standing?: Repair;
};

const OUTCOMES = [
  { value: "cured", title: "Cured" },
  { value: "held", title: "Held for now" },
] as const;

/** A repair that was done without a diagnosis, or a line of an old notebook; or the correction of one. */
export function RepairForm({ fleetId, engineId, hasHourMeter, choices, standing }: Props) {
  const router = useRouter();
  // Made once: sent twice, it is one line of the log.
  const [id] = useState(() => uuidv7());
  const { saving, refusal, save } = useSave();
  const form = useForm({ resolver: zodResolver(RepairValues), defaultValues: standing ? valuesOf(standing) : NO_REPAIR });
  const { register, control, setValue } = form;
  const { errors } = form.formState;
  const [cause, remedy, outcome] = useWatch({ control, name: ["cause", "remedy", "outcome"] });
  const known = choices.remedies.find(({ key }) => key === remedy.key);
  const pickRemedy = (said: Said) => {
    setValue("remedy", said, { shouldDirty: true, shouldValidate: form.formState.isSubmitted });
    const picked = choices.remedies.find(({ key }) => key === said.key);
    if (!picked) return;
    if (picked.temporary) setValue("outcome", "held");
    if (form.getValues("parts").every(({ title }) => title === "")) {
      setValue(
        "parts",
        picked.parts.map((part) => ({ ...part, quantity: String(part.quantity) })),
      );
    }
  };
  const submit = form.handleSubmit(async (given) => {
    const engine = `/api/v1/fleets/${fleetId}/engines/${engineId}`;
    const result = await save(() =>
      standing
        ? sendJson(`${engine}/repairs/${standing.entry.id}`, repairChange(standing, given), { method: "PUT", version: standing.version })
        : sendJson(`${engine}/repairs`, newRepair(id, engineId, given)),
    );
    if (!("answer" in result)) return;
    router.push(`/f/${fleetId}/engines/${engineId}`);
    router.refresh();
  });
  const hoursSay = refusal?.errors.find(({ path }) => path === "engineHours")?.says;
  return (
    <Form className="grid max-w-2xl gap-5" onSubmit={submit}>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField id="day" type="date" label="Done on" error={errors.day?.message} {...register("day")} />
        {hasHourMeter && (
          <TextField
            id="hours"
            label="The meter showed, in hours"
            optional
            inputMode="decimal"
            autoComplete="off"
            error={errors.hours?.message ?? hoursSay}
            {...register("hours")}
          />
        )}
      </div>
      {hoursSay && <Choice {...register("meterReset")}>The meter was replaced or set back</Choice>}
      <Select
        id="symptom"
        label="What was noticed?"
        optional
        options={[{ value: "", title: "Not said" }, ...choices.symptoms.map(({ key, title }) => ({ value: key, title }))]}
        {...register("symptom")}
      />
      <PickOrSay
        id="cause"
        label="What was wrong?"
        hint="A word or two finds it in the fault tree, so that it is seen when it comes back."
        options={choices.causes}
        value={cause}
        onChange={(said) => setValue("cause", said, { shouldDirty: true, shouldValidate: form.formState.isSubmitted })}
        error={errors.cause?.message}
      />
      <PickOrSay
        id="remedy"
        label="What was done?"
        hint="Found the same way, or in your own words."
        options={choices.remedies}
        suggested={choices.causes.find(({ key }) => key === cause.key)?.curedBy ?? []}
        value={remedy}
        onChange={pickRemedy}
        error={errors.remedy?.message}
      />
      <Segmented
        name="outcome"
        legend="How it stands"
        options={OUTCOMES}
        value={outcome}
        onChange={(value) => setValue("outcome", value)}
      />
      <TextField
        id="proof"
        label="How was it proved?"
        hint={known ? known.proof : "A cure that was not proved counts for less when the fault comes back."}
        optional={outcome === "held"}
        maxLength={500}
        autoComplete="off"
        error={errors.proof?.message}
        {...register("proof")}
      />
      <TextField
        id="minutes"
        label="Minutes it took"
        optional
        inputMode="decimal"
        autoComplete="off"
        error={errors.minutes?.message}
        {...register("minutes")}
      />
      <PartFields control={control} register={register} wrong={(i) => errors.parts?.[i]?.quantity?.message} />
      <TextArea id="note" label="Note" optional maxLength={4000} error={errors.note?.message} {...register("note")} />
      <CorrectedMeanwhile refusal={refusal} />
      <FormEnd
        submit={standing ? "Correct it" : "Write it into the log"}
        saving={saving}
        refusal={hoursSay ? null : refusal}
        wrong={Object.keys(errors).length > 0}
      />
    </Form>
  );
}
