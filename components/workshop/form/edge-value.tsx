import { inputLook } from "@/components/ui/field";
import { EngineFigure, HealthyReading, type Edge } from "@/lib/core/tree/schema";
import { NumberValue } from "./number-value";
import { labelOf } from "./field-words";

type Props = { path: string; label: string; value: Edge; onChange: (edge: Edge) => void };

const KINDS = { number: "a figure", of: "times an engine figure", healthy: "above its healthy reading" } as const;
type Kind = keyof typeof KINDS;

/** Where a band begins or ends: a figure, a factor of what this engine is rated for, or so much over its own reading when well. */
export function EdgeValue({ path, label, value, onChange }: Props) {
  const kind: Kind = typeof value === "number" ? "number" : "of" in value ? "of" : "healthy";
  const figure = typeof value === "number" ? value : "of" in value ? value.times : value.otherwise;
  return (
    <div className="flex flex-wrap items-start gap-1">
      <select
        aria-label={`${label}: what it hangs on`}
        className={`${inputLook} max-w-44`}
        value={kind}
        onChange={(event) => onChange(edgeOf(event.target.value as Kind, figure))}
      >
        {Object.entries(KINDS).map(([key, title]) => (
          <option key={key} value={key}>
            {title}
          </option>
        ))}
      </select>
      {typeof value === "number" && (
        <NumberValue bare name={label} path={`${path}-figure`} value={value} onChange={(next) => next !== undefined && onChange(next)} />
      )}
      {typeof value !== "number" && "of" in value && (
        <>
          <NumberValue
            bare
            name={`${label}, times`}
            path={`${path}-times`}
            value={value.times}
            onChange={(times) => times !== undefined && onChange({ ...value, times })}
          />
          <Pick
            label={`${label}: engine figure`}
            value={value.of}
            options={EngineFigure.options}
            onChange={(of) => onChange({ ...value, of })}
          />
        </>
      )}
      {typeof value !== "number" && "healthy" in value && (
        <>
          <Pick
            label={`${label}: healthy reading`}
            value={value.healthy}
            options={HealthyReading.options}
            onChange={(healthy) => onChange({ ...value, healthy })}
          />
          <NumberValue
            bare
            name={`${label}, plus`}
            path={`${path}-plus`}
            value={value.plus}
            onChange={(plus) => plus !== undefined && onChange({ ...value, plus })}
          />
          <NumberValue
            bare
            name={`${label}, where it has none`}
            path={`${path}-otherwise`}
            value={value.otherwise}
            onChange={(otherwise) => otherwise !== undefined && onChange({ ...value, otherwise })}
          />
        </>
      )}
    </div>
  );
}

function edgeOf(kind: Kind, figure: number): Edge {
  if (kind === "of") return { of: "ratedRpm", times: figure > 0 && figure < 3 ? figure : 1 };
  if (kind === "healthy") return { healthy: "filterVacuumKpa", plus: 0, otherwise: figure };
  return figure;
}

type PickProps<T extends string> = { label: string; value: T; options: readonly T[]; onChange: (value: T) => void };

function Pick<T extends string>({ label, value, options, onChange }: PickProps<T>) {
  return (
    <select aria-label={label} className={`${inputLook} max-w-52`} value={value} onChange={(event) => onChange(event.target.value as T)}>
      {options.map((one) => (
        <option key={one} value={one}>
          {labelOf(one)}
        </option>
      ))}
    </select>
  );
}
