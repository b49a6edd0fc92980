"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useEffect, useState } from "react";
import { useForm } from "react-hook-form";
import { uuidv7 } from "uuidv7";
import * as z from "zod";
import { CorrectedMeanwhile } from "@/components/form/corrected-meanwhile";
import { FormEnd } from "@/components/form/form-end";
import { dayOf, isAhead, momentOf, today } from "@/components/form/day-typed";
import { asTyped, typedNumber } from "@/components/form/typed-number";
import { useSave } from "@/components/form/use-save";
import { Choice } from "@/components/ui/choice";
import { Form } from "@/components/ui/form";
import { TextField } from "@/components/ui/text-field";
import { sendJson } from "@/lib/client/exchange/request";
import type { Reading } from "@/lib/core/contract/engine";

const Values = z.object({
  reading: typedNumber({ from: 0, to: 200_000 }).refine((n) => n !== null, "Write what the meter shows."),
  day: z
    .string()
    .min(1, "Say which day.")
    .refine((day) => !isAhead(day), "That day is still to come."),
  reset: z.boolean(),
});
type Values = z.input<typeof Values>;

type Props = { fleetId: string; engineId: string; /** A reading that was written down already, to be corrected. */ standing?: Reading };

/** What the hour meter shows, written down with one field and one button; or a correction of it. */
export function HourEntry({ fleetId, engineId, standing }: Props) {
  const router = useRouter();
  const [saved, setSaved] = useState(false);
  const { saving, refusal, save } = useSave();
  const fresh = (): Values =>
    standing
      ? { reading: asTyped(standing.reading), day: dayOf(standing.readAt), reset: standing.reset }
      : { reading: "", day: today(), reset: false };
  const form = useForm({ resolver: zodResolver(Values), defaultValues: { ...fresh(), day: "" } });
  // Only the browser knows which day it is where the engine is.
  const { setValue } = form;
  const readAt = standing?.readAt;
  useEffect(() => setValue("day", readAt ? dayOf(readAt) : today()), [setValue, readAt]);
  const submit = form.handleSubmit(async ({ reading, day, reset }) => {
    setSaved(false);
    const hours = `/api/v1/fleets/${fleetId}/engines/${engineId}/hours`;
    const said = { reading, readAt: readAt && day === dayOf(readAt) ? readAt : momentOf(day), reset };
    const outcome = await save(() =>
      standing
        ? sendJson(`${hours}/${standing.id}`, said, { method: "PUT", version: standing.version })
        : sendJson(hours, { id: uuidv7(), engineId, ...said }),
    );
    if (!("answer" in outcome)) return;
    if (!standing) form.reset(fresh());
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
      <CorrectedMeanwhile refusal={refusal} />
      <FormEnd
        submit={standing ? "Correct it" : "Write it down"}
        saving={saving}
        refusal={says ? null : refusal}
        done={saved && (standing ? "Corrected." : "Written down.")}
      />
    </Form>
  );
}
