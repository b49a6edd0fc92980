import { ChevronRight } from "lucide-react";
import type { ReactNode } from "react";

/** A row as wide as the screen that leads on. */
export function BigRow({ title, detail, more, onTap }: { title: ReactNode; detail?: ReactNode; more?: ReactNode; onTap: () => void }) {
  return (
    <button
      type="button"
      onClick={onTap}
      className="flex min-h-16 w-full items-center justify-between gap-3 rounded-[10px] border-[1.5px] border-edge bg-sheet px-3.5 py-2 text-left shadow-[0_1px_0_var(--rule)] hover:bg-shoal"
    >
      <span className="min-w-0">
        <span className="block font-semibold">{title}</span>
        {detail && <span className="block text-sm text-ink-2">{detail}</span>}
        {more && <span className="block text-sm font-semibold text-fill night:text-ink">{more}</span>}
      </span>
      <ChevronRight aria-hidden size={22} className="flex-none text-ink-3" />
    </button>
  );
}
