import { clsx } from "clsx";
import type { ReactNode } from "react";

type Props = {
  children: ReactNode;
  onTap: () => void;
  chosen?: boolean;
  quiet?: boolean;
  /** Takes no tap yet: it may have come under a finger that bounces. */ waits?: boolean;
};

/** An answer: as wide as the screen, high enough for a wet thumb in a seaway. */
export function AnswerButton({ children, onTap, chosen = false, quiet = false, waits = false }: Props) {
  return (
    <button
      type="button"
      onClick={waits ? undefined : onTap}
      aria-disabled={waits || undefined}
      className={clsx(
        "min-h-16 w-full rounded-[10px] border-[1.5px] border-edge px-3.5 py-2 text-left text-lg font-semibold",
        chosen
          ? "bg-deep text-on-deep"
          : quiet
            ? "border-dashed bg-transparent text-ink-2 hover:bg-shoal"
            : "bg-sheet shadow-[0_1px_0_var(--rule)] hover:bg-shoal",
      )}
    >
      {children}
    </button>
  );
}
