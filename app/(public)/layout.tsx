import type { ReactNode } from "react";
import Link from "next/link";
import { connection } from "next/server";
import { PlainFrame } from "@/components/shell/plain-frame";
import { pagePerson } from "@/lib/server/web/page-scope";

/** The frame of pages outside any fleet; whoever is signed in gets a way back to their boats. */
export default async function PublicLayout({ children }: { children: ReactNode }) {
  // Made for each request, so that it can carry the nonce that its scripts are allowed by.
  await connection();
  const person = await pagePerson();
  return (
    <PlainFrame
      action={
        <Link
          href={person ? "/f" : "/sign-in"}
          prefetch={false}
          className="-mr-3 flex min-h-12 items-center px-3 font-semibold underline underline-offset-4"
        >
          {person ? "Your boats" : "Sign in"}
        </Link>
      }
      footer="Gudgeon helps you look in the right order. The maker’s manual, local rules and a licensed technician stand above it. People, boat, engine, in that order."
    >
      {children}
    </PlainFrame>
  );
}
