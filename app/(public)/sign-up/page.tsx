import type { Metadata } from "next";
import Link from "next/link";
import { NarrowPage } from "@/components/people/narrow-page";
import { AddressForm } from "@/components/people/sign-in-forms";
import { requestSignUp } from "../actions";

export const metadata: Metadata = { title: "Start with your boat" };

export default function SignUpPage() {
  return (
    <NarrowPage
      title="Start with your boat"
      under="First your address. The link we send leads to your fleet, your boat, its engine and the first diagnosis."
    >
      <AddressForm action={requestSignUp} submit="Send me the link" />
      <p className="mt-6 text-sm">
        Been here before?{" "}
        <Link className="link" href="/sign-in">
          Sign in
        </Link>
        .
      </p>
    </NarrowPage>
  );
}
