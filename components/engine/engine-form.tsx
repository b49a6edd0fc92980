"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm, useWatch } from "react-hook-form";
import { FormEnd } from "@/components/form/form-end";
import { Form } from "@/components/ui/form";
import { StaleNotice } from "@/components/form/stale-notice";
import { useChange } from "@/components/form/use-change";
import { sendJson } from "@/lib/client/exchange/request";
import { Engine } from "@/lib/core/contract/engine";
import type { Feature } from "@/lib/core/tree/schema";
import { ClockFields } from "./clock-fields";
import { engineLines } from "./engine-lines";
import { EngineValues, engineValues } from "./engine-values";
import { ProfileFields } from "./profile-fields";

type Props = { fleetId: string; engine: Engine; features: readonly Feature[] };

/** An engine's profile, changed against the version that was seen. */
export function EngineForm({ fleetId, engine, features }: Props) {
  const router = useRouter();
  const form = useForm({ resolver: zodResolver(EngineValues), defaultValues: engineValues(engine, features) });
  const meter = useWatch({ control: form.control, name: "meter" });
  const { saving, refusal, saved, base, theirs, submit, keepMine, takeTheirs } = useChange({
    form,
    start: { values: engineValues(engine, features), version: engine.version },
    send: (change, version) => sendJson(`/api/v1/fleets/${fleetId}/engines/${engine.id}`, change, { method: "PATCH", version }),
    read: (thing) => {
      const now = Engine.parse(thing);
      return { values: engineValues(now, features), version: now.version };
    },
    onSaved: () => router.refresh(),
  });
  const { errors, isDirty } = form.formState;
  return (
    <Form className="grid max-w-4xl gap-7" onSubmit={submit}>
      <div className="grid max-w-xl gap-5">
        <ClockFields register={form.register} errors={errors} meter={meter} />
      </div>
      <ProfileFields features={features} register={form.register} errors={errors} />
      {theirs && (
        <StaleNotice
          was={engineLines(base.values, features)}
          theirs={engineLines(theirs.values, features)}
          mine={engineLines(form.getValues(), features)}
          onKeep={keepMine}
          onTake={takeTheirs}
          saving={saving}
        />
      )}
      <FormEnd
        submit="Save"
        saving={saving}
        refusal={refusal}
        wrong={Object.keys(errors).length > 0}
        done={saved && !isDirty && "Saved. Diagnoses that are under way keep the profile they began with."}
      />
    </Form>
  );
}
