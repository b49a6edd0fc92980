import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";
import { Field, inputLook } from "./field";

type Props = Omit<ComponentProps<"select">, "id"> & {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
  options: readonly { value: string; title: string }[];
};

/** The device's own list: it works with one thumb, offline and for every screen reader. */
export function Select({ id, label, hint, error, optional = false, options, className, ...rest }: Props) {
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      {(control) => (
        <select className={clsx(inputLook, className)} {...rest} {...control}>
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.title}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
