import Link from "next/link";
import type { ReactNode } from "react";
import { LightSwitch } from "@/components/ui/light-switch";
import { Mark } from "@/components/ui/mark";

/** A page outside any fleet: the name, the light, and the page. */
export function PlainFrame({ children }: { children: ReactNode }) {
  return (
    <div className="min-h-dvh">
      <header className="no-print bg-deep text-on-deep">
        <div className="mx-auto flex max-w-6xl items-center gap-4 px-4 py-2">
          <Link href="/" className="flex min-h-12 items-center gap-2.5">
            <Mark />
            <span className="text-xl font-bold">Gudgeon</span>
          </Link>
          <span className="ml-auto">
            <LightSwitch />
          </span>
        </div>
      </header>
      <main id="main" className="mx-auto w-full max-w-6xl px-4 py-6 lg:py-10">
        {children}
      </main>
    </div>
  );
}
