import { clsx } from "clsx";
import type { ReactNode } from "react";

type Props = { title: ReactNode; children: ReactNode; open?: boolean | undefined; className?: string };

/** Something folded away, in a frame of its own. */
export function Fold({ title, children, open, className }: Props) {
  return (
    <details open={open} className={clsx("rounded-[10px] border-[1.5px] border-edge bg-sheet px-3.5", className)}>
      <summary className="flex min-h-14 items-center py-1 font-semibold">{title}</summary>
      <div className="pb-3.5">{children}</div>
    </details>
  );
}
