import type { Metadata } from "next";
import { NarrowPage } from "@/components/people/narrow-page";
import { AddressForm } from "@/components/people/sign-in-forms";
import { requestReset } from "../actions";

export const metadata: Metadata = { title: "Forgotten password" };

export default function ForgottenPage() {
  return (
    <NarrowPage title="Forgotten password" under="We send a link to set a new one. It works once, for half an hour.">
      <AddressForm action={requestReset} submit="Send me the link" />
    </NarrowPage>
  );
}
