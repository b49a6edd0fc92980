import type { ComponentProps, ReactNode } from "react";

/** A box to tick, with its words. Drawn by us: the browser's own shines grey and white at night. */
export function Checkbox({
  children,
  hint,
  ...rest
}: Omit<ComponentProps<"input">, "type" | "className"> & { children: ReactNode; /** What the tick does. */ hint?: ReactNode }) {
  return (
    <label className={hint ? "flex min-h-12 items-start gap-3 py-2.5" : "flex min-h-12 items-center gap-3"}>
      <span className="relative grid size-6 flex-none place-items-center">
        <input
          type="checkbox"
          className="peer absolute inset-0 appearance-none rounded border-[1.5px] border-edge bg-sheet checked:bg-shoal"
          {...rest}
        />
        <svg width={18} height={18} viewBox="0 0 22 22" aria-hidden className="pointer-events-none relative hidden peer-checked:block">
          <path d="M4 12l5 5L18 6" fill="none" stroke="var(--fill)" strokeWidth={3.4} />
        </svg>
      </span>
      <span>
        {children}
        {hint && <span className="block text-sm text-ink-2">{hint}</span>}
      </span>
    </label>
  );
}
