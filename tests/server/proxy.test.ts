import { NextRequest } from "next/server";
import { beforeAll, describe, expect, test } from "vitest";
import { contentSecurityPolicy, scriptHash, securityHeaders } from "@/lib/server/web/content-security";
import { ownPath } from "@/lib/server/web/own-path";
import { proxy } from "@/proxy";
import { cookieOf } from "../support/people";

const site = "http://localhost:3000";

beforeAll(() => {
  process.env.AUTH_URL = site;
  process.env.AUTH_SECRET = "a secret of this test, long enough";
});

const visit = async (path: string, cookie?: string) => proxy(new NextRequest(site + path, { headers: cookie ? { cookie } : {} }));
const directive = (response: Response, name: string) =>
  (response.headers.get("content-security-policy") ?? "")
    .split("; ")
    .find((d) => d.startsWith(`${name} `))
    ?.slice(name.length + 1);

describe("a visitor who is signed out", () => {
  test.each(["/account", "/f", "/f/0198c0de-0000-7000-8000-000000000001", "/f/x/log?cause=blocked"])(
    "is led from %s to sign in, and back",
    async (path) => {
      const response = await visit(path);
      expect(response.status).toBe(307);
      const to = new URL(response.headers.get("location") ?? "");
      expect(to.pathname).toBe("/sign-in");
      expect(to.searchParams.get("next")).toBe(path);
    },
  );

  test.each(["/", "/sign-in", "/diagnose", "/api/v1/me", "/fleets", "/invitation/abc"])("is let through to %s", async (path) => {
    expect((await visit(path)).headers.get("location")).toBeNull();
  });

  test("with a cookie that we did not sign is signed out", async () => {
    expect((await visit("/account", "authjs.session-token=made-up")).status).toBe(307);
    const ours = await cookieOf({ sessionId: crypto.randomUUID() });
    expect((await visit("/account", ours)).headers.get("location")).toBeNull();
  });
});

describe("the policy of a page", () => {
  test("names a nonce of its own on each visit, and hands it to Next", async () => {
    const nonces = [];
    for (let i = 0; i < 3; i++) {
      const response = await visit("/sign-in");
      const nonce = /'nonce-([^']+)'/.exec(directive(response, "script-src") ?? "")?.[1];
      expect(response.headers.get("x-middleware-request-content-security-policy")).toContain(`'nonce-${nonce}'`);
      nonces.push(nonce);
    }
    expect(new Set(nonces).size).toBe(3);
    expect(nonces.every((n) => n && Buffer.from(n, "base64").length === 16)).toBe(true);
  });

  test("runs no script that is not named, and lets no other site frame or receive", async () => {
    const response = await visit("/");
    expect(directive(response, "script-src")).not.toMatch(/unsafe|https?:|\*/);
    expect(directive(response, "style-src")).not.toMatch(/unsafe/);
    expect(directive(response, "frame-ancestors")).toBe("'none'");
    expect(directive(response, "object-src")).toBe("'none'");
    expect(directive(response, "base-uri")).toBe("'none'");
    expect(directive(response, "form-action")).toBe("'self'");
    expect(directive(response, "default-src")).toBe("'self'");
  });

  test("names the scripts of pages made beforehand, as the start command hands them on", async () => {
    const hash = scriptHash("let a = 1");
    process.env.SCRIPT_HASHES = `${hash.replaceAll("'", "")} 'unsafe-inline' https://elsewhere.example ${scriptHash("let b = 2")}`;
    const allowed = directive(await visit("/diagnose"), "script-src");
    delete process.env.SCRIPT_HASHES;
    expect(allowed).toContain(hash);
    expect(allowed).toContain(scriptHash("let b = 2"));
    expect(allowed).not.toMatch(/unsafe|elsewhere/);
  });

  test("names a script by the hash that browsers work out", () => {
    const hash = scriptHash("let a = 1");
    // Worked out with: printf "let a = 1" | openssl dgst -sha256 -binary | base64
    expect(hash).toBe("'sha256-LAfYd7pbFUgwfQu8b4q135PeTG2z+/coPEUYCd74eCQ='");
  });

  test("over https, everything stays on https", () => {
    expect(contentSecurityPolicy({ scripts: [], development: false, secure: true })).toContain("upgrade-insecure-requests");
    expect(securityHeaders(true)["strict-transport-security"]).toMatch(/max-age=31536000/);
    expect(securityHeaders(false)).not.toHaveProperty("strict-transport-security");
  });
});

test("every answer carries the headers, redirects too", async () => {
  for (const path of ["/", "/account", "/api/v1/me"]) {
    const { headers } = await visit(path);
    expect(headers.get("x-content-type-options")).toBe("nosniff");
    expect(headers.get("x-frame-options")).toBe("DENY");
    expect(headers.get("referrer-policy")).toBe("same-origin");
    expect(headers.get("permissions-policy")).toContain("geolocation=(self)");
    expect(headers.get("content-security-policy")).toBeTruthy();
  }
});

describe("where to go on after signing in", () => {
  test.each([
    ["/f/abc/log?x=1#y", "/f/abc/log?x=1#y"],
    ["/", "/"],
  ])("%s is ours", (given, to) => expect(ownPath(given)).toBe(to));

  test.each([
    "//elsewhere.example",
    "/\\elsewhere.example",
    "https://elsewhere.example",
    "javascript:alert(1)",
    "",
    "f/abc",
    "/\t/elsewhere.example",
    "/a\\b",
    "/.//elsewhere.example",
    "/a/..//elsewhere.example",
    "/%2e//elsewhere.example",
  ])("%j is not", (given) => expect(ownPath(given)).toBeNull());
});
