import { Day } from "@/components/log/day";
import type { Invitation } from "@/lib/core/contract/people";
import { SendAgainForm, WithdrawForm } from "./fleet-forms";
import type { FormAction } from "./form-action";

type Props = { fleetId: string; invitations: readonly Invitation[]; withdraw: FormAction; sendAgain: FormAction };

/** Invitations that wait to be accepted. */
export function InvitationList({ fleetId, invitations, withdraw, sendAgain }: Props) {
  if (invitations.length === 0) return <p className="text-sm text-ink-2">No invitation is waiting.</p>;
  return (
    <ul className="divide-y divide-rule">
      {invitations.map((invitation) => (
        <li key={invitation.id} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-2">
          <span>
            <span className="break-all">{invitation.email}</span>, as {invitation.roles.join(", ")}.{" "}
            <span className="text-sm text-ink-2">
              Invited by {invitation.invitedByName}, good until <Day at={invitation.expiresAt} />
            </span>
            {invitation.sentAt === null && <span className="block font-semibold">Its mail has not gone out. Send it again.</span>}
          </span>
          <SendAgainForm action={sendAgain} hidden={{ fleetId, invitationId: invitation.id }} />
          <WithdrawForm action={withdraw} hidden={{ fleetId, invitationId: invitation.id }} />
        </li>
      ))}
    </ul>
  );
}
