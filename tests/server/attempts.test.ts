import { sql } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { identityDatabase, type Database } from "@/db/client";
import { makeUser } from "@/lib/server/account/make-user";
import { countAttempt, forgetAttempts } from "@/lib/server/auth/attempts";
import { checkPassword } from "@/lib/server/auth/check-password";
import { clientAddress } from "@/lib/server/auth/client-address";
import { hashPassword, isOutdated, verifyPassword } from "@/lib/server/auth/password";
import { testDatabase } from "../support/database";

let owner: Database;
const email = "ada@example.test";
const PASSWORD = "three wet oars";

beforeAll(async () => {
  ({ owner } = await testDatabase());
  await makeUser(identityDatabase(), { name: "Ada", email, passwordHash: await hashPassword(PASSWORD) });
});

describe("counted tries", () => {
  const limit = { name: "test", max: 5, seconds: 60 };

  test("as many as allowed and no more, a hundred at once included", async () => {
    const tries = await Promise.all(Array.from({ length: 100 }, () => countAttempt(limit, "crowd")));
    expect(tries.filter((until) => until === null)).toHaveLength(5);
    const until = tries.find((t) => t !== null);
    expect(until?.getTime()).toBeGreaterThan(Date.now() + 30_000);
    expect(until?.getTime()).toBeLessThan(Date.now() + 61_000);
  });

  test("each for themselves", async () => {
    for (let i = 0; i < 6; i++) await countAttempt(limit, "one");
    expect(await countAttempt(limit, "one")).not.toBeNull();
    expect(await countAttempt(limit, "another")).toBeNull();
    await forgetAttempts(limit, "one");
    expect(await countAttempt(limit, "one")).toBeNull();
  });

  test("the window ends by itself, and trying on does not make it longer", async () => {
    for (let i = 0; i < 6; i++) await countAttempt(limit, "patient");
    const first = await countAttempt(limit, "patient");
    const second = await countAttempt(limit, "patient");
    expect(second).toEqual(first);
    await owner.execute(sql`update attempts set ends_at = now() - interval '1 second'`);
    expect(await countAttempt(limit, "patient")).toBeNull();
  });

  test("the table tells nobody's address", async () => {
    await checkPassword("secret-person@example.test", "whatever it is", "192.0.2.7");
    const { rows } = await owner.execute<{ key: string }>(sql`select key from attempts`);
    expect(JSON.stringify(rows)).not.toMatch(/secret-person|192\.0\.2\.7/);
  });
});

describe("wrong passwords", () => {
  test("ten from one place, then one waits there, even with the right one; from another place it goes on", async () => {
    for (let i = 0; i < 10; i++) expect(await checkPassword(email, "wrong one", "192.0.2.1")).toEqual({ result: "wrong" });
    expect(await checkPassword(email, PASSWORD, "192.0.2.1")).toMatchObject({ result: "wait", until: expect.any(Date) });
    expect(await checkPassword(email, PASSWORD, "198.51.100.1")).toMatchObject({ result: "right" });
  });

  test("an address nobody has is answered the same", async () => {
    for (let i = 0; i < 10; i++) expect(await checkPassword("nobody@example.test", "wrong one", "192.0.2.2")).toEqual({ result: "wrong" });
    expect(await checkPassword("nobody@example.test", "wrong one", "192.0.2.2")).toMatchObject({ result: "wait" });
  });

  test("an address nobody has takes as long to refuse", async () => {
    const time = async (who: string) => {
      const took: number[] = [];
      for (let i = 0; i < 8; i++) {
        const start = performance.now();
        await checkPassword(who, "wrong one", `203.0.113.${who.length}`);
        took.push(performance.now() - start);
      }
      return took.sort((a, b) => a - b)[4] ?? 0;
    };
    const known = await time(email);
    const unknown = await time("nobody-else@example.test");
    expect(unknown).toBeGreaterThan(known / 3);
    expect(unknown).toBeLessThan(known * 3);
  });
});

describe("passwords", () => {
  test("are kept as argon2id with 19 MiB and two passes", async () => {
    const stored = await hashPassword(PASSWORD);
    expect(stored).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(isOutdated(stored)).toBe(false);
    expect(isOutdated(stored.replace("t=2", "t=1"))).toBe(true);
    expect(await verifyPassword(stored, PASSWORD)).toBe(true);
    expect(await verifyPassword(stored, `${PASSWORD} `)).toBe(false);
  });

  test("one typed in another Unicode form is the same password", async () => {
    expect(await verifyPassword(await hashPassword("caf\u00e9 au port"), "cafe\u0301 au port")).toBe(true);
  });

  test("many at once all come to their turn", async () => {
    const stored = await hashPassword(PASSWORD);
    const answers = await Promise.all(Array.from({ length: 12 }, (_, i) => verifyPassword(stored, i % 2 ? PASSWORD : "wrong one")));
    expect(answers.filter(Boolean)).toHaveLength(6);
  });
});

describe("where a request comes from", () => {
  const from = (value: string) => clientAddress(new Headers({ "x-forwarded-for": value }));

  test("behind a proxy, what a caller adds in front is not believed", () => {
    process.env.TRUSTED_PROXIES = "1";
    expect(from("6.6.6.6, 192.0.2.9")).toBe("192.0.2.9");
    delete process.env.TRUSTED_PROXIES;
    expect(from("192.0.2.9")).toBe("192.0.2.9");
  });

  test("a household of IPv6 addresses counts as one", () => {
    expect(from("2001:db8:1:2:aaaa::1")).toBe(from("2001:db8:1:2:bbbb::2"));
    expect(from("2001:db8:1:3::1")).not.toBe(from("2001:db8:1:2::1"));
    // Written short, with its zeros left out.
    expect(from("2001:db8::aaaa:1:2:3")).toBe(from("2001:db8::bbbb:4:5:6"));
    expect(from("2001:db8:1::1")).toBe(from("2001:db8:1:0:aaaa:1:2:3"));
  });
});
