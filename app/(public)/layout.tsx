import type { ReactNode } from "react";
import Link from "next/link";
import { connection } from "next/server";
import { LightSwitch } from "@/components/ui/light-switch";
import { Mark } from "@/components/ui/mark";

/** The frame of pages for people who are not signed in. */
export default async function PublicLayout({ children }: { children: ReactNode }) {
  // Made for each request, so that it can carry the nonce that its scripts are allowed by.
  await connection();
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="bg-deep text-on-deep">
        <div className="mx-auto flex max-w-6xl flex-wrap items-center gap-x-4 px-4 py-2">
          <Link href="/" className="flex min-h-12 items-center gap-2.5">
            <Mark />
            <span className="text-xl font-bold">Gudgeon</span>
          </Link>
          <span className="ml-auto flex items-center gap-1">
            <LightSwitch />
            <Link href="/sign-in" className="flex min-h-12 items-center px-3 font-semibold underline underline-offset-4">
              Sign in
            </Link>
          </span>
        </div>
      </header>
      <main id="main" className="mx-auto w-full max-w-6xl flex-1 px-4 py-6 lg:py-10">
        {children}
      </main>
      <footer className="border-t border-rule px-4 py-4 text-sm text-ink-2">
        <p className="mx-auto max-w-6xl">
          Gudgeon helps you look in the right order. The maker’s manual, local rules and a licensed technician stand above it. People, boat,
          engine, in that order.
        </p>
      </footer>
    </div>
  );
}
