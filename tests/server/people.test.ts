import net from "node:net";
import { sql } from "drizzle-orm";
import { beforeAll, beforeEach, describe, expect, test, vi } from "vitest";
import { identityDatabase, type Database } from "@/db/client";
import type { Role } from "@/lib/core/access/roles";
import { findPerson, type Person } from "@/lib/server/auth/person";
import { withScope } from "@/lib/server/auth/scope";
import { acceptAsNew, acceptInvitation } from "@/lib/server/people/accept-invitation";
import { changeRoles, leaveFleet, removePerson, renameFleet } from "@/lib/server/people/commands";
import { invite, sendAgain, withdrawInvitation } from "@/lib/server/people/invite";
import { fleetsOf, getFleet, listInvitations, listPeople, peekInvitation } from "@/lib/server/people/queries";
import { testDatabase } from "../support/database";
import { testMailbox } from "../support/mailbox";
import { addFleet, addMember, addPerson, type TestPerson } from "../support/people";

let db: Database;
let box: Awaited<ReturnType<typeof testMailbox>>;

beforeAll(async () => {
  ({ owner: db } = await testDatabase());
  box = await testMailbox();
});
beforeEach(() => box.clear());

const personOf = async ({ sessionId }: TestPerson): Promise<Person> => {
  const person = await findPerson(sessionId);
  if (!person) throw new Error("signed out");
  return person;
};
const crew = async (...roles: Role[][]) => {
  const owner = await addPerson({ name: "Olga" });
  const fleetId = await addFleet("The fleet", owner);
  const others = await Promise.all(roles.map((_, i) => addPerson({ name: `Crew ${i}` })));
  for (const [i, person] of others.entries()) await addMember(fleetId, person, roles[i] ?? []);
  return { owner, fleetId, others };
};
const as = (who: TestPerson, fleetId: string) => ({
  invite: (email: string, roles: Role[], id = crypto.randomUUID()) =>
    withScope(who, fleetId, "people:write", (s) => invite(s, { id, email, roles })),
  remove: (userId: string, version = 1) => withScope(who, fleetId, "people:write", (s) => removePerson(s, userId, version)),
  change: (userId: string, roles: Role[], version = 1) =>
    withScope(who, fleetId, "people:write", (s) => changeRoles(s, userId, roles, version)),
  people: () => withScope(who, fleetId, "people:read", listPeople),
});

describe("invitations", () => {
  test("somebody without an account joins with the roles offered, and their address is taken as proved", async () => {
    const { owner, fleetId } = await crew();
    await as(owner, fleetId).invite("new@example.test", ["mechanic"]);
    const token = box.tokenFor("new@example.test", "invitation");
    expect(await peekInvitation(token)).toMatchObject({
      fleetName: "The fleet",
      invitedByName: "Olga",
      email: "new@example.test",
      roles: ["mechanic"],
      hasAccount: false,
    });
    const outcome = await acceptAsNew({ token, name: "Nils", password: "three wet oars" });
    expect(outcome).toMatchObject({ result: "joined", fleetId, email: "new@example.test" });
    expect((await as(owner, fleetId).people()).find((p) => p.name === "Nils")).toMatchObject({
      roles: ["mechanic"],
      email: "new@example.test",
    });
    expect(await acceptAsNew({ token, name: "Nils", password: "three wet oars" })).toEqual({ result: "gone" });
    const { rows } = await db.execute(sql`select name from people where fleet_id = ${fleetId} and name = 'Nils'`);
    expect(rows).toHaveLength(1);
  });

  test("one for another address is refused, and stays good for the right one", async () => {
    const { owner, fleetId } = await crew();
    const [invited, other] = [await addPerson({ name: "Ivo" }), await addPerson({ name: "Otto" })];
    await as(owner, fleetId).invite(invited.email, ["skipper"]);
    const token = box.tokenFor(invited.email, "invitation");
    expect(await acceptInvitation(await personOf(other), token)).toEqual({ result: "for-another-address" });
    expect(await fleetsOf(other)).toEqual([]);
    expect(await acceptAsNew({ token, name: "Thief", password: "three wet oars" })).toEqual({ result: "has-account" });
    expect(await acceptInvitation(await personOf(invited), token)).toMatchObject({ result: "joined", fleetId });
    expect(await fleetsOf(invited)).toMatchObject([{ id: fleetId, roles: ["skipper"] }]);
    expect(await acceptInvitation(await personOf(invited), token)).toEqual({ result: "gone" });
  });

  test("of two acceptances at once one joins", async () => {
    const { owner, fleetId } = await crew();
    await as(owner, fleetId).invite("race@example.test", ["skipper"]);
    const form = { token: box.tokenFor("race@example.test", "invitation"), name: "Rea", password: "three wet oars" };
    const outcomes = await Promise.all([acceptAsNew(form), acceptAsNew(form)]);
    expect(outcomes.filter((o) => o.result === "joined")).toHaveLength(1);
  });

  test("withdrawn or run out, they are gone; a second takes the place of the first", async () => {
    const { owner, fleetId } = await crew();
    const first = await as(owner, fleetId).invite("late@example.test", ["skipper"]);
    const firstToken = box.tokenFor("late@example.test", "invitation");
    const second = await as(owner, fleetId).invite("late@example.test", ["owner"]);
    const secondToken = box.tokenFor("late@example.test", "invitation");
    expect(await peekInvitation(firstToken)).toBeNull();
    expect(await withScope(owner, fleetId, "people:write", listInvitations)).toMatchObject([{ id: second.id, roles: ["owner"] }]);
    await expect(withScope(owner, fleetId, "people:write", (s) => withdrawInvitation(s, first.id))).rejects.toMatchObject({ status: 404 });
    await db.execute(sql`update invitations set expires_at = now() - interval '1 second' where id = ${second.id}`);
    expect(await peekInvitation(secondToken)).toBeNull();
    expect(await acceptAsNew({ token: secondToken, name: "Late", password: "three wet oars" })).toEqual({ result: "gone" });
    const third = await as(owner, fleetId).invite("late@example.test", ["skipper"]);
    await withScope(owner, fleetId, "people:write", (s) => withdrawInvitation(s, third.id));
    expect(await peekInvitation(box.tokenFor("late@example.test", "invitation"))).toBeNull();
  });

  test("sent twice with one id is one mail; somebody in the fleet is not invited", async () => {
    const { owner, fleetId, others } = await crew(["skipper"]);
    const id = crypto.randomUUID();
    await as(owner, fleetId).invite("twice@example.test", ["skipper"], id);
    await as(owner, fleetId).invite("twice@example.test", ["skipper"], id);
    expect(box.mails).toHaveLength(1);
    await expect(as(owner, fleetId).invite("twice@example.test", ["owner"], id)).rejects.toMatchObject({ status: 409 });
    await expect(as(owner, fleetId).invite(others[0]?.email ?? "", ["owner"])).rejects.toMatchObject({ status: 409 });
  });

  test("end with the standing of whoever sent them: removed, gone or no longer an owner", async () => {
    const { owner, fleetId, others } = await crew(["owner"], ["owner"], ["owner"]);
    const [removed, gone, demoted] = others as [TestPerson, TestPerson, TestPerson];
    for (const [i, who] of [removed, gone, demoted].entries()) await as(who, fleetId).invite(`back-door-${i}@example.test`, ["owner"]);
    await as(owner, fleetId).invite("wanted@example.test", ["skipper"]);
    await as(owner, fleetId).remove(removed.userId);
    await leaveFleet(await personOf(gone), fleetId);
    await as(owner, fleetId).change(demoted.userId, ["skipper"]);
    const left = await withScope(owner, fleetId, "people:write", listInvitations);
    expect(left.map((invitation) => invitation.email)).toEqual(["wanted@example.test"]);
  });

  test("whose mail could not be sent stand and say so; asking again sends them, with a new link", async () => {
    const { owner, fleetId } = await crew();
    const id = crypto.randomUUID();
    const reachable = process.env.SMTP_URL;
    process.env.SMTP_URL = "smtp://127.0.0.1:1";
    const told = vi.spyOn(console, "error").mockImplementation(() => undefined);
    expect(await as(owner, fleetId).invite("unsent@example.test", ["skipper"], id)).toMatchObject({ sentAt: null });
    expect(told).toHaveBeenCalledOnce();
    told.mockRestore();
    process.env.SMTP_URL = reachable;
    const waiting = () => withScope(owner, fleetId, "people:write", listInvitations);
    expect(await waiting()).toMatchObject([{ id, sentAt: null }]);
    expect(await as(owner, fleetId).invite("unsent@example.test", ["skipper"], id)).toMatchObject({ sentAt: expect.any(String) });
    expect(box.mails.map((mail) => mail.to)).toEqual(["unsent@example.test"]);
    expect(await waiting()).toMatchObject([{ id, sentAt: expect.any(String) }]);
    const first = box.tokenFor("unsent@example.test", "invitation");
    await withScope(owner, fleetId, "people:write", (s) => sendAgain(s, id));
    expect(await peekInvitation(first)).toBeNull();
    expect(await peekInvitation(box.tokenFor("unsent@example.test", "invitation"))).toMatchObject({ email: "unsent@example.test" });
  });

  test("hold no transaction open while a mail server takes its time, and send nothing for what was rolled back", async () => {
    const { owner, fleetId } = await crew();
    let answer = () => {};
    const silent = net.createServer((socket) => void (answer = () => socket.destroy()));
    await new Promise<void>((resolve) => silent.listen(0, "127.0.0.1", resolve));
    const reachable = process.env.SMTP_URL;
    process.env.SMTP_URL = `smtp://127.0.0.1:${(silent.address() as net.AddressInfo).port}`;
    const told = vi.spyOn(console, "error").mockImplementation(() => undefined);
    const connected = new Promise((resolve) => silent.once("connection", resolve));
    const sending = as(owner, fleetId).invite("slow@example.test", ["skipper"]);
    await connected;
    const { rows } = await db.execute(
      sql`select state from pg_stat_activity where datname = current_database() and state like 'idle in transaction%'`,
    );
    expect(rows).toEqual([]);
    answer();
    await sending;
    silent.close();
    told.mockRestore();
    process.env.SMTP_URL = reachable;
    const failing = withScope(owner, fleetId, "people:write", async (s) => {
      await invite(s, { id: crypto.randomUUID(), email: "rolled-back@example.test", roles: ["skipper"] });
      throw new Error("after it");
    });
    await expect(failing).rejects.toThrow("after it");
    expect(box.mails.filter((mail) => mail.to === "rolled-back@example.test")).toEqual([]);
  });

  test("an owner of one fleet cannot withdraw another's", async () => {
    const a = await crew();
    const b = await crew();
    const invitation = await as(a.owner, a.fleetId).invite("safe@example.test", ["skipper"]);
    await expect(withScope(b.owner, b.fleetId, "people:write", (s) => withdrawInvitation(s, invitation.id))).rejects.toMatchObject({
      status: 404,
    });
    expect(await peekInvitation(box.tokenFor("safe@example.test", "invitation"))).not.toBeNull();
  });
});

describe("removal", () => {
  test("shuts a person out at once and signs them out; what they wrote keeps their name", async () => {
    const { owner, fleetId, others } = await crew(["mechanic"]);
    const [mechanic] = others as [TestPerson];
    expect(await as(mechanic, fleetId).people()).toHaveLength(2);
    await as(owner, fleetId).remove(mechanic.userId);
    await expect(as(mechanic, fleetId).people()).rejects.toMatchObject({ status: 401 });
    await expect(withScope({ userId: mechanic.userId }, fleetId, "fleet:read", async () => 0)).rejects.toMatchObject({ status: 404 });
    const { rows } = await db.execute(
      sql`select name, left_at is not null as left from people where fleet_id = ${fleetId} and user_id = ${mechanic.userId}`,
    );
    expect(rows).toEqual([{ name: "Crew 0", left: true }]);
  });

  test("is for owners; a stranger to the fleet finds nothing", async () => {
    const { owner, fleetId, others } = await crew(["skipper", "mechanic"]);
    const stranger = (await crew()).owner;
    await expect(as(others[0] as TestPerson, fleetId).remove(owner.userId)).rejects.toMatchObject({ status: 403 });
    await expect(as(stranger, fleetId).remove(owner.userId)).rejects.toMatchObject({ status: 404 });
    await expect(as(owner, fleetId).remove(stranger.userId)).rejects.toMatchObject({ status: 404 });
  });

  test("of a version that somebody changed meanwhile is refused, with what it is now", async () => {
    const { owner, fleetId, others } = await crew(["skipper"]);
    const [skipper] = others as [TestPerson];
    await as(owner, fleetId).change(skipper.userId, ["mechanic"]);
    await expect(as(owner, fleetId).remove(skipper.userId, 1)).rejects.toMatchObject({
      status: 412,
      extras: { current: { version: 2, roles: ["mechanic"] } },
    });
    expect(await as(owner, fleetId).people()).toHaveLength(2);
  });
});

describe("the last owner", () => {
  test("cannot leave, be removed or stop being one", async () => {
    const { owner, fleetId } = await crew(["mechanic"]);
    await expect(leaveFleet(await personOf(owner), fleetId)).rejects.toMatchObject({ status: 409 });
    await expect(as(owner, fleetId).remove(owner.userId)).rejects.toMatchObject({ status: 409 });
    await expect(as(owner, fleetId).change(owner.userId, ["skipper"])).rejects.toMatchObject({ status: 409 });
    expect(await fleetsOf(owner)).toHaveLength(1);
    expect(await findPerson(owner.sessionId)).not.toBeNull();
  });

  test("is still there after two owners remove each other at the same time", async () => {
    for (let round = 0; round < 5; round++) {
      const { owner, fleetId, others } = await crew(["owner"]);
      const [second] = others as [TestPerson];
      await Promise.allSettled([as(owner, fleetId).remove(second.userId), as(second, fleetId).remove(owner.userId)]);
      const { rows } = await db.execute(sql`select 1 from memberships where fleet_id = ${fleetId} and 'owner' = any(roles)`);
      expect(rows).toHaveLength(1);
    }
  });

  test("one of two may leave, and stays signed in", async () => {
    const { owner, fleetId, others } = await crew(["owner"]);
    await leaveFleet(await personOf(owner), fleetId);
    expect(await fleetsOf(owner)).toEqual([]);
    expect(await findPerson(owner.sessionId)).not.toBeNull();
    expect(await as(others[0] as TestPerson, fleetId).people()).toHaveLength(1);
  });
});

describe("roles", () => {
  test("a change holds from the next request on, in a session that was open before", async () => {
    const { owner, fleetId, others } = await crew(["skipper"]);
    const [skipper] = others as [TestPerson];
    const publish = () => withScope(skipper, fleetId, "tree:write", async () => "may");
    await expect(publish()).rejects.toMatchObject({ status: 403 });
    await as(owner, fleetId).change(skipper.userId, ["skipper", "mechanic"]);
    expect(await publish()).toBe("may");
    await as(owner, fleetId).change(skipper.userId, ["skipper"], 2);
    await expect(publish()).rejects.toMatchObject({ status: 403 });
  });

  test("addresses are shown to owners only", async () => {
    const { owner, fleetId, others } = await crew(["mechanic"]);
    expect((await as(others[0] as TestPerson, fleetId).people()).every((p) => p.email === null)).toBe(true);
    expect((await as(owner, fleetId).people()).every((p) => p.email !== null)).toBe(true);
  });

  test("a fleet is renamed by the version that was seen", async () => {
    const { owner, fleetId } = await crew();
    const rename = (name: string, version: number) => withScope(owner, fleetId, "fleet:write", (s) => renameFleet(s, name, version));
    expect(await rename("Second name", 1)).toMatchObject({ name: "Second name", version: 2 });
    await expect(rename("Third name", 1)).rejects.toMatchObject({ status: 412, extras: { current: { name: "Second name", version: 2 } } });
    expect(await withScope(owner, fleetId, "fleet:read", getFleet)).toMatchObject({ name: "Second name" });
  });
});

test("signing in is of no use to a person whose session row is gone", async () => {
  const { owner, fleetId } = await crew();
  await identityDatabase().execute(sql`delete from sessions where id = ${owner.sessionId}`);
  await expect(as(owner, fleetId).people()).rejects.toMatchObject({ status: 401 });
});
