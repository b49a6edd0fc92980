import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";
import { Field, inputLook } from "./field";

type Props = Omit<ComponentProps<"textarea">, "id"> & {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
};

/** Several lines of text. */
export function TextArea({ id, label, hint, error, optional = false, className, rows = 3, ...rest }: Props) {
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      {(control) => <textarea rows={rows} className={clsx(inputLook, className)} {...rest} {...control} />}
    </Field>
  );
}
