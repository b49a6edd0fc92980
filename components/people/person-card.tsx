import { Day } from "@/components/log/day";
import { Card } from "@/components/ui/card";
import { Chip } from "@/components/ui/chip";
import type { FleetPerson } from "@/lib/core/contract/people";
import { ConfirmForm } from "./confirm-form";
import type { FormAction } from "./form-action";
import { RolesForm } from "./fleet-forms";

type Props = {
  fleetId: string;
  person: FleetPerson;
  isSelf: boolean;
  /** For owners; others only read. */ manage: { changeRoles: FormAction; removePerson: FormAction } | null;
};

/** Someone of the fleet: who, in which roles, and for owners what to do about it. */
export function PersonCard({ fleetId, person, isSelf, manage }: Props) {
  const hidden = { fleetId, userId: person.userId, version: String(person.version) };
  return (
    <Card aria-labelledby={`person-${person.userId}`}>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <h3 id={`person-${person.userId}`}>
          {person.name}
          {isSelf && " (you)"}
        </h3>
        {person.roles.map((role) => (
          <Chip key={role}>{role}</Chip>
        ))}
      </div>
      <p className="mt-1 text-sm text-ink-2">
        {person.email && <span className="break-all">{person.email}, </span>}in the fleet since <Day at={person.joinedAt} />
      </p>
      {manage && (
        <details className="no-print mt-1">
          <summary className="link flex min-h-12 items-center">
            {isSelf ? "Change your roles" : `Change ${person.name}’s roles or remove them`}
          </summary>
          <div className="mt-2 grid gap-5">
            <RolesForm key={person.version} action={manage.changeRoles} hidden={hidden} person={person} />
            {!isSelf && (
              <div>
                <ConfirmForm action={manage.removePerson} hidden={hidden} title={`Remove ${person.name}`}>
                  <p>
                    {person.name} is out of the fleet at once and signed out on every device. What they wrote stays in the log under their
                    name. They can be invited again.
                  </p>
                </ConfirmForm>
              </div>
            )}
          </div>
        </details>
      )}
    </Card>
  );
}
