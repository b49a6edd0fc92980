import { clsx } from "clsx";
import type { ComponentProps, ReactNode } from "react";

type Props = Omit<ComponentProps<"input">, "type" | "children"> & { type?: "checkbox" | "radio"; children: ReactNode };

/** A box to tick or a round one to choose, with its words: drawn by us, so that no device paints it grey at night. */
export function Choice({ type = "checkbox", children, className, ...rest }: Props) {
  return (
    <label className={clsx("flex min-h-12 items-center gap-3 py-1", className)}>
      <span className="relative flex size-6 flex-none">
        <input
          type={type}
          className={clsx(
            "peer size-6 appearance-none border-[1.5px] border-edge bg-sheet checked:border-fill checked:bg-fill",
            type === "radio" ? "rounded-full" : "rounded-[5px]",
          )}
          {...rest}
        />
        <Sign type={type} />
      </span>
      <span>{children}</span>
    </label>
  );
}

function Sign({ type }: { type: "checkbox" | "radio" }) {
  return (
    <svg viewBox="0 0 24 24" aria-hidden focusable="false" className="pointer-events-none absolute inset-0 hidden peer-checked:block">
      {type === "radio" ? (
        <circle cx={12} cy={12} r={5} fill="var(--sheet)" />
      ) : (
        <path d="m6 12.5 4 4 8-9" fill="none" stroke="var(--sheet)" strokeWidth={2.5} strokeLinecap="round" strokeLinejoin="round" />
      )}
    </svg>
  );
}
