import "server-only";
import type { Role } from "@/lib/core/access/roles";
import { siteUrl, type Letter } from "./send-mail";

const letter = (subject: string, ...paragraphs: string[]): Letter => ({ subject, text: `${paragraphs.join("\n\n")}\n` });

const NOT_YOU = "If you did not ask for this, do nothing: without the link nothing happens.";

const after = (next: string | undefined) => (next ? `?next=${encodeURIComponent(next)}` : "");

export const signUpLetter = (token: string) =>
  letter(
    "Finish signing up",
    "Open this link to name your fleet and choose a password. It is good for a day:",
    siteUrl(`/sign-up/${token}`),
    NOT_YOU,
  );

export const alreadySignedUpLetter = () =>
  letter(
    "You have an account already",
    "Somebody asked to sign up with this address, which has an account already. Sign in here:",
    siteUrl("/sign-in"),
    `Forgotten the password? ${siteUrl("/forgotten")}`,
  );

export const signInLetter = (token: string, next?: string) =>
  letter(
    "Your link to sign in",
    "Open this link to sign in. It is good for 30 minutes and works once:",
    siteUrl(`/sign-in/${token}${after(next)}`),
    NOT_YOU,
  );

export const resetLetter = (token: string) =>
  letter(
    "Choose a new password",
    "Open this link to choose a new password. It is good for 30 minutes and works once:",
    siteUrl(`/reset/${token}`),
    NOT_YOU,
  );

export const confirmAddressLetter = (token: string) =>
  letter(
    "Confirm your new address",
    "Open this link to use this address for signing in from now on. It is good for an hour:",
    siteUrl(`/confirm-address/${token}`),
    NOT_YOU,
  );

export const addressTakenLetter = () =>
  letter(
    "This address has an account",
    "Somebody asked to use this address for another account. It has one of its own already, so nothing was changed.",
    `If it was you, sign in with it here: ${siteUrl("/sign-in")}`,
  );

const ifNotYou = () => `If it was not you, choose a new password at once: ${siteUrl("/forgotten")}`;

export const addressChangeAskedLetter = (newAddress: string) =>
  letter(
    "Your address is about to change",
    `Somebody signed in as you asked to use ${newAddress} for signing in instead of this address.`,
    ifNotYou(),
  );

export const passwordChangedLetter = () =>
  letter("Your password was changed", "Your password was changed, and your other devices were signed out.", ifNotYou());

const listed = (roles: readonly Role[]) => roles.join(" and ");

export const invitationLetter = (token: string, invitation: { fleetName: string; invitedByName: string; roles: readonly Role[] }) =>
  letter(
    `You are invited to ${invitation.fleetName}`,
    `${invitation.invitedByName} invites you to the fleet "${invitation.fleetName}" as ${listed(invitation.roles)}. Open this link to join. It is good for three days:`,
    siteUrl(`/invitation/${token}`),
    "If you do not know them, do nothing.",
  );
