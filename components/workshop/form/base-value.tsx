import { Segmented } from "@/components/ui/segmented";
import type { Cause } from "@/lib/core/tree/schema";
import { BASE_RATES, type BaseRate } from "@/lib/core/tree/strength";
import type { Editing } from "./editing";
import { labelOf } from "./field-words";
import { NumberValue } from "./number-value";

const RATES = (Object.keys(BASE_RATES) as BaseRate[]).reverse();

/** How common: a word, or a weight where there is a figure. */
export function BaseValue({ name, path, value, onChange }: Editing<Cause["base"]>) {
  const isFigure = typeof value === "number";
  return (
    <div className="grid gap-2">
      <Segmented
        name={path}
        legend={labelOf(name)}
        value={isFigure ? "figure" : (value ?? null)}
        options={[...RATES.map((rate) => ({ value: rate as string, title: rate as string })), { value: "figure", title: "a figure" }]}
        onChange={(next) =>
          onChange(next === "figure" ? (typeof value === "number" ? value : BASE_RATES[value ?? "occasional"]) : (next as BaseRate))
        }
      />
      {isFigure && <NumberValue bare name="weight" path={`${path}-weight`} value={value} onChange={onChange} />}
    </div>
  );
}
