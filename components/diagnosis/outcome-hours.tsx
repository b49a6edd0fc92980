"use client";

import type { OutcomeForm } from "@/lib/client/outcome-form";
import { Checkbox } from "@/components/ui/checkbox";
import { TextField } from "@/components/ui/text-field";
import { useHere } from "./here";

/** The hour meter. Without hours nobody can say whether a fault comes back sooner. */
export function OutcomeHours({
  form,
  change,
  error,
}: {
  form: OutcomeForm;
  change: (part: Partial<OutcomeForm>) => void;
  error: string | undefined;
}) {
  const { engine } = useHere();
  if (!engine.hasHourMeter)
    return (
      <p className="text-sm text-ink-2">
        This engine has no hour meter{engine.hours === null ? "" : `; it is reckoned at about ${Math.round(engine.hours)} h`}.
      </p>
    );
  return (
    <div className="grid gap-1">
      <TextField
        id="hours"
        label="Engine hours now"
        optional
        inputMode="decimal"
        className="dial"
        hint={engine.hours === null ? "As the meter reads." : `Last read: ${engine.hours} h.`}
        value={form.hours}
        error={error}
        onChange={(event) => change({ hours: event.target.value })}
      />
      {(error || form.meterReset) && engine.hours !== null && (
        <Checkbox checked={form.meterReset} onChange={(event) => change({ meterReset: event.target.checked })}>
          The meter was replaced or set back
        </Checkbox>
      )}
    </div>
  );
}
