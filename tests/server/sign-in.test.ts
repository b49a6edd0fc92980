import { beforeAll, describe, expect, test } from "vitest";
import { identityDatabase } from "@/db/client";
import { makeUser } from "@/lib/server/account/make-user";
import { issueToken } from "@/lib/server/auth/one-time-token";
import { hashPassword } from "@/lib/server/auth/password";
import { findPerson } from "@/lib/server/auth/person";
import { sessionIdOf } from "@/lib/server/auth/session-cookie";
import { endSessionsOf } from "@/lib/server/auth/sessions";
import { testDatabase } from "../support/database";

// Auth.js's own routes, driven as a browser drives them.
let handlers: typeof import("@/lib/server/auth/next-auth").handlers;
const site = "http://localhost:3000";
const email = "ada@example.test";
const PASSWORD = "three wet oars";
let userId: string;

beforeAll(async () => {
  process.env.AUTH_URL = site;
  await testDatabase();
  ({ handlers } = await import("@/lib/server/auth/next-auth"));
  userId = (await makeUser(identityDatabase(), { name: "Ada", email, passwordHash: await hashPassword(PASSWORD) })) ?? "";
});

/** Keeps cookies as a browser does. */
class Browser {
  readonly cookies = new Map<string, string>();
  readonly set: string[] = [];

  async ask(path: string, form?: Record<string, string>): Promise<Response> {
    const { NextRequest } = await import("next/server");
    const headers = {
      cookie: [...this.cookies].map(([k, v]) => `${k}=${v}`).join("; "),
      "user-agent": "Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Firefox/140.0",
    };
    const request = new NextRequest(
      `${site}/api/auth/${path}`,
      form ? { method: "POST", headers, body: new URLSearchParams(form) } : { headers },
    );
    const response = await (form ? handlers.POST(request) : handlers.GET(request));
    for (const cookie of response.headers.getSetCookie()) {
      this.set.push(cookie);
      const [, name, value] = /^([^=]+)=([^;]*)/.exec(cookie) ?? [];
      if (!name) continue;
      if (value) this.cookies.set(name, value);
      else this.cookies.delete(name);
    }
    return response;
  }

  async signIn(provider: "password" | "link", fields: Record<string, string>): Promise<Response> {
    const { csrfToken } = (await (await this.ask("csrf")).json()) as { csrfToken: string };
    return this.ask(`callback/${provider}`, { ...fields, csrfToken });
  }

  async person() {
    const headers = new Headers({ cookie: [...this.cookies].map(([k, v]) => `${k}=${v}`).join("; ") });
    const sessionId = await sessionIdOf(headers);
    return sessionId ? findPerson(sessionId) : null;
  }
}

describe("with a password", () => {
  test("the right one opens a session, in a cookie that scripts and other sites do not get", async () => {
    const browser = new Browser();
    await browser.signIn("password", { email: " ADA@example.test ", password: PASSWORD });
    expect(await browser.person()).toMatchObject({ userId, name: "Ada", email });
    const cookie = browser.set.find((c) => c.startsWith("authjs.session-token="));
    expect(cookie).toMatch(/HttpOnly/i);
    expect(cookie).toMatch(/SameSite=Lax/i);
  });

  test("a wrong one, or an address nobody has, leads to one and the same refusal", async () => {
    const refusals = [];
    for (const who of [email, "nobody@example.test"]) {
      const browser = new Browser();
      const response = await browser.signIn("password", { email: who, password: "not this one" });
      expect(await browser.person()).toBeNull();
      refusals.push([response.status, response.headers.get("location")]);
    }
    expect(refusals[0]).toEqual(refusals[1]);
  });

  test("without the form's own token nothing happens", async () => {
    const browser = new Browser();
    await browser.ask("callback/password", { email, password: PASSWORD });
    expect(await browser.person()).toBeNull();
  });

  test("each sign-in is a session of its own, and ends the one that this browser had, whoever's it was", async () => {
    const [browser, phone] = [new Browser(), new Browser()];
    await phone.signIn("password", { email, password: PASSWORD });
    await browser.signIn("password", { email, password: PASSWORD });
    const first = (await browser.person())?.sessionId ?? "";
    expect(await findPerson(first)).not.toBeNull();
    await browser.signIn("password", { email, password: PASSWORD });
    const second = (await browser.person())?.sessionId ?? "";
    expect(second).not.toBe(first);
    expect(await findPerson(first)).toBeNull();
    await browser.signIn("link", { token: await issueToken("sign-in", email, userId) });
    expect(await browser.person()).toMatchObject({ userId });
    expect(await findPerson(second)).toBeNull();
    expect(await phone.person()).not.toBeNull();
  });

  test("a refused one leaves the session that was there", async () => {
    const browser = new Browser();
    await browser.signIn("password", { email, password: PASSWORD });
    await browser.signIn("password", { email, password: "not this one" });
    expect(await browser.person()).not.toBeNull();
  });
});

describe("with a mailed link", () => {
  test("it signs in once", async () => {
    const token = await issueToken("sign-in", email, userId);
    const browser = new Browser();
    await browser.signIn("link", { token });
    expect(await browser.person()).toMatchObject({ userId });
    const second = new Browser();
    await second.signIn("link", { token });
    expect(await second.person()).toBeNull();
  });

  test("a link for a reset does not sign in", async () => {
    const browser = new Browser();
    await browser.signIn("link", { token: await issueToken("reset", email, userId) });
    expect(await browser.person()).toBeNull();
  });
});

describe("signed out", () => {
  test("a kept copy of the cookie is worth nothing", async () => {
    const browser = new Browser();
    await browser.signIn("password", { email, password: PASSWORD });
    const copy = new Browser();
    for (const [name, value] of browser.cookies) copy.cookies.set(name, value);
    expect(await copy.person()).not.toBeNull();
    const { csrfToken } = (await (await browser.ask("csrf")).json()) as { csrfToken: string };
    await browser.ask("signout", { csrfToken });
    expect(await browser.person()).toBeNull();
    expect(await copy.person()).toBeNull();
    expect(await (await copy.ask("session")).json()).toBeNull();
  });

  test("everywhere at once, Auth.js's own session route included", async () => {
    const browser = new Browser();
    await browser.signIn("password", { email, password: PASSWORD });
    expect(await (await browser.ask("session")).json()).toMatchObject({ user: { id: userId } });
    await endSessionsOf(userId, null);
    expect(await browser.person()).toBeNull();
    expect(await (await browser.ask("session")).json()).toBeNull();
  });
});
