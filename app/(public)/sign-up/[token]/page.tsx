import type { Metadata } from "next";
import { NarrowPage } from "@/components/people/narrow-page";
import { FinishSignUpForm } from "@/components/people/sign-in-forms";
import { SpentLink } from "@/components/people/spent-link";
import { peekToken } from "@/lib/server/auth/one-time-token";
import { finishSignUp } from "../../actions";

export const metadata: Metadata = { title: "Start your fleet" };

export default async function FinishSignUpPage({ params }: PageProps<"/sign-up/[token]">) {
  const { token } = await params;
  const known = await peekToken("sign-up", token);
  if (!known) return <SpentLink again={{ href: "/sign-up", title: "Ask for another" }} />;
  return (
    <NarrowPage title="Start your fleet" under={`You sign in as ${known.email}.`}>
      <FinishSignUpForm action={finishSignUp} token={token} />
    </NarrowPage>
  );
}
