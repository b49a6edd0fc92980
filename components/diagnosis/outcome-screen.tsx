"use client";

import { useState } from "react";
import type { OutcomeKind } from "@/lib/core/contract/event";
import { minutesBetween } from "@/lib/client/duration";
import { basisOf, FOLLOWS_THE_CURE, outcomeOf, startingForm, type FormErrors, type OutcomeForm } from "@/lib/client/outcome-form";
import { useGuard } from "@/lib/client/screen/use-guard";
import { useKeptForm } from "@/lib/client/screen/use-kept-form";
import { Button } from "@/components/ui/button";
import { Form } from "@/components/ui/form";
import { TextArea } from "@/components/ui/text-area";
import { TextField } from "@/components/ui/text-field";
import { BackLink } from "./back-link";
import { useHere } from "./here";
import { OutcomeCause } from "./outcome-cause";
import { OutcomeHours } from "./outcome-hours";
import { OutcomeParts } from "./outcome-parts";
import { RadioRows } from "./radio-rows";
import { ScreenHeading } from "./screen-heading";

const KINDS: readonly { value: OutcomeKind; title: string; detail: string }[] = [
  { value: "cured", title: "Cured", detail: "The cause was put right and that was proved" },
  { value: "held", title: "Held for now", detail: "A temporary repair, or not proved yet" },
  { value: "by-itself", title: "It runs again by itself", detail: "Nothing was found" },
  { value: "handed-over", title: "Handed over", detail: "Help was called" },
  { value: "broken-off", title: "Broken off", detail: "Given up for now" },
];

/** What it was, what put it right, at which hours. It waits for the view: what was cured a moment ago is filled in. */
export function OutcomeScreen() {
  const { thinking } = useHere();
  if (thinking) return <p role="status">Filling in what is known.</p>;
  return <FilledIn />;
}

function FilledIn() {
  const { view, tree, engine, summary, record, go } = useHere();
  const [form, change, drop] = useKeptForm<OutcomeForm>(
    `gudgeon.outcome.${summary.id}`,
    () => startingForm(view, tree, minutesBetween(summary.beganAt, Date.now())),
    { basis: basisOf(view), fields: FOLLOWS_THE_CURE },
  );
  const [errors, setErrors] = useState<FormErrors>({});
  const guard = useGuard();
  const give = () =>
    guard("log it", () => {
      const read = outcomeOf(form, engine.hoursAreEstimated ? null : engine.hours);
      if ("errors" in read) return setErrors(read.errors);
      setErrors({});
      void record("ended", read.outcome).then(() => {
        drop();
        go("ended", undefined, "replace");
      });
    });
  const wrong = Object.values(errors);
  return (
    <>
      <BackLink />
      <ScreenHeading of="outcome">How did it end?</ScreenHeading>
      <Form
        className="mt-3 grid gap-5"
        onSubmit={(event) => {
          event.preventDefault();
          give();
        }}
      >
        <RadioRows name="outcome" legend="Outcome" options={KINDS} value={form.outcome} onChange={(outcome) => change({ outcome })} />
        <OutcomeCause form={form} change={change} error={errors.cause} />
        {(form.outcome === "cured" || form.outcome === "held") && (
          <TextArea
            id="proof"
            label="How was it proved?"
            optional={form.outcome === "held"}
            rows={2}
            maxLength={500}
            value={form.proof}
            error={errors.proof}
            onChange={(event) => change({ proof: event.target.value })}
          />
        )}
        <OutcomeHours form={form} change={change} error={errors.hours} />
        <TextField
          id="minutes"
          label="Minutes it took"
          inputMode="numeric"
          className="dial"
          value={form.minutes}
          error={errors.minutes}
          onChange={(event) => change({ minutes: event.target.value })}
        />
        <OutcomeParts form={form} change={change} />
        <TextArea
          id="outcome-note"
          label="Note"
          optional
          value={form.note}
          maxLength={4000}
          onChange={(event) => change({ note: event.target.value })}
        />
        {wrong.length > 0 && (
          <p role="alert" className="font-semibold text-lead">
            {wrong.join(" ")}
          </p>
        )}
        <Button type="submit" tone="strong" size="large" wide>
          Log it
        </Button>
      </Form>
    </>
  );
}
