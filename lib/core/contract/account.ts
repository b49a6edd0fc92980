import * as z from "zod";
import { isEasilyGuessed } from "../access/common-passwords";

/** In lower case, plain ASCII: what can be put into a mail's header without harm. */
export const Email = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, "That is too long for an e-mail address.")
  .pipe(z.email("That does not look like an e-mail address."));

/** One line, and it reads as it is written: names stand in mails that strangers get. */
const name = (missing: string) =>
  z
    .string()
    .trim()
    .min(1, missing)
    .max(80, "Keep it under 80 characters.")
    .regex(/^[^\p{Cc}\p{Zl}\p{Zp}\u202a-\u202e\u2066-\u2069]*$/u, "Keep it to letters that can be seen, on one line.");

export const PersonName = name("Say what we may call you.");
export const FleetName = name("Give the fleet a name.");

/** Length is what makes a password strong; nothing is asked of its make-up. */
export const NewPassword = z
  .string()
  .min(10, "Use at least 10 characters; a few words do well.")
  .max(200, "Keep it under 200 characters.")
  .refine((password) => !isEasilyGuessed(password), "That one is among the first that are guessed. Take another.");

const Password = z.string().min(1, "Type your password.").max(200, "That is too long for a password.");
/** 32 random bytes in base64url. */
const Token = z.string().regex(/^[A-Za-z0-9_-]{43}$/, "This link is not whole. Open it from the mail again.");
/** A path of this site, to go on to. */
const Next = z.string().max(500).optional();

export const SignIn = z.object({ email: Email, password: Password, next: Next });
export const AddressGiven = z.object({ email: Email, next: Next });
export const LinkOpened = z.object({ token: Token, next: Next });
export const FinishSignUp = z.object({ token: Token, name: PersonName, fleetName: FleetName, password: NewPassword });
export type FinishSignUp = z.infer<typeof FinishSignUp>;
export const StartFleet = z.object({ fleetName: FleetName });
export const ResetPassword = z.object({ token: Token, password: NewPassword });
export const AcceptAsNew = z.object({ token: Token, name: PersonName, password: NewPassword });
export type AcceptAsNew = z.infer<typeof AcceptAsNew>;
export const ChangeName = z.object({ name: PersonName });
export const ChangePassword = z.object({ current: Password, password: NewPassword });
export type ChangePassword = z.infer<typeof ChangePassword>;
export const ChangeAddress = z.object({ email: Email, current: Password });
export type ChangeAddress = z.infer<typeof ChangeAddress>;
