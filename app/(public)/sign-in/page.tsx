import type { Metadata } from "next";
import Link from "next/link";
import { NarrowPage } from "@/components/people/narrow-page";
import { SignInForms } from "@/components/people/sign-in-forms";
import { requestSignInLink, signInWithPassword } from "../actions";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  const { next } = await searchParams;
  return (
    <NarrowPage title="Sign in">
      <SignInForms withPassword={signInWithPassword} withLink={requestSignInLink} next={typeof next === "string" ? next : undefined} />
      <p className="mt-6 text-sm">
        New here?{" "}
        <Link className="link" href="/sign-up">
          Start with your boat
        </Link>
        .
      </p>
    </NarrowPage>
  );
}
