import { clsx } from "clsx";
import type { ReactNode } from "react";

type Props<V extends string> = {
  name: string;
  legend: ReactNode;
  options: readonly { value: V; title: ReactNode }[];
  value: V | null;
  onChange: (value: V) => void;
  hideLegend?: boolean;
};

/** One of a few, side by side; stacked where the screen is too narrow. Radio buttons underneath. */
export function Segmented<V extends string>({ name, legend, options, value, onChange, hideLegend = false }: Props<V>) {
  return (
    <fieldset>
      <legend className={clsx("mb-2 font-semibold", hideLegend && "visually-hidden")}>{legend}</legend>
      <div className="flex flex-wrap gap-px overflow-hidden rounded-xl border-[1.5px] border-edge bg-edge">
        {options.map((option) => (
          <label
            key={option.value}
            className={clsx(
              "relative flex min-h-14 min-w-24 flex-1 items-center justify-center px-2 py-2 text-center text-sm",
              "has-focus-visible:z-10 has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-brass",
              option.value === value ? "bg-deep font-semibold text-on-deep underline decoration-2 underline-offset-4" : "bg-sheet",
            )}
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
              className="absolute inset-0 cursor-pointer opacity-0"
            />
            {option.title}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
