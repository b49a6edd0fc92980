import type { Metadata } from "next";
import { LinkButton } from "@/components/ui/link-button";
import { NarrowPage } from "@/components/people/narrow-page";
import { AcceptAsNewForm, OneButtonForm } from "@/components/people/sign-in-forms";
import { SpentLink } from "@/components/people/spent-link";
import { peekInvitation } from "@/lib/server/people/queries";
import { pagePerson } from "@/lib/server/web/page-scope";
import { acceptInvitation, acceptInvitationAsNew } from "../../actions";

export const metadata: Metadata = { title: "Invitation" };

export default async function InvitationPage({ params }: PageProps<"/invitation/[token]">) {
  const { token } = await params;
  const [invitation, person] = await Promise.all([peekInvitation(token), pagePerson()]);
  if (!invitation) return <SpentLink again={{ href: "/", title: "To the front page" }} />;
  const under = `${invitation.invitedByName} asks you to join as ${invitation.roles.join(", ")}. For ${invitation.email}.`;
  return (
    <NarrowPage title={invitation.fleetName} under={under}>
      {person?.email === invitation.email ? (
        <OneButtonForm action={acceptInvitation} token={token} submit="Join the fleet" />
      ) : person ? (
        <p>
          You are signed in as {person.email}. This invitation is for {invitation.email}: sign out on the account page, then open the link
          again.
        </p>
      ) : invitation.hasAccount ? (
        <LinkButton tone="strong" href={`/sign-in?next=/invitation/${token}`}>
          Sign in to join
        </LinkButton>
      ) : (
        <AcceptAsNewForm action={acceptInvitationAsNew} token={token} />
      )}
    </NarrowPage>
  );
}
