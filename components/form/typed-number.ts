import * as z from "zod";
import { readNumber } from "@/lib/core/units/read-number";

type Range = { from?: number; to?: number; whole?: boolean };

/** A number as it is typed, within a range; null where nothing is typed. */
export function typedNumber({ from = -Infinity, to = Infinity, whole = false }: Range = {}) {
  return z.string().transform((typed, ctx) => {
    if (typed.trim() === "") return null;
    const value = readNumber(typed);
    const wrong =
      value === null
        ? "Write a number, for example 12.5."
        : value < from
          ? `At least ${from}.`
          : value > to
            ? `At most ${to}.`
            : whole && !Number.isInteger(value)
              ? "A whole number."
              : null;
    if (value === null || wrong) {
      ctx.addIssue({ code: "custom", message: wrong ?? "" });
      return z.NEVER;
    }
    return value;
  });
}

/** A number back in a field, without the digits that only a conversion made. */
export const asTyped = (value: number | null | undefined): string =>
  value === null || value === undefined ? "" : String(Number(value.toPrecision(6)));
