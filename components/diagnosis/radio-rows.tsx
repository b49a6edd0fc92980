import { clsx } from "clsx";

type Props<V extends string> = {
  name: string;
  legend: string;
  options: readonly { value: V; title: string; detail?: string }[];
  value: V | null;
  showLegend?: boolean;
  onChange: (value: V) => void;
};

/** One of several, each with a line of its own. */
export function RadioRows<V extends string>({ name, legend, options, value, showLegend = false, onChange }: Props<V>) {
  return (
    <fieldset>
      <legend className={showLegend ? "mb-2 font-semibold" : "visually-hidden"}>{legend}</legend>
      <div className="overflow-hidden rounded-xl border-[1.5px] border-edge bg-sheet">
        {options.map((option) => (
          <label
            key={option.value}
            className={clsx(
              "relative grid min-h-14 grid-cols-[28px_1fr] items-center gap-2 border-b border-rule px-3.5 py-2 last:border-b-0",
              "has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-brass",
              value === option.value && "bg-shoal",
            )}
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={value === option.value}
              onChange={() => onChange(option.value)}
              className="absolute inset-0 cursor-pointer opacity-0"
            />
            <span
              aria-hidden
              className={clsx("size-5 rounded-full border-[1.5px] border-edge", value === option.value && "border-[6px] border-fill")}
            />
            <span>
              <b className="block font-semibold">{option.title}</b>
              {option.detail && <span className="block text-sm text-ink-2">{option.detail}</span>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
