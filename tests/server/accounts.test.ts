import { eq, sql } from "drizzle-orm";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { identityDatabase, type Database } from "@/db/client";
import { oneTimeTokens } from "@/db/schema/sessions";
import { memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import { FleetName, PersonName } from "@/lib/core/contract/account";
import { askAddressChange, changeName, changePassword, confirmAddress } from "@/lib/server/account/commands";
import { resetPassword, sendResetLink, sendSignInLink } from "@/lib/server/account/password-reset";
import { finishSignUp, sendSignUpLink } from "@/lib/server/account/sign-up";
import { checkPassword } from "@/lib/server/auth/check-password";
import { peekToken, takeToken } from "@/lib/server/auth/one-time-token";
import { findPerson, type Person } from "@/lib/server/auth/person";
import { endSession, endSessionsOf, listSessions, openSession } from "@/lib/server/auth/sessions";
import { withScope } from "@/lib/server/auth/scope";
import { fleetsOf, listPeople } from "@/lib/server/people/queries";
import { startFleetAfresh } from "@/lib/server/people/start-fleet";
import { testDatabase } from "../support/database";
import { testMailbox } from "../support/mailbox";

let owner: Database;
let box: Awaited<ReturnType<typeof testMailbox>>;
let n = 0;
const PASSWORD = "three wet oars";
const address = () => `person-${++n}@example.test`;

async function signUp(email = address()): Promise<{ person: Person; fleetId: string; email: string }> {
  await sendSignUpLink(email);
  const outcome = await finishSignUp({ token: box.tokenFor(email, "sign-up"), name: "Ada", fleetName: "Ada's boats", password: PASSWORD });
  if (outcome.result !== "started") throw new Error(outcome.result);
  const person = await findPerson(await openSession(outcome.userId, "a phone"));
  if (!person) throw new Error("no person");
  return { person, fleetId: outcome.fleetId, email };
}

beforeAll(async () => {
  ({ owner } = await testDatabase());
  box = await testMailbox();
});
beforeEach(() => box.clear());

describe("signing up", () => {
  test("starts a fleet with its owner, skipper and mechanic", async () => {
    const { person, fleetId, email } = await signUp();
    expect(await fleetsOf(person)).toEqual([{ id: fleetId, name: "Ada's boats", roles: ["skipper", "mechanic", "owner"] }]);
    expect(await withScope(person, fleetId, "people:read", listPeople)).toMatchObject([{ userId: person.userId, name: "Ada", email }]);
    expect(await checkPassword(email, PASSWORD, "a place")).toEqual({ result: "right", userId: person.userId });
  });

  test("a link works once, of two at the same time for one", async () => {
    const email = address();
    await sendSignUpLink(email);
    const form = { token: box.tokenFor(email, "sign-up"), name: "Ada", fleetName: "Boats", password: PASSWORD };
    const outcomes = await Promise.all([finishSignUp(form), finishSignUp(form), finishSignUp(form)]);
    expect(outcomes.map((o) => o.result).sort()).toEqual(["link-used", "link-used", "started"]);
    expect(await finishSignUp(form)).toEqual({ result: "link-used" });
    const { rows } = await owner.execute(sql`select 1 from fleets f where not exists (select from memberships m where m.fleet_id = f.id)`);
    expect(rows, "fleets without people").toEqual([]);
  });

  test("an address with an account gets a mail that says so, and no second account", async () => {
    const { email } = await signUp();
    const other = address();
    await sendSignUpLink(other);
    const token = box.tokenFor(other, "sign-up");
    box.clear();
    await sendSignUpLink(email);
    expect(box.mails).toMatchObject([{ to: email, subject: "You have an account already" }]);
    await identityDatabase().update(oneTimeTokens).set({ email }).where(eq(oneTimeTokens.email, other));
    expect(await finishSignUp({ token, name: "Eve", fleetName: "Boats", password: PASSWORD })).toEqual({ result: "address-taken" });
  });
});

describe("mailed links", () => {
  test("only their hash is kept", async () => {
    const { email } = await signUp();
    await sendResetLink(email);
    const token = box.tokenFor(email, "reset");
    expect(token).toHaveLength(43);
    const kept = await identityDatabase().select().from(oneTimeTokens);
    expect(JSON.stringify(kept)).not.toContain(token);
  });

  test("a link for one thing does not do for another", async () => {
    const { email } = await signUp();
    await sendSignInLink(email);
    const token = box.tokenFor(email, "sign-in");
    expect(await resetPassword(token, "a new pass phrase")).toBeNull();
    expect(await takeToken("sign-in", token)).toMatchObject({ email });
    expect(await takeToken("sign-in", token)).toBeNull();
  });

  test("looking at one does not use it up; it runs out by itself", async () => {
    const { email } = await signUp();
    await sendResetLink(email);
    const token = box.tokenFor(email, "reset");
    expect(await peekToken("reset", token)).toEqual({ email });
    expect(await peekToken("reset", token)).toEqual({ email });
    await identityDatabase()
      .update(oneTimeTokens)
      .set({ expiresAt: sql`now() - interval '1 second'` });
    expect(await peekToken("reset", token)).toBeNull();
    expect(await resetPassword(token, "a new pass phrase")).toBeNull();
  });

  test("an address nobody has gets no mail", async () => {
    await sendResetLink("nobody@example.test");
    await sendSignInLink("nobody@example.test");
    expect(box.mails).toEqual([]);
  });
});

describe("a reset", () => {
  test("sets the password once, ends every session and makes other links worthless", async () => {
    const { person, email } = await signUp();
    await sendSignInLink(email);
    const signInToken = box.tokenFor(email, "sign-in");
    await sendResetLink(email);
    const token = box.tokenFor(email, "reset");
    const [a, b] = await Promise.all([resetPassword(token, "a new pass phrase"), resetPassword(token, "a rival pass phrase")]);
    expect([a, b].filter(Boolean)).toHaveLength(1);
    const password = a ? "a new pass phrase" : "a rival pass phrase";
    expect(await checkPassword(email, password, "a place")).toMatchObject({ result: "right" });
    expect(await checkPassword(email, PASSWORD, "a place")).toEqual({ result: "wrong" });
    expect(await findPerson(person.sessionId)).toBeNull();
    expect(await takeToken("sign-in", signInToken)).toBeNull();
  });
});

describe("one's own account", () => {
  test("a change of password needs the old one, ends the other sessions and says so by mail", async () => {
    const { person, email } = await signUp();
    const other = await openSession(person.userId, "a laptop");
    expect(await changePassword(person, { current: "not this", password: "a new pass phrase" })).toEqual({ result: "wrong" });
    expect(await findPerson(other)).not.toBeNull();
    expect(await changePassword(person, { current: PASSWORD, password: "a new pass phrase" })).toMatchObject({ result: "right" });
    expect(await findPerson(other)).toBeNull();
    expect(await findPerson(person.sessionId)).not.toBeNull();
    expect(box.mails.at(-1)).toMatchObject({ to: email, subject: "Your password was changed" });
  });

  test("a new address holds once it is confirmed there; the old one is told", async () => {
    const { person, email } = await signUp();
    const next = address();
    box.clear();
    expect(await askAddressChange(person, { email: next, current: "not this" })).toEqual({ result: "wrong" });
    expect(box.mails).toEqual([]);
    await askAddressChange(person, { email: next, current: PASSWORD });
    expect(box.mails.map((m) => m.to).sort()).toEqual([email, next].sort());
    expect(box.mails.find((m) => m.to === email)?.text).not.toContain("/confirm-address/");
    expect(await findPerson(person.sessionId)).toMatchObject({ email });
    const token = box.tokenFor(next, "confirm-address");
    const elsewhere = await openSession(person.userId, "a laptop");
    expect(await confirmAddress(token, person.sessionId)).toBe(true);
    expect(await confirmAddress(token, person.sessionId)).toBe(false);
    expect(await findPerson(person.sessionId)).toMatchObject({ email: next });
    expect(await findPerson(elsewhere)).toBeNull();
    expect(await checkPassword(email, PASSWORD, "a place")).toEqual({ result: "wrong" });
  });

  test("an address that somebody has is not taken from them", async () => {
    const a = await signUp();
    const b = await signUp();
    box.clear();
    expect(await askAddressChange(a.person, { email: b.email, current: PASSWORD })).toMatchObject({ result: "right" });
    // As much work as for one that is free, so that the time taken tells nothing; but no link.
    expect(box.mails.map((m) => m.to).sort()).toEqual([a.email, b.email].sort());
    expect(box.mails.filter((m) => m.text.includes("/confirm-address/"))).toEqual([]);
    // Free when asked for, taken when confirmed.
    const c = address();
    await askAddressChange(a.person, { email: c, current: PASSWORD });
    const token = box.tokenFor(c, "confirm-address");
    await identityDatabase().update(users).set({ email: c }).where(eq(users.id, b.person.userId));
    expect(await confirmAddress(token, null)).toBe(false);
  });

  test("nobody's mailbox can be filled by asking for a change of address", async () => {
    const { person } = await signUp();
    const next = address();
    for (let i = 0; i < 5; i++)
      expect(await askAddressChange(person, { email: next, current: PASSWORD })).toMatchObject({ result: "right" });
    expect(await askAddressChange(person, { email: next, current: PASSWORD })).toMatchObject({ result: "wait" });
    for (let i = 0; i < 4; i++) await askAddressChange(person, { email: address(), current: PASSWORD });
    expect(await askAddressChange(person, { email: address(), current: PASSWORD })).toMatchObject({ result: "wait" });
  });

  test.each(["Ada\r\nhttps://elsewhere.example", "Ada\u2028Byron", "\u202eadA", "A\u0000da"])("%j is no name", (name) => {
    expect(PersonName.safeParse(name).success).toBe(false);
    expect(FleetName.safeParse(name).success).toBe(false);
  });

  test("a name is changed on the card in each fleet too", async () => {
    const { person, fleetId } = await signUp();
    await changeName(person, "Ada of the Sound");
    const { rows } = await owner.execute(sql`select name from people where fleet_id = ${fleetId}`);
    expect(rows).toEqual([{ name: "Ada of the Sound" }]);
  });
});

describe("sessions", () => {
  test("are listed, end one by one or all at once, and only one's own", async () => {
    const { person } = await signUp();
    const stranger = await signUp();
    const laptop = await openSession(person.userId, "Firefox on Linux");
    expect(await listSessions(person)).toMatchObject([{ device: "Firefox on Linux", current: false }, { current: true }]);
    await endSession(stranger.person, laptop);
    expect(await findPerson(laptop)).not.toBeNull();
    await endSession(person, laptop);
    expect(await findPerson(laptop)).toBeNull();
    const tablet = await openSession(person.userId, "a tablet");
    await endSessionsOf(person.userId, null);
    expect(await findPerson(tablet)).toBeNull();
    expect(await findPerson(person.sessionId)).toBeNull();
    expect(await findPerson(stranger.person.sessionId)).not.toBeNull();
  });

  test("one that has run out is nobody's", async () => {
    const { person } = await signUp();
    await owner.execute(sql`update sessions set expires_at = now() - interval '1 second' where id = ${person.sessionId}`);
    expect(await findPerson(person.sessionId)).toBeNull();
  });
});

describe("a fleet of one's own for somebody in none", () => {
  test("is started with them as its owner; who is in a fleet gets no second", async () => {
    const { person, fleetId } = await signUp();
    expect(await startFleetAfresh(person, "Another")).toBeNull();
    await owner.delete(memberships).where(eq(memberships.fleetId, fleetId));
    const own = await startFleetAfresh(person, "Begun again");
    expect(await fleetsOf(person)).toEqual([{ id: own, name: "Begun again", roles: ["skipper", "mechanic", "owner"] }]);
    expect(await withScope(person, own!, "people:read", listPeople)).toMatchObject([{ userId: person.userId, name: "Ada" }]);
  });
});
