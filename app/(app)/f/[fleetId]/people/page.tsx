import type { Metadata } from "next";
import { ConfirmForm } from "@/components/people/confirm-form";
import { InviteForm, RenameFleetForm } from "@/components/people/fleet-forms";
import { InvitationList } from "@/components/people/invitation-list";
import { PersonCard } from "@/components/people/person-card";
import { Card } from "@/components/ui/card";
import { PageHead } from "@/components/ui/page-head";
import { can } from "@/lib/core/access/permissions";
import { demand } from "@/lib/server/auth/scope";
import { getFleet, listInvitations, listPeople } from "@/lib/server/people/queries";
import { pageScope } from "@/lib/server/web/page-scope";
import { changeRoles, invite, leaveFleet, removePerson, renameFleet, sendInvitationAgain, withdrawInvitation } from "./actions";

export const metadata: Metadata = { title: "People" };

export default async function PeoplePage({ params }: PageProps<"/f/[fleetId]/people">) {
  const { fleetId } = await params;
  const { fleet, people, invitations, me } = await pageScope("people:read", fleetId, async (scope) => ({
    fleet: await getFleet(scope),
    people: await listPeople(scope),
    // Owners only; null for all others.
    invitations: can(scope.actor.roles, "people:write") ? await listInvitations(demand(scope, "people:write")) : null,
    me: scope.actor.userId,
  }));
  const manages = invitations !== null;
  return (
    <>
      <PageHead
        title="People"
        under={manages ? "Who sees this fleet, and as what." : "Who is in this fleet. An owner invites people and changes what they are."}
      />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <section aria-labelledby="members" className="grid gap-3">
          <h2 id="members">In the fleet</h2>
          {people.map((person) => (
            <PersonCard
              key={person.userId}
              fleetId={fleetId}
              person={person}
              isSelf={person.userId === me}
              manage={manages ? { changeRoles, removePerson } : null}
            />
          ))}
        </section>
        <div className="no-print grid gap-5">
          {manages && (
            <>
              <Card aria-labelledby="invite">
                <h2 id="invite" className="mb-3">
                  Invite somebody
                </h2>
                <InviteForm action={invite} fleetId={fleetId} />
              </Card>
              <Card aria-labelledby="waiting">
                <h2 id="waiting">Invitations waiting</h2>
                <InvitationList fleetId={fleetId} invitations={invitations} withdraw={withdrawInvitation} sendAgain={sendInvitationAgain} />
              </Card>
              <Card aria-labelledby="fleet">
                <h2 id="fleet" className="mb-3">
                  The fleet
                </h2>
                <RenameFleetForm action={renameFleet} fleet={fleet} />
              </Card>
            </>
          )}
          <div>
            <ConfirmForm action={leaveFleet} hidden={{ fleetId }} title="Leave this fleet">
              <p>You no longer see {fleet.name}. What you wrote stays in its log under your name. An owner can invite you again.</p>
            </ConfirmForm>
          </div>
        </div>
      </div>
    </>
  );
}
