"use client";

import type { UseFormRegister } from "react-hook-form";
import { Field, inputLook } from "@/components/ui/field";
import { unitsOf } from "@/lib/core/units/units";
import type { EngineValues } from "./engine-values";
import type { FigureAsked } from "./figures";

type Props = { asked: FigureAsked<string>; at: "figures" | "healthy"; register: UseFormRegister<EngineValues>; error: string | undefined };

/** A figure and the unit it is read in; the unit can be any that people read, it is converted on saving. */
export function FigureField({ asked, at, register, error }: Props) {
  const units = unitsOf(asked.quantity);
  return (
    <Field id={`${at}-${asked.key}`} label={asked.title} hint={asked.hint} error={error}>
      {(control) => (
        <div className="grid grid-cols-[minmax(0,1fr)_7rem] gap-2">
          <input className={inputLook} inputMode="decimal" autoComplete="off" {...control} {...register(`${at}.${asked.key}.typed`)} />
          {units.length > 1 ? (
            <select className={inputLook} aria-label={`Unit of ${asked.title.toLowerCase()}`} {...register(`${at}.${asked.key}.unit`)}>
              {units.map(({ symbol }) => (
                <option key={symbol} value={symbol}>
                  {asWritten(symbol)}
                </option>
              ))}
            </select>
          ) : (
            <span className="self-center text-ink-2">{asked.unit}</span>
          )}
        </div>
      )}
    </Field>
  );
}

const asWritten = (symbol: string) => (symbol === "C" || symbol === "F" ? `°${symbol}` : symbol);
