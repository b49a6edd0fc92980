import { inspect } from "node:util";
import { eq, sql } from "drizzle-orm";
import { afterEach, beforeAll, describe, expect, test, vi } from "vitest";
import * as z from "zod";
import { boats } from "@/db/schema/boats";
import { Id } from "@/lib/core/contract/id";
import { Problem, ProblemBody } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";
import { endpoint, type Handler } from "@/lib/server/web/endpoint";
import { openapi } from "@/lib/server/web/openapi";
import { personalEndpoint } from "@/lib/server/web/personal-endpoint";
import { testDatabase } from "../support/database";
import { addFleet, addMember, addPerson, cookieOf, type TestPerson } from "../support/people";

const params = z.object({ fleetId: Id });
const BoatShape = z.strictObject({ id: Id, name: z.string().min(1).max(20), version: z.number() });

const POST = endpoint({
  permission: "boat:write",
  summary: "Add a boat",
  params,
  input: BoatShape.pick({ id: true, name: true }),
  output: BoatShape,
  status: 201,
  maxBytes: 1000,
  run: async ({ tx, fleetId }, { input }) => {
    const [row] = await tx
      .insert(boats)
      .values({ fleetId, ...input })
      .returning({ id: boats.id, name: boats.name, version: boats.version });
    if (!row) throw Problem.notFound();
    return row;
  },
});
const GET = endpoint({
  permission: "fleet:read",
  summary: "The boats",
  params,
  query: z.object({ limit: z.coerce.number().int().max(10).default(5) }),
  output: z.array(BoatShape),
  run: ({ tx }, { query }) => tx.select({ id: boats.id, name: boats.name, version: boats.version }).from(boats).limit(query.limit),
});
const PATCH = endpoint({
  permission: "boat:write",
  summary: "Rename a boat",
  params: params.extend({ boatId: Id }),
  input: z.object({ name: z.string() }),
  output: BoatShape,
  versioned: true,
  run: async ({ tx }, { params: where, input, version }) => {
    const [row] = await tx.select({ id: boats.id, name: boats.name, version: boats.version }).from(boats).where(eq(boats.id, where.boatId));
    if (!row) throw Problem.notFound();
    if (row.version !== version) throw Problem.stale(row);
    await tx
      .update(boats)
      .set({ name: input.name, version: version + 1 })
      .where(eq(boats.id, where.boatId));
    return { ...row, name: input.name, version: version + 1 };
  },
});
const DELETE = endpoint({ permission: "boat:remove", summary: "Remove", params, run: async () => undefined });
const PUT = endpoint({
  permission: "file:write",
  summary: "A photo",
  params,
  raw: { accepts: ["image/png"], maxBytes: 100 },
  output: z.object({ size: z.number() }),
  run: async (_scope, { bytes }) => ({ size: bytes.body.byteLength }),
});

let owner: TestPerson, skipper: TestPerson, stranger: TestPerson;
let fleetId: string, otherFleetId: string;
const site = "http://localhost:3000";

beforeAll(async () => {
  process.env.AUTH_URL = site;
  await testDatabase();
  [owner, skipper, stranger] = [await addPerson({ name: "Olga" }), await addPerson({ name: "Sven" }), await addPerson({ name: "Stig" })];
  fleetId = await addFleet("A fleet", owner);
  otherFleetId = await addFleet("Another", stranger);
  await addMember(fleetId, skipper, ["skipper"]);
});
afterEach(() => vi.restoreAllMocks());

type Asked = {
  as?: TestPerson | null;
  method?: string;
  body?: BodyInit;
  headers?: Record<string, string>;
  params?: Record<string, string>;
  search?: string;
};
async function ask(
  handler: Handler,
  { as = owner, method = "GET", body, headers = {}, params: where = { fleetId }, search = "" }: Asked = {},
) {
  const request = new Request(`${site}/api/v1/x${search}`, {
    method,
    ...(body !== undefined && { body }),
    headers: { host: "localhost:3000", ...(as && { cookie: await cookieOf(as) }), ...headers },
  });
  return handler(request, { params: Promise.resolve(where) });
}
const json = (value: unknown, more: Asked = {}): Asked => ({
  method: "POST",
  body: JSON.stringify(value),
  ...more,
  headers: { "content-type": "application/json", ...more.headers },
});
const boat = (name = "Petrel") => ({ id: crypto.randomUUID(), name });

async function expectProblem(response: Response, status: number, code: string) {
  expect(response.status).toBe(status);
  expect(response.headers.get("content-type")).toBe("application/problem+json");
  expect(response.headers.get("cache-control")).toBe("no-store");
  const body = ProblemBody.parse(await response.json());
  expect(body).toMatchObject({ type: `urn:gudgeon:problem:${code}`, status });
  return body;
}

describe("who asks", () => {
  test("a member gets the answer, with the version as its ETag", async () => {
    const response = await ask(POST, json(boat()));
    expect(response.status).toBe(201);
    expect(response.headers.get("etag")).toBe('"1"');
    expect(response.headers.get("cache-control")).toBe("private, no-store");
    expect(await response.json()).toMatchObject({ name: "Petrel", version: 1 });
  });

  test("nobody: 401, before the body is looked at", async () => {
    await expectProblem(await ask(POST, { ...json(boat()), as: null, body: "{{{" }), 401, "signed-out");
  });

  test("a cookie that we did not sign: 401", async () => {
    const [name, value] = (await cookieOf(owner)).split("=") as [string, string];
    for (const forged of [`${name}=${value.slice(0, -4)}AAAA`, `${name}=x`, `${name}=`]) {
      await expectProblem(await ask(GET, { as: null, headers: { cookie: forged } }), 401, "signed-out");
    }
  });

  test("a stranger to the fleet: 404, like a fleet that is not there or cannot be", async () => {
    const detail = (await expectProblem(await ask(GET, { as: stranger }), 404, "not-found")).detail;
    for (const other of [crypto.randomUUID(), "not-an-id", "' or 1=1 --"]) {
      expect((await expectProblem(await ask(GET, { params: { fleetId: other } }), 404, "not-found")).detail).toBe(detail);
    }
    await expectProblem(await ask(POST, { ...json(boat()), as: stranger, body: "{{{" }), 404, "not-found");
  });

  test("a member without the permission: 403", async () => {
    await expectProblem(await ask(DELETE, { as: skipper, method: "DELETE" }), 403, "not-allowed");
    expect((await ask(DELETE, { method: "DELETE" })).status).toBe(204);
  });

  test("the same address shows each fleet its own", async () => {
    const response = await ask(GET, { as: stranger, params: { fleetId: otherFleetId } });
    expect(await response.json()).toEqual([]);
    expect(await (await ask(GET)).json()).not.toEqual([]);
  });
});

describe("what is asked", () => {
  test("another kind of content: 415", async () => {
    await expectProblem(await ask(POST, json(boat(), { headers: { "content-type": "text/plain" } })), 415, "wrong-media-type");
    await expectProblem(await ask(POST, { method: "POST", body: new URLSearchParams({ name: "x" }) }), 415, "wrong-media-type");
    await expectProblem(
      await ask(PUT, { method: "PUT", body: "x", headers: { "content-type": "image/svg+xml" } }),
      415,
      "wrong-media-type",
    );
  });

  test("too large: 413, whether it says so or not", async () => {
    await expectProblem(await ask(POST, json(boat("x".repeat(2000)))), 413, "too-large");
    const endless = new ReadableStream<Uint8Array>({ pull: (c) => c.enqueue(new Uint8Array(64)) });
    const request = new Request(site, {
      method: "POST",
      body: endless,
      headers: { "content-type": "application/json", cookie: await cookieOf(owner) },
      duplex: "half",
    } as RequestInit);
    await expectProblem(await POST(request, { params: Promise.resolve({ fleetId }) }), 413, "too-large");
    await expectProblem(
      await ask(PUT, { method: "PUT", body: new Uint8Array(101), headers: { "content-type": "image/png" } }),
      413,
      "too-large",
    );
  });

  test("no JSON: 400", async () => {
    await expectProblem(await ask(POST, { ...json(0), body: "{ name: " }), 400, "malformed");
    await expectProblem(await ask(POST, { ...json(0), body: new Uint8Array([0x22, 0xff, 0x22]) }), 400, "malformed");
    await expectProblem(await ask(POST, json(boat("nul\0"))), 400, "malformed");
  });

  test("JSON of another shape: 422, which names the fields", async () => {
    const body = await expectProblem(await ask(POST, json({ id: "x", name: "" })), 422, "invalid");
    expect(body.errors?.map((e) => e.path)).toEqual(["id", "name"]);
    await expectProblem(await ask(POST, json({ ...boat(), fleetId: otherFleetId })), 422, "invalid");
    await expectProblem(await ask(GET, { search: "?limit=1000" }), 422, "invalid");
  });

  test("bytes arrive whole", async () => {
    const response = await ask(PUT, { method: "PUT", body: new Uint8Array(100), headers: { "content-type": "image/png" } });
    expect(await response.json()).toEqual({ size: 100 });
  });
});

describe("a change that two may make", () => {
  test("needs If-Match (428); a stale one is 412 with what it is now", async () => {
    const mine = boat();
    await ask(POST, json(mine));
    const rename = (name: string, headers: Record<string, string>) =>
      ask(PATCH, json({ name }, { method: "PATCH", headers, params: { fleetId, boatId: mine.id } }));
    await expectProblem(await rename("Skua", {}), 428, "version-needed");
    await expectProblem(await rename("Skua", { "if-match": "*" }), 400, "malformed");
    const done = await rename("Skua", { "if-match": '"1"' });
    expect(done.status).toBe(200);
    expect(done.headers.get("etag")).toBe('"2"');
    const late = await rename("Gull", { "if-match": '"1"' });
    expect(late.headers.get("etag")).toBe('"2"');
    expect((await expectProblem(late, 412, "stale")).current).toMatchObject({ name: "Skua", version: 2 });
  });
});

describe("a change asked for by another site", () => {
  const change = (headers: Record<string, string>) => ask(POST, json(boat(), { headers }));

  test.each<[string, Record<string, string>]>([
    ["cross-site", { "sec-fetch-site": "cross-site" }],
    ["same-site, another host", { "sec-fetch-site": "same-site", origin: "http://other.localhost:3000" }],
    ["cross-site with our own Origin made up", { "sec-fetch-site": "cross-site", origin: site }],
    ["an older browser's Origin", { origin: "https://elsewhere.example" }],
    ["another port", { origin: "http://localhost:4000" }],
    ["an Origin of null", { origin: "null" }],
  ])("is refused: %s", async (_name, headers) => {
    await expectProblem(await change(headers), 403, "cross-site");
  });

  test.each<[string, Record<string, string>]>([
    ["our own page", { "sec-fetch-site": "same-origin", origin: site }],
    ["our own page in an older browser", { origin: site }],
    ["no browser", {}],
  ])("is done for %s", async (_name, headers) => {
    expect((await change(headers)).status).toBe(201);
  });

  test("reading is not refused: a link from elsewhere may be followed", async () => {
    expect((await ask(GET, { headers: { "sec-fetch-site": "cross-site" } })).status).toBe(200);
  });
});

describe("failures", () => {
  const failing = (error: unknown) => endpoint({ permission: "fleet:read", summary: "Fails", params, run: () => Promise.reject(error) });

  test("ours are told by a reference only, and logged with it", async () => {
    const log = vi.spyOn(console, "error").mockImplementation(() => undefined);
    const body = await expectProblem(await ask(failing(new Error("password of the database is swordfish"))), 500, "failure");
    expect(JSON.stringify(body)).not.toContain("swordfish");
    expect(String(log.mock.calls[0]?.[0])).toContain(String(body.reference));
  });

  test("what was to be written into the database does not get into the log", async () => {
    const log = vi.spyOn(console, "error").mockImplementation(() => undefined);
    const write = endpoint({
      permission: "fleet:read",
      summary: "Write",
      params,
      run: async ({ tx }) => void (await tx.execute(sql`insert into boats_that_are_not_there values (${"swordfish"})`)),
    });
    expect((await ask(write)).status).toBe(500);
    const logged = inspect(log.mock.calls, { depth: 9 });
    expect(logged).toContain("boats_that_are_not_there");
    expect(logged).not.toContain("swordfish");
  });

  test("text that the database cannot keep is the asker's to mend", async () => {
    const search = endpoint({
      permission: "fleet:read",
      summary: "Search",
      params,
      query: z.object({ q: z.string() }),
      run: async ({ tx }, { query }) => void (await tx.select().from(boats).where(eq(boats.name, query.q))),
    });
    await expectProblem(await ask(search, { search: "?q=%00" }), 400, "malformed");
  });

  test("nothing is kept of a change that failed half way", async () => {
    vi.spyOn(console, "error").mockImplementation(() => undefined);
    const half = endpoint({
      permission: "boat:write",
      summary: "Half",
      params,
      run: async ({ tx, fleetId: fleet }) => {
        await tx.insert(boats).values({ fleetId: fleet, id: crypto.randomUUID(), name: "Half done" });
        throw new Error("in the middle");
      },
    });
    expect((await ask(half, { method: "POST" })).status).toBe(500);
    expect(JSON.stringify(await (await ask(GET, { search: "?limit=10" })).json())).not.toContain("Half done");
  });

  test("the same id twice is a conflict; a statement that takes too long says try again", async () => {
    vi.spyOn(console, "error").mockImplementation(() => undefined);
    const mine = boat();
    await ask(POST, json(mine));
    await expectProblem(await ask(POST, json(mine)), 409, "conflict");
    const slow = endpoint({
      permission: "fleet:read",
      summary: "Slow",
      params,
      run: async ({ tx }) => {
        await tx.execute(sql`set local statement_timeout = 50`);
        await tx.execute(sql`select pg_sleep(5)`);
      },
    });
    const response = await ask(slow);
    expect(response.headers.get("retry-after")).toBe("5");
    await expectProblem(response, 503, "unavailable");
  });

  test("an answer of another shape than promised never leaves", async () => {
    vi.spyOn(console, "error").mockImplementation(() => undefined);
    const leaky = endpoint({
      permission: "fleet:read",
      summary: "Leaky",
      params,
      output: BoatShape,
      run: async () => ({ ...boat(), version: 1, secret: "swordfish" }),
    });
    const response = await ask(leaky);
    expect(response.status).toBe(500);
    expect(await response.text()).not.toContain("swordfish");
  });
});

test("a statement is given five seconds and the transaction its fleet, for this transaction only", async () => {
  const look = endpoint({
    permission: "fleet:read",
    summary: "Settings",
    params,
    output: z.object({ fleet: z.string(), timeout: z.string() }),
    run: async ({ tx }) => {
      const { rows } = await tx.execute<{ fleet: string; timeout: string }>(
        sql`select current_setting('app.fleet_id') as fleet, current_setting('statement_timeout') as timeout`,
      );
      return rows[0] ?? { fleet: "", timeout: "" };
    },
  });
  expect(await (await ask(look)).json()).toEqual({ fleet: fleetId, timeout: "5s" });
});

test("a route about oneself needs no fleet", async () => {
  const me = personalEndpoint({
    permission: "signed-in",
    summary: "Me",
    output: z.object({ name: z.string() }),
    run: async (person) => ({ name: person.name }),
  });
  expect(await (await ask(me, { params: {} })).json()).toEqual({ name: "Olga" });
  await expectProblem(await ask(me, { as: null, params: {} }), 401, "signed-out");
});

test("a command cannot be reached without its permission: it does not compile", () => {
  const remove = async (_scope: FleetScope<"boat:remove">) => undefined;
  const anyMember = async (_scope: FleetScope) => undefined;
  endpoint({ permission: "boat:remove", summary: "Remove", params, run: remove });
  endpoint({ permission: "fleet:read", summary: "Look", params, run: anyMember });
  // @ts-expect-error another permission was proved
  endpoint({ permission: "fleet:read", summary: "Remove", params, run: remove });
  // @ts-expect-error a scope is not made by hand
  const forged: FleetScope<"boat:remove"> = {
    fleetId,
    actor: { userId: "", name: "", email: "", roles: ["owner"] },
    tx: undefined as never,
  };
  expect(forged).toBeDefined();
});

test("the OpenAPI document is made of the same objects", () => {
  const document = openapi({ "/fleets/{fleetId}/boats": { GET, POST }, "/fleets/{fleetId}/boats/{boatId}": { PATCH } });
  const paths = document.paths ?? {};
  expect(Object.keys(paths)).toEqual(["/api/v1/fleets/{fleetId}/boats", "/api/v1/fleets/{fleetId}/boats/{boatId}"]);
  const patch = paths["/api/v1/fleets/{fleetId}/boats/{boatId}"]?.patch;
  expect(Object.keys(patch?.responses ?? {})).toEqual(expect.arrayContaining(["200", "401", "403", "404", "412", "422", "428"]));
  expect(patch?.parameters).toEqual(
    expect.arrayContaining([
      expect.objectContaining({ name: "boatId", in: "path" }),
      expect.objectContaining({ name: "if-match", in: "header" }),
    ]),
  );
  expect(paths["/api/v1/fleets/{fleetId}/boats"]?.post?.requestBody).toMatchObject({
    content: { "application/json": { schema: { required: ["id", "name"] } } },
  });
});
