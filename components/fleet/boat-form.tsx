"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm } from "react-hook-form";
import { FormEnd } from "@/components/form/form-end";
import { Form } from "@/components/ui/form";
import { StaleNotice } from "@/components/form/stale-notice";
import { useChange } from "@/components/form/use-change";
import { sendJson } from "@/lib/client/exchange/request";
import { Boat } from "@/lib/core/contract/engine";
import { BoatFields } from "./boat-fields";
import { boatLines, BoatValues, boatValues } from "./boat-values";

/** The boat's name and what help costs where it lies. */
export function BoatForm({ fleetId, boat }: { fleetId: string; boat: Boat }) {
  const router = useRouter();
  const form = useForm({ resolver: zodResolver(BoatValues), defaultValues: boatValues(boat) });
  const { saving, refusal, saved, base, theirs, submit, keepMine, takeTheirs } = useChange({
    form,
    start: { values: boatValues(boat), version: boat.version },
    send: (change, version) => sendJson(`/api/v1/fleets/${fleetId}/boats/${boat.id}`, change, { method: "PATCH", version }),
    read: (thing) => {
      const now = Boat.parse(thing);
      return { values: boatValues(now), version: now.version };
    },
    onSaved: () => router.refresh(),
  });
  return (
    <Form className="grid gap-5" onSubmit={submit}>
      <BoatFields register={form.register} errors={form.formState.errors} />
      {theirs && (
        <StaleNotice
          was={boatLines(base.values)}
          theirs={boatLines(theirs.values)}
          mine={boatLines(form.getValues())}
          onKeep={keepMine}
          onTake={takeTheirs}
          saving={saving}
        />
      )}
      <FormEnd submit="Save" saving={saving} refusal={refusal} done={saved && !form.formState.isDirty && "Saved."} />
    </Form>
  );
}
