"use client";

import { usePathname } from "next/navigation";
import type { ReactNode } from "react";

/** The way about on a phone, folded under the fleet's name; a page that is reached through it finds it folded again. */
export function FoldedNav({ title, children }: { title: string; children: ReactNode }) {
  return (
    <details key={usePathname()} className="lg:hidden">
      <summary className="flex min-h-12 items-center border-t border-on-deep/25 px-4 font-semibold">
        <span>{title}</span>
        <span className="visually-hidden">Menu</span>
      </summary>
      <div className="px-2 pb-3">{children}</div>
    </details>
  );
}
