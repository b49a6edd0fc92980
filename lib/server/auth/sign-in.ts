import "server-only";
import { AuthError, type CredentialsSignin } from "next-auth";
import { signIn, waitUntil } from "./next-auth";
import { issueToken } from "./one-time-token";

export type SignInOutcome = { result: "in" } | { result: "wrong" } | { result: "wait"; until: string };

/**
 * Signs in and sets the cookie. `redirect: false`: Auth.js redirects to the host of AUTH_URL, and a visitor of another
 * name of this server would leave the new cookie behind; the action redirects by path.
 */
async function attempt(provider: "password" | "link", input: Record<string, string>): Promise<SignInOutcome> {
  try {
    await signIn(provider, { ...input, redirect: false });
    return { result: "in" };
  } catch (error) {
    if (!(error instanceof AuthError) || error.type !== "CredentialsSignin") throw error;
    const until = waitUntil((error as CredentialsSignin).code);
    return until ? { result: "wait", until } : { result: "wrong" };
  }
}

export const signInByPassword = (email: string, password: string) => attempt("password", { email, password });
export const signInByLink = (token: string) => attempt("link", { token });

/** Somebody who has just proved who they are by a mailed link: signs them in without a second mail. */
export async function signInAs(userId: string, email: string): Promise<void> {
  const outcome = await signInByLink(await issueToken("sign-in", email, userId));
  if (outcome.result !== "in") throw new Error("a sign-in link just made was refused");
}
