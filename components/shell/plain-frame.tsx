import Link from "next/link";
import type { ReactNode } from "react";
import { LightSwitch } from "@/components/ui/light-switch";
import { Mark } from "@/components/ui/mark";

type Props = { /** Beside the light switch. */ action?: ReactNode; footer?: ReactNode; children: ReactNode };

/** A page outside any fleet: the name, the light, and the page. */
export function PlainFrame({ action, footer, children }: Props) {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="no-print bg-deep text-on-deep">
        <div className="mx-auto flex max-w-6xl flex-wrap items-center gap-x-4 px-4 py-2">
          <Link href="/" className="flex min-h-12 items-center gap-2.5">
            <Mark />
            <span className="text-xl font-bold">Gudgeon</span>
          </Link>
          <span className="ml-auto flex items-center gap-1">
            <LightSwitch />
            {action}
          </span>
        </div>
      </header>
      <main id="main" className="mx-auto w-full max-w-6xl flex-1 px-4 py-6 lg:py-10">
        {children}
      </main>
      {footer && (
        <footer className="border-t border-rule py-4 text-sm text-ink-2">
          <p className="mx-auto max-w-6xl px-4">{footer}</p>
        </footer>
      )}
    </div>
  );
}
