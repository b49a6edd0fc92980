"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { uuidv7 } from "uuidv7";
import { FormEnd } from "@/components/form/form-end";
import { Form } from "@/components/ui/form";
import { useSave } from "@/components/form/use-save";
import { sendJson } from "@/lib/client/exchange/request";
import { BoatFields } from "./boat-fields";
import { BoatValues, boatValues } from "./boat-values";

/** A new boat; then on to its engine. */
export function NewBoatForm({ fleetId }: { fleetId: string }) {
  const router = useRouter();
  // Made once: sent twice, it is one boat.
  const [id] = useState(() => uuidv7());
  const { saving, refusal, save } = useSave();
  const form = useForm({ resolver: zodResolver(BoatValues), defaultValues: boatValues(null) });
  const submit = form.handleSubmit(async (boat) => {
    const outcome = await save(() => sendJson(`/api/v1/fleets/${fleetId}/boats`, { id, ...boat }));
    if ("answer" in outcome) router.push(`/f/${fleetId}/boats/${id}/engines/new`);
  });
  return (
    <Form className="grid max-w-2xl gap-5" onSubmit={submit}>
      <BoatFields register={form.register} errors={form.formState.errors} />
      <FormEnd submit="Add the boat" saving={saving} refusal={refusal} wrong={!form.formState.isValid && form.formState.isSubmitted} />
    </Form>
  );
}
