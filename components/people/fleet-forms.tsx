"use client";

import { TextField } from "@/components/ui/text-field";
import type { Fleet, FleetPerson } from "@/lib/core/contract/people";
import { ActionForm } from "./action-form";
import { EmailField } from "./fields";
import type { FormAction } from "./form-action";
import { RoleBoxes } from "./role-boxes";

export function RolesForm({
  action,
  hidden,
  person,
}: {
  action: FormAction;
  hidden: Readonly<Record<string, string>>;
  person: FleetPerson;
}) {
  return (
    <ActionForm action={action} hidden={hidden} submit="Save the roles" tone="plain" changesPage>
      {(wrong) => <RoleBoxes legend={`What ${person.name} is in this fleet`} roles={person.roles} error={wrong("roles")} />}
    </ActionForm>
  );
}

export function InviteForm({ action, fleetId }: { action: FormAction; fleetId: string }) {
  return (
    <ActionForm action={action} hidden={{ fleetId }} submit="Send the invitation" changesPage>
      {(wrong) => (
        <>
          <EmailField wrong={wrong} id="invite-email" />
          <RoleBoxes legend="What they will be in this fleet" roles={["skipper"]} error={wrong("roles")} />
        </>
      )}
    </ActionForm>
  );
}

export function WithdrawForm({ action, hidden }: { action: FormAction; hidden: Readonly<Record<string, string>> }) {
  return <ActionForm action={action} hidden={hidden} submit="Withdraw" tone="plain" changesPage />;
}

export function SendAgainForm({ action, hidden }: { action: FormAction; hidden: Readonly<Record<string, string>> }) {
  return <ActionForm action={action} hidden={hidden} submit="Send again" tone="plain" changesPage />;
}

export function RenameFleetForm({ action, fleet }: { action: FormAction; fleet: Fleet }) {
  return (
    <ActionForm action={action} hidden={{ fleetId: fleet.id, version: String(fleet.version) }} submit="Rename" tone="plain" changesPage>
      {(wrong) => (
        <TextField
          id="fleet-name"
          name="name"
          label="Name of the fleet"
          required
          maxLength={80}
          defaultValue={fleet.name}
          error={wrong("name")}
        />
      )}
    </ActionForm>
  );
}
