"use client";

import Link from "next/link";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { FormState } from "@/lib/core/contract/form-state";
import { ActionForm } from "./action-form";
import { EmailField, FleetNameField, NameField, NewPasswordField, PasswordField } from "./fields";

type Action = (before: FormState, form: FormData) => Promise<FormState>;
const carried = (values: Record<string, string | undefined>): Record<string, string> =>
  Object.fromEntries(Object.entries(values).filter((pair): pair is [string, string] => pair[1] !== undefined));
/** A mail is on its way: where to, and what to do if it does not come. */
const inTheMail = (says: string, given: FormData, again: () => void) => (
  <Notice tone="good" title="Look in your mail" live>
    <p>{says}</p>
    <p className="mt-1">
      It goes to <b className="break-all">{String(given.get("email"))}</b>. Nothing there after some minutes? Look where unwanted mail is
      put.
    </p>
    <Button className="mt-3" onClick={again}>
      Send it again, or to another address
    </Button>
  </Notice>
);

export function SignInForms({ withPassword, withLink, next }: { withPassword: Action; withLink: Action; next?: string | undefined }) {
  return (
    <div className="grid gap-8">
      <ActionForm action={withPassword} hidden={carried({ next })} submit="Sign in">
        {(wrong) => (
          <>
            <EmailField wrong={wrong} />
            <PasswordField wrong={wrong} />
            <p className="text-sm">
              <Link className="link" href="/forgotten">
                Forgotten the password?
              </Link>
            </p>
          </>
        )}
      </ActionForm>
      <section className="border-t border-rule pt-6">
        <h2 className="mb-3">Or by a link in your mail</h2>
        <ActionForm action={withLink} hidden={carried({ next })} submit="Send me a link" tone="plain" onceDone={inTheMail}>
          {(wrong, before) => <EmailField wrong={wrong} id="link-email" value={before("email")} />}
        </ActionForm>
      </section>
    </div>
  );
}

export function AddressForm({ action, submit }: { action: Action; submit: string }) {
  return (
    <ActionForm action={action} submit={submit} onceDone={inTheMail}>
      {(wrong, before) => <EmailField wrong={wrong} value={before("email")} />}
    </ActionForm>
  );
}

export function FinishSignUpForm({ action, token }: { action: Action; token: string }) {
  return (
    <ActionForm action={action} hidden={{ token }} submit="Start">
      {(wrong) => (
        <>
          <NameField wrong={wrong} />
          <FleetNameField wrong={wrong} />
          <NewPasswordField wrong={wrong} />
        </>
      )}
    </ActionForm>
  );
}

export function NewPasswordForm({ action, token }: { action: Action; token: string }) {
  return (
    <ActionForm action={action} hidden={{ token }} submit="Set the password">
      {(wrong) => <NewPasswordField wrong={wrong} label="New password" />}
    </ActionForm>
  );
}

export function AcceptAsNewForm({ action, token }: { action: Action; token: string }) {
  return (
    <ActionForm action={action} hidden={{ token }} submit="Accept">
      {(wrong) => (
        <>
          <NameField wrong={wrong} />
          <NewPasswordField wrong={wrong} />
        </>
      )}
    </ActionForm>
  );
}

/** One button that posts: a mail scanner follows links and must not use them up. */
export function OneButtonForm({
  action,
  token,
  next,
  submit,
}: {
  action: Action;
  token: string;
  next?: string | undefined;
  submit: string;
}) {
  return (
    <ActionForm
      action={action}
      hidden={carried({ token, next })}
      submit={submit}
      onceDone={(says) => (
        <Notice tone="good" live>
          {says}
        </Notice>
      )}
    />
  );
}
