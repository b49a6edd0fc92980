import type { Metadata } from "next";
import { NarrowPage } from "@/components/people/narrow-page";
import { NewPasswordForm } from "@/components/people/sign-in-forms";
import { SpentLink } from "@/components/people/spent-link";
import { peekToken } from "@/lib/server/auth/one-time-token";
import { resetPassword } from "../../actions";

export const metadata: Metadata = { title: "New password" };

export default async function ResetPage({ params }: PageProps<"/reset/[token]">) {
  const { token } = await params;
  const known = await peekToken("reset", token);
  if (!known) return <SpentLink again={{ href: "/forgotten", title: "Ask for another" }} />;
  return (
    <NarrowPage title="New password" under={`For ${known.email}. Everywhere else you are signed out.`}>
      <NewPasswordForm action={resetPassword} token={token} />
    </NarrowPage>
  );
}
