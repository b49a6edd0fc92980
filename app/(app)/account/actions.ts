"use server";

import * as z from "zod";
import { ChangeAddress, ChangeName, ChangePassword, StartFleet } from "@/lib/core/contract/account";
import { Id } from "@/lib/core/contract/id";
import { askAddressChange, changeName as writeName, changePassword as setPassword } from "@/lib/server/account/commands";
import type { PasswordOutcome } from "@/lib/server/auth/check-password";
import { signOut as endThisSession } from "@/lib/server/auth/next-auth";
import { endSession as end, endSessionsOf } from "@/lib/server/auth/sessions";
import { startFleetAfresh } from "@/lib/server/people/start-fleet";
import { done, personalAction, publicAction, refused, wait, type Outcome } from "@/lib/server/web/action";

const told = (outcome: PasswordOutcome, says: string): Outcome => {
  if (outcome.result === "wait") return wait(outcome.until);
  if (outcome.result === "wrong") return refused("Look at what is marked.", { current: "That is not your password." });
  return done(says);
};

export const changeName = personalAction({
  input: ChangeName,
  async run(person, { name }) {
    await writeName(person, name);
    return done("Your name is changed.");
  },
});

export const changePassword = personalAction({
  input: ChangePassword,
  run: async (person, input) => told(await setPassword(person, input), "Your password is changed, and your other devices are signed out."),
});

export const changeAddress = personalAction({
  input: ChangeAddress,
  run: async (person, input) =>
    told(await askAddressChange(person, input), "A link is on its way to the new address. Until you open it, you sign in as before."),
});

export const startFleet = personalAction({
  input: StartFleet,
  async run(person, { fleetName }) {
    const fleetId = await startFleetAfresh(person, fleetName);
    return fleetId ? { goTo: `/f/${fleetId}/boats/new` } : refused("You are in a fleet already. It stands on this page.");
  },
});

export const endSession = personalAction({
  input: z.object({ sessionId: Id }),
  async run(person, { sessionId }) {
    await end(person, sessionId);
    return done("That device is signed out.");
  },
});

export const endOtherSessions = personalAction({
  input: z.object({}),
  async run(person) {
    await endSessionsOf(person.userId, person.sessionId);
    return done("Your other devices are signed out.");
  },
});

export const signOut = publicAction({
  input: z.object({}),
  async run() {
    await endThisSession({ redirect: false });
    return { goTo: "/" };
  },
});

export const signOutEverywhere = personalAction({
  input: z.object({}),
  async run(person) {
    await endSessionsOf(person.userId, null);
    await endThisSession({ redirect: false });
    return { goTo: "/sign-in" };
  },
});
