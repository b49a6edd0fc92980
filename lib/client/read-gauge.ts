import type { StepShown } from "@/lib/core/diagnosis/view";
import { readNumber } from "@/lib/core/units/read-number";
import { unitSign } from "@/lib/core/units/unit-sign";
import { convert } from "@/lib/core/units/units";

type Scale = NonNullable<StepShown["reading"]>;

/** What a typed reading is: the value and the band it falls in, or what is wrong with it; null while nothing is typed. */
export type GaugeRead = { value: number; inUnit: number; band: { finding: string; title: string } } | { wrong: string } | null;

/** Reads what was typed in `unit` against the scale; the edge of two bands belongs to the upper one. */
export function readGauge(typed: string, unit: string, scale: Scale): GaugeRead {
  if (typed.trim() === "") return null;
  const value = readNumber(typed);
  if (value === null) return { wrong: "This is not a number. Figures with a comma or a point will do." };
  const inUnit = convert(value, unit, scale.unit);
  if (inUnit < scale.from || inUnit > scale.to) {
    const said = unit === scale.unit ? "" : ` That is ${figure(inUnit)} ${unitSign(scale.unit)}.`;
    return {
      wrong: `This is outside the scale of ${figure(scale.from)} to ${figure(scale.to)} ${unitSign(scale.unit)}.${said} Read it again, or pick another unit.`,
    };
  }
  const band = scale.bands.find(({ from, to }) => inUnit >= from && inUnit < to) ?? scale.bands.at(-1);
  return band ? { value, inUnit, band } : { wrong: "This engine has no bands for this reading. Answer in words." };
}

/** Three figures are what a gauge gives. */
export function figure(value: number): string {
  const digits = Math.abs(value) >= 100 ? 0 : Math.abs(value) >= 10 ? 1 : 2;
  return String(Number(value.toFixed(digits)));
}
