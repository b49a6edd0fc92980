"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { uuidv7 } from "uuidv7";
import * as z from "zod";
import { FormEnd } from "@/components/form/form-end";
import { typedNumber } from "@/components/form/typed-number";
import { useSave } from "@/components/form/use-save";
import { Button } from "@/components/ui/button";
import { Fold } from "@/components/ui/fold";
import { Form } from "@/components/ui/form";
import { TextField } from "@/components/ui/text-field";
import { sendJson } from "@/lib/client/exchange/request";
import type { Feature } from "@/lib/core/tree/schema";
import { ClockFields } from "./clock-fields";
import { EngineValues, engineValues, NOTHING_KNOWN } from "./engine-values";
import { ProfileFields } from "./profile-fields";

type Props = {
  fleetId: string;
  boatId: string;
  suggestedName: string;
  /** The boat has none yet: it may be one of twins. */ first: boolean;
  features: readonly Feature[];
};

const ANOTHER = "another";
const Reading = z.object({ reading: typedNumber({ from: 0, to: 200_000 }) });
const FormValues = z.intersection(EngineValues, Reading);

/** A new engine. Its name is enough to begin; the profile can wait. */
export function NewEngineForm({ fleetId, boatId, suggestedName, first, features }: Props) {
  const router = useRouter();
  // Made once: sent twice, it is one engine with one reading.
  const [{ id, readingId }] = useState(() => ({ id: uuidv7(), readingId: uuidv7() }));
  const { saving, refusal, save } = useSave();
  const form = useForm({
    resolver: zodResolver(FormValues),
    defaultValues: { ...engineValues({ ...NOTHING_KNOWN, name: suggestedName }, features), reading: "" },
  });
  const meter = useWatch({ control: form.control, name: "meter" });
  const { errors } = form.formState;
  const submit = form.handleSubmit(async ({ name, hasHourMeter, estimatedHoursPerYear, profile, reading }, event) => {
    const engines = `/api/v1/fleets/${fleetId}/engines`;
    const outcome = await save(async () => {
      const hoursAYear = estimatedHoursPerYear === null ? {} : { estimatedHoursPerYear };
      await sendJson(engines, { id, boatId, name, hasHourMeter, ...hoursAYear, profile });
      if (hasHourMeter && reading !== null) {
        await sendJson(`${engines}/${id}/hours`, { id: readingId, engineId: id, reading, readAt: new Date().toISOString() });
      }
    });
    if ("answer" in outcome) {
      const pressed = (event?.nativeEvent as SubmitEvent | undefined)?.submitter?.getAttribute("name");
      router.push(pressed === ANOTHER ? `/f/${fleetId}/boats/${boatId}/engines/new` : `/f/${fleetId}/engines/${id}`);
      return router.refresh();
    }
    const named = outcome.refusal.errors.find(({ path }) => path === "name");
    if (named) form.setError("name", { message: named.says }, { shouldFocus: true });
  });
  // The shared fields know the engine's part of the form; the reading is this form's own.
  const register = form.register as unknown as Parameters<typeof ClockFields>[0]["register"];
  return (
    <Form className="grid max-w-4xl gap-6" onSubmit={submit}>
      <div className="grid max-w-xl gap-5">
        <ClockFields register={register} errors={errors} meter={meter} />
        {meter === "yes" && (
          <TextField
            id="first-reading"
            label="What does the meter show now, in hours?"
            optional
            inputMode="decimal"
            autoComplete="off"
            error={errors.reading?.message}
            {...form.register("reading")}
          />
        )}
      </div>
      <Fold
        title="Say more about it now (it can wait)"
        open={Boolean(errors.figures || errors.healthy || errors.cylinders || errors.ratedKw) || undefined}
      >
        <div className="mt-3 grid gap-7">
          <ProfileFields features={features} register={register} errors={errors} />
        </div>
      </Fold>
      <FormEnd
        submit="Add the engine"
        saving={saving}
        refusal={errors.name ? null : refusal}
        wrong={Object.keys(errors).length > 0}
        also={
          first && (
            <Button type="submit" name={ANOTHER} disabled={saving}>
              Add it, then the other one
            </Button>
          )
        }
      />
    </Form>
  );
}
