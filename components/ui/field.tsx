import type { ReactNode } from "react";

export const inputLook =
  "w-full min-h-12 rounded-lg border-[1.5px] border-edge bg-sheet px-3 py-2 text-base text-ink aria-invalid:border-lead disabled:opacity-60";

/** What a control needs to be tied to its label, hint and error. */
export type FieldControl = { id: string; "aria-describedby": string | undefined; "aria-invalid": true | undefined };

type Props = {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  /** "optional" is said; what is needed is the rule and not marked. */
  optional?: boolean;
  children: (control: FieldControl) => ReactNode;
};

/** A label, a hint, the control, and what is wrong with it, tied together for screen readers. */
export function Field({ id, label, hint, error, optional = false, children }: Props) {
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter((part) => part !== null).join(" ");
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-ink-2"> (optional)</span>}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      )}
      {children({ id, "aria-describedby": described || undefined, "aria-invalid": error ? true : undefined })}
      {error && (
        <p id={`${id}-error`} role="alert" className="text-sm font-semibold text-lead">
          {error}
        </p>
      )}
    </div>
  );
}
