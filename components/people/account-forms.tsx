"use client";

import { ActionForm } from "./action-form";
import { EmailField, FleetNameField, NameField, NewPasswordField, PasswordField } from "./fields";
import type { FormAction } from "./form-action";

export function ChangeNameForm({ action, name }: { action: FormAction; name: string }) {
  return (
    <ActionForm action={action} submit="Change the name" tone="plain" changesPage>
      {(wrong) => <NameField wrong={wrong} value={name} />}
    </ActionForm>
  );
}

export function ChangeAddressForm({ action }: { action: FormAction }) {
  return (
    <ActionForm action={action} submit="Change the address" tone="plain">
      {(wrong) => (
        <>
          <EmailField wrong={wrong} label="New address" hint="A link goes there; the change holds once you open it." id="new-email" />
          <PasswordField wrong={wrong} name="current" id="address-password" label="Your password" />
        </>
      )}
    </ActionForm>
  );
}

export function ChangePasswordForm({ action }: { action: FormAction }) {
  return (
    <ActionForm action={action} submit="Change the password" tone="plain" changesPage>
      {(wrong) => (
        <>
          <PasswordField wrong={wrong} name="current" id="old-password" label="Your password now" />
          <NewPasswordField wrong={wrong} label="New password" />
        </>
      )}
    </ActionForm>
  );
}

export function StartFleetForm({ action }: { action: FormAction }) {
  return (
    <ActionForm action={action} submit="Start a fleet">
      {(wrong) => <FleetNameField wrong={wrong} />}
    </ActionForm>
  );
}

/** One button that needs no fields. */
export function ButtonForm({
  action,
  hidden = {},
  submit,
}: {
  action: FormAction;
  hidden?: Readonly<Record<string, string>>;
  submit: string;
}) {
  return <ActionForm action={action} hidden={hidden} submit={submit} tone="plain" changesPage />;
}
