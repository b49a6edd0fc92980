"use server";

import { after } from "next/server";
import { AcceptAsNew, AddressGiven, FinishSignUp, LinkOpened, ResetPassword, SignIn } from "@/lib/core/contract/account";
import { resetPassword as setNewPassword, sendResetLink, sendSignInLink } from "@/lib/server/account/password-reset";
import { confirmAddress as confirm } from "@/lib/server/account/commands";
import { finishSignUp as finish, sendSignUpLink } from "@/lib/server/account/sign-up";
import { countAttempt, LIMITS } from "@/lib/server/auth/attempts";
import { signInAs, signInByLink, signInByPassword } from "@/lib/server/auth/sign-in";
import { acceptAsNew, acceptInvitation as accept } from "@/lib/server/people/accept-invitation";
import { done, personalAction, publicAction, refused, wait, type Outcome } from "@/lib/server/web/action";
import { ownPath } from "@/lib/server/web/own-path";
import { pagePerson } from "@/lib/server/web/page-scope";

/** Leads on to the person's first fleet. */
const HOME = "/f";
const LINK_USED = "This link has been used, or is too old. Ask for a new one.";

/**
 * One answer for every address, and the mail goes out after it: neither the words nor the time taken tell who has an
 * account.
 */
async function mailLink(email: string, place: string, send: () => Promise<void>, says: string): Promise<Outcome> {
  const until = (await countAttempt(LIMITS.mailsOfPlace, place)) ?? (await countAttempt(LIMITS.mailToAddress, email));
  if (until) return wait(until, "If a mail came meanwhile, its link is still good.");
  after(send);
  return done(says);
}

export const signInWithPassword = publicAction({
  input: SignIn,
  async run({ email, password, next }) {
    const outcome = await signInByPassword(email, password);
    if (outcome.result === "wait") return wait(outcome.until, "Or have a sign-in link sent to you.");
    if (outcome.result === "wrong") return refused("That address and password do not go together.");
    return { goTo: ownPath(next) ?? HOME };
  },
});

export const requestSignInLink = publicAction({
  input: AddressGiven,
  run: ({ email, next }, place) =>
    mailLink(
      email,
      place,
      () => sendSignInLink(email, ownPath(next) ?? undefined),
      "If that address has an account, a link to sign in is on its way.",
    ),
});

export const signInWithLink = publicAction({
  input: LinkOpened,
  async run({ token, next }) {
    const outcome = await signInByLink(token);
    return outcome.result === "in" ? { goTo: ownPath(next) ?? HOME } : refused(LINK_USED);
  },
});

export const requestSignUp = publicAction({
  input: AddressGiven,
  run: ({ email }, place) =>
    mailLink(email, place, () => sendSignUpLink(email), "A link to go on with is on its way to you. It is good for a day."),
});

export const finishSignUp = publicAction({
  input: FinishSignUp,
  async run(input) {
    const outcome = await finish(input);
    if (outcome.result === "link-used") return refused(LINK_USED);
    if (outcome.result === "address-taken") return refused("This address has an account already. Sign in instead.");
    await signInAs(outcome.userId, outcome.email);
    return { goTo: `/f/${outcome.fleetId}/boats/new` };
  },
});

export const requestReset = publicAction({
  input: AddressGiven,
  run: ({ email }, place) =>
    mailLink(email, place, () => sendResetLink(email), "If that address has an account, a link to choose a new password is on its way."),
});

export const resetPassword = publicAction({
  input: ResetPassword,
  async run({ token, password }) {
    const reset = await setNewPassword(token, password);
    if (!reset) return refused(LINK_USED);
    await signInAs(reset.userId, reset.email);
    return { goTo: HOME };
  },
});

const GONE = "This invitation has been used or withdrawn, or is too old. Ask for a new one.";

export const acceptInvitation = personalAction({
  input: LinkOpened,
  async run(person, { token }) {
    const outcome = await accept(person, token);
    if (outcome.result === "joined") return { goTo: `/f/${outcome.fleetId}` };
    return refused(
      outcome.result === "for-another-address" ? "This invitation is for another address. Sign in with that one to accept it." : GONE,
    );
  },
});

export const acceptInvitationAsNew = publicAction({
  input: AcceptAsNew,
  async run(input) {
    const outcome = await acceptAsNew(input);
    if (outcome.result === "has-account") return refused("This address has an account already. Sign in, then accept.");
    if (outcome.result !== "joined") return refused(GONE);
    await signInAs(outcome.userId, outcome.email);
    return { goTo: `/f/${outcome.fleetId}` };
  },
});

export const confirmAddress = publicAction({
  input: LinkOpened,
  async run({ token }) {
    const person = await pagePerson();
    return (await confirm(token, person?.sessionId ?? null)) ? done("From now on you sign in with this address.") : refused(LINK_USED);
  },
});
