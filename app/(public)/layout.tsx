import type { ReactNode } from "react";
import Link from "next/link";
import { connection } from "next/server";
import { PlainFrame } from "@/components/shell/plain-frame";

/** The frame of pages for people who are not signed in. */
export default async function PublicLayout({ children }: { children: ReactNode }) {
  // Made for each request, so that it can carry the nonce that its scripts are allowed by.
  await connection();
  return (
    <PlainFrame
      action={
        <Link href="/sign-in" className="flex min-h-12 items-center px-3 font-semibold underline underline-offset-4">
          Sign in
        </Link>
      }
      footer="Gudgeon helps you look in the right order. The maker’s manual, local rules and a licensed technician stand above it. People, boat, engine, in that order."
    >
      {children}
    </PlainFrame>
  );
}
