"use client";

import { clsx } from "clsx";
import type { ReactNode } from "react";
import { LightSwitch } from "@/components/ui/light-switch";
import type { Ready } from "@/lib/client/screen/surface";
import { KeptChip, KeptLine } from "./kept-chip";

type Props = { ready: Ready | null; who: ReactNode; under?: ReactNode; line?: ReactNode; aside?: ReactNode; children: ReactNode };

/** The deep-water band with who and what, then the screen; beside it on a wide screen, beneath it on a phone, what is still possible. */
export function Frame({ ready, who, under, line, aside, children }: Props) {
  // One left edge for the band, the screen and the line under it.
  const column = aside ? "mx-auto w-full max-w-5xl" : "mx-auto w-full max-w-2xl";
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="no-print bg-deep pt-3 pb-1 text-on-deep">
        <div className={clsx(column, "px-4")}>
          <div className="flex flex-wrap items-center justify-between gap-x-3 gap-y-1">
            <span className="font-semibold">{who}</span>
            {ready && <KeptChip ready={ready} />}
          </div>
          {under && <div className="mt-0.5 text-sm opacity-90">{under}</div>}
          <div className="flex flex-wrap items-center justify-between gap-x-3 text-sm">
            {line ?? <span />}
            <LightSwitch compact className="-mr-3" />
          </div>
        </div>
      </header>
      <div className={clsx(column, "flex-1", aside && "flex flex-col lg:flex-row lg:gap-8")}>
        <main id="main" className="min-w-0 flex-1 px-4 pt-4 pb-6">
          {children}
        </main>
        {aside && (
          <aside className="no-print border-t border-rule bg-sheet px-4 py-4 lg:w-96 lg:flex-none lg:border-t-0 lg:border-l">{aside}</aside>
        )}
      </div>
      {ready && (
        <footer className="no-print border-t border-rule py-2">
          <div className={clsx(column, "px-4")}>
            <KeptLine ready={ready} />
          </div>
        </footer>
      )}
    </div>
  );
}
