"use client";

import { useState } from "react";
import { figure, readGauge } from "@/lib/client/read-gauge";
import type { StepShown } from "@/lib/core/diagnosis/view";
import { unitSign } from "@/lib/core/units/unit-sign";
import { unitsOf } from "@/lib/core/units/units";
import { Button } from "@/components/ui/button";
import { Form } from "@/components/ui/form";
import { inputLook } from "@/components/ui/field";

/** A reading as it is typed; an empty unit is the scale's own. */
export type Typed = { typed: string; unit: string };

type Props = {
  of: string;
  scale: NonNullable<StepShown["reading"]>;
  /** What is typed so far, and how it is changed. */
  kept: readonly [Typed, (part: Partial<Typed>) => void];
  given: boolean;
  onRead: (value: number, unit: string, says: string) => void;
};

/** A figure with its unit. What it means is shown before it is given, so that a wrong unit is seen. */
export function ReadingAnswer({ of, scale, kept, given, onRead }: Props) {
  const [{ typed, unit: picked }, change] = kept;
  const [tried, setTried] = useState(false);
  const units = unitsOf(scale.quantity);
  const unit = units.some(({ symbol }) => symbol === picked) ? picked : scale.unit;
  const read = readGauge(typed, unit, scale);
  const wrong = read && "wrong" in read ? read.wrong : null;
  const good = read && "band" in read ? read : null;
  const id = `reading-${of}`;
  return (
    <Form
      onSubmit={(event) => {
        event.preventDefault();
        setTried(true);
        if (good) onRead(good.value, unit, `${figure(good.value)} ${unitSign(unit)}`);
      }}
    >
      <div className="grid grid-cols-[minmax(0,1fr)_minmax(0,7rem)] gap-2">
        <label className="grid gap-1 text-sm font-semibold">
          Reading
          <input
            id={id}
            inputMode={scale.from < 0 ? "text" : "decimal"}
            autoComplete="off"
            value={typed}
            onChange={(event) => change({ typed: event.target.value })}
            aria-invalid={wrong !== null || undefined}
            aria-describedby={`${id}-means`}
            className={`${inputLook} dial min-h-16 text-xl`}
          />
        </label>
        <label className="grid gap-1 text-sm font-semibold">
          Unit
          <select value={unit} onChange={(event) => change({ unit: event.target.value })} className={`${inputLook} min-h-16`}>
            {units.map(({ symbol, title }) => (
              <option key={symbol} value={symbol} title={title}>
                {unitSign(symbol)}
              </option>
            ))}
          </select>
        </label>
      </div>
      <p id={`${id}-means`} aria-live="polite" className={wrong ? "my-2 font-semibold text-lead" : "my-2 text-sm"}>
        {wrong ??
          (good ? (
            <Means inUnit={good.inUnit} unit={unit} scale={scale} band={good.band.title} />
          ) : tried ? (
            "Type the figure first."
          ) : (
            `Scale: ${figure(scale.from)} to ${figure(scale.to)} ${unitSign(scale.unit)}.`
          ))}
      </p>
      <Button type="submit" tone="strong" size="large" wide aria-disabled={given}>
        {good ? `Enter ${figure(good.value)} ${unitSign(unit)}` : "Enter the reading"}
      </Button>
    </Form>
  );
}

function Means({ inUnit, unit, scale, band }: { inUnit: number; unit: string; scale: Props["scale"]; band: string }) {
  return (
    <>
      {unit !== scale.unit && <span className="dial">{`${figure(inUnit)} ${unitSign(scale.unit)}: `}</span>}
      This counts as <b>{band}</b>.
    </>
  );
}
