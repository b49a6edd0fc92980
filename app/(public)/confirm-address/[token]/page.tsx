import type { Metadata } from "next";
import { NarrowPage } from "@/components/people/narrow-page";
import { OneButtonForm } from "@/components/people/sign-in-forms";
import { SpentLink } from "@/components/people/spent-link";
import { peekToken } from "@/lib/server/auth/one-time-token";
import { confirmAddress } from "../../actions";

export const metadata: Metadata = { title: "Confirm the address" };

export default async function ConfirmAddressPage({ params }: PageProps<"/confirm-address/[token]">) {
  const { token } = await params;
  const known = await peekToken("change-address", token);
  if (!known) return <SpentLink again={{ href: "/account", title: "Back to the account" }} />;
  return (
    <NarrowPage title="Confirm the address" under={`From now on you sign in as ${known.email}.`}>
      <OneButtonForm action={confirmAddress} token={token} submit="Yes, this is my address" />
    </NarrowPage>
  );
}
