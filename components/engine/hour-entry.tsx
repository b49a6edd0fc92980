"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useEffect, useState } from "react";
import { useForm } from "react-hook-form";
import { uuidv7 } from "uuidv7";
import * as z from "zod";
import { FormEnd } from "@/components/form/form-end";
import { isAhead, momentOf, today } from "@/components/form/day-typed";
import { typedNumber } from "@/components/form/typed-number";
import { useSave } from "@/components/form/use-save";
import { Choice } from "@/components/ui/choice";
import { Form } from "@/components/ui/form";
import { TextField } from "@/components/ui/text-field";
import { sendJson } from "@/lib/client/exchange/request";

const Values = z.object({
  reading: typedNumber({ from: 0, to: 200_000 }).refine((n) => n !== null, "Write what the meter shows."),
  day: z
    .string()
    .min(1, "Say which day.")
    .refine((day) => !isAhead(day), "That day is still to come."),
  reset: z.boolean(),
});
type Values = z.input<typeof Values>;

/** What the hour meter shows, written down with one field and one button. */
export function HourEntry({ fleetId, engineId }: { fleetId: string; engineId: string }) {
  const router = useRouter();
  const [saved, setSaved] = useState(false);
  const { saving, refusal, save } = useSave();
  const fresh = (): Values => ({ reading: "", day: today(), reset: false });
  const form = useForm({ resolver: zodResolver(Values), defaultValues: { reading: "", day: "", reset: false } });
  // Only the browser knows which day it is where the engine is.
  const { setValue } = form;
  useEffect(() => setValue("day", today()), [setValue]);
  const submit = form.handleSubmit(async ({ reading, day, reset }) => {
    setSaved(false);
    const outcome = await save(() =>
      sendJson(`/api/v1/fleets/${fleetId}/engines/${engineId}/hours`, { id: uuidv7(), engineId, reading, readAt: momentOf(day), reset }),
    );
    if (!("answer" in outcome)) return;
    form.reset(fresh());
    setSaved(true);
    router.refresh();
  });
  const { errors } = form.formState;
  const says = refusal?.errors.find(({ path }) => path === "reading")?.says;
  return (
    <Form className="grid gap-4" onSubmit={submit}>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          id="reading"
          label="The meter shows, in hours"
          inputMode="decimal"
          autoComplete="off"
          error={errors.reading?.message ?? says}
          {...form.register("reading")}
        />
        <TextField
          id="read-on"
          type="date"
          label="Read on"
          max={today()}
          suppressHydrationWarning
          error={errors.day?.message}
          {...form.register("day")}
        />
      </div>
      <Choice {...form.register("reset")}>The meter was replaced or set back since the last reading</Choice>
      <FormEnd submit="Write it down" saving={saving} refusal={says ? null : refusal} done={saved && "Written down."} />
    </Form>
  );
}
