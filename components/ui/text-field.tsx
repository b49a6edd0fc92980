import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";
import { Field, inputLook } from "./field";

type Props = Omit<ComponentProps<"input">, "id"> & {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
};

/** One line of text or a number. Takes register() of react-hook-form as well as plain props. */
export function TextField({ id, label, hint, error, optional = false, className, type = "text", ...rest }: Props) {
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      {(control) => <input type={type} className={clsx(inputLook, className)} {...rest} {...control} />}
    </Field>
  );
}
