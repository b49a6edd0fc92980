import "server-only";
import { eq } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { identityDatabase } from "@/db/client";
import { users } from "@/db/schema/users";
import type { FinishSignUp } from "@/lib/core/contract/account";
import { issueToken, peekToken, takeToken } from "../auth/one-time-token";
import { hashPassword } from "../auth/password";
import { alreadySignedUpLetter, signUpLetter } from "../mail/letters";
import { sendMail } from "../mail/send-mail";
import { joinAsFirst, startFleet } from "../people/start-fleet";
import { makeUser } from "./make-user";

/** Sends a link to go on with, or, to somebody who has an account, a letter that says so. Whoever asks cannot tell which. */
export async function sendSignUpLink(email: string): Promise<void> {
  const [known] = await identityDatabase().select({ id: users.id }).from(users).where(eq(users.email, email));
  await sendMail(email, known ? alreadySignedUpLetter() : signUpLetter(await issueToken("sign-up", email, null)));
}

export type SignUpOutcome =
  { result: "started"; userId: string; email: string; fleetId: string } | { result: "link-used" } | { result: "address-taken" };

class Undone extends Error {
  constructor(readonly outcome: SignUpOutcome) {
    super(outcome.result);
  }
}

/** Ends a sign-up from its mailed link: the person, their password, their fleet. All of it or nothing. */
export async function finishSignUp({ token, name, fleetName, password }: FinishSignUp): Promise<SignUpOutcome> {
  // Before the costly hash: a link that is used up costs nothing.
  const link = await peekToken("sign-up", token);
  if (!link) return { result: "link-used" };
  const { email } = link;
  const passwordHash = await hashPassword(password);
  const userId = uuidv7();
  try {
    const fleetId = await startFleet(fleetName, { userId, name }, (fleet) =>
      identityDatabase().transaction(async (tx) => {
        if (!(await takeToken("sign-up", token, tx))) throw new Undone({ result: "link-used" });
        if (!(await makeUser(tx, { userId, name, email, passwordHash }))) throw new Undone({ result: "address-taken" });
        await joinAsFirst(tx, fleet, userId);
      }),
    );
    return { result: "started", userId, email, fleetId };
  } catch (error) {
    if (error instanceof Undone) return error.outcome;
    throw error;
  }
}
