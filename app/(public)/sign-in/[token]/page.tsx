import type { Metadata } from "next";
import { NarrowPage } from "@/components/people/narrow-page";
import { OneButtonForm } from "@/components/people/sign-in-forms";
import { SpentLink } from "@/components/people/spent-link";
import { peekToken } from "@/lib/server/auth/one-time-token";
import { signInWithLink } from "../../actions";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInLinkPage({ params, searchParams }: PageProps<"/sign-in/[token]">) {
  const { token } = await params;
  const { next } = await searchParams;
  const known = await peekToken("sign-in", token);
  if (!known) return <SpentLink again={{ href: "/sign-in", title: "Ask for another" }} />;
  return (
    <NarrowPage title="Sign in" under={known.email}>
      <OneButtonForm action={signInWithLink} token={token} next={typeof next === "string" ? next : undefined} submit="Sign in" />
    </NarrowPage>
  );
}
