import type { ReactNode } from "react";

/** Nothing here yet: what would be here, and the way to the first one. */
export function EmptyState({ title, children, action }: { title: ReactNode; children?: ReactNode; action?: ReactNode }) {
  return (
    <div className="grid justify-items-start gap-2 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-5">
      <p className="font-semibold">{title}</p>
      {children && <div className="text-sm text-ink-2">{children}</div>}
      {action && <div className="pt-1">{action}</div>}
    </div>
  );
}
