import { mkdtempSync } from "node:fs";
import os from "node:os";
import sharp from "sharp";
import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { Phone } from "@/lib/core/contract/phone";
import { ProblemBody } from "@/lib/core/contract/problem";
import { MAX_UPLOAD_BYTES } from "@/lib/server/files/picture";
import { afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { call, type Asked } from "../support/call";
import { testDatabase } from "../support/database";

let treeId: string;
let ines: Afloat;

beforeAll(async () => {
  const { owner } = await testDatabase();
  process.env.FILES_DIR = mkdtempSync(`${os.tmpdir()}/gudgeon-files-`);
  treeId = await shipTree(owner);
  ines = await afloat("Ines");
});

const at = (path: string) => `/fleets/${ines.fleetId}${path}`;
const get = async (path: string): Promise<unknown> => (await call("GET", at(path), { as: ines.person })).json();
const problem = async (answer: Response, status: number) => {
  expect(answer.status).toBe(status);
  expect(answer.headers.get("content-type")).toBe("application/problem+json");
  const body = ProblemBody.parse(await answer.json());
  expect(body.status).toBe(status);
  expect(body.type).toMatch(/^urn:gudgeon:problem:[a-z-]+$/);
  expect(body.detail.length).toBeGreaterThan(5);
  return body;
};
const postBoat = (asked: Asked) => call("POST", at("/boats"), { as: ines.person, ...asked });

describe("problems", () => {
  test("name the fields of what is not right", async () => {
    const body = await problem(await postBoat({ body: { id: "x", name: "", colour: "red" } }), 422);
    expect(body.errors?.map((error) => error.path)).toEqual(expect.arrayContaining(["id", "name"]));
  });

  test.each([
    ["what is no JSON", { body: '{"id":' }, 400],
    ["what is not said to be JSON", { body: "id=1", type: "application/x-www-form-urlencoded" }, 415],
    ["a megabyte and more", { body: `{"name":"${"x".repeat(1_000_001)}"}` }, 413],
    ["text that no database can hold", { body: { id: uuidv7(), name: "Pet\0rel" } }, 400],
    ["half a letter", { body: JSON.stringify({ id: uuidv7(), name: "Petrel" }).replace("Petrel", "\\ud800") }, 400],
  ] as [string, Asked, number][])("refuse %s", async (_what, asked, status) => {
    await problem(await postBoat(asked), status);
  });

  test("an address that cannot be one of ours is not found", async () => {
    await problem(await call("GET", at("/boats/drop%20table"), { as: ines.person }), 404);
  });
});

describe("a change of what two people may edit", () => {
  test("needs the version it was made from, and is told the present one when that is old", async () => {
    const boat = at(`/boats/${ines.boatId}`);
    const seen = await call("GET", boat, { as: ines.person });
    expect(seen.headers.get("etag")).toBe('"1"');
    const change = (version?: number | string) =>
      call("PATCH", boat, { as: ines.person, body: { name: "Storm petrel" }, ...(version === undefined ? {} : { version }) });
    await problem(await change(), 428);
    await problem(await change("yesterday's"), 400);
    expect((await change(1)).headers.get("etag")).toBe('"2"');
    const stale = await change(1);
    expect(stale.headers.get("etag")).toBe('"2"');
    expect(await problem(stale, 412)).toMatchObject({ current: { name: "Storm petrel", version: 2 } });
  });
});

describe("events over the wire", () => {
  test("posting again is harmless, and each is told what became of it", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const events = [
      phone.begin(ines.engineId, treeId),
      phone.write("answered", { check: "filter-vacuum", answer: { value: 5, unit: "parsec" }, photos: [] }),
      phone.write("runs-again", {}),
    ];
    const post = async (sent: readonly object[]) =>
      (await call("POST", at(`/diagnoses/${id}/events`), { as: ines.person, body: { events: sent } })).json();
    expect(await post(events)).toMatchObject({
      receipts: [{ result: "stored" }, { result: "rejected", because: expect.stringMatching(/parsec/) }, { result: "stored" }],
    });
    expect(await post(events)).toMatchObject({ receipts: [{ result: "duplicate" }, { result: "rejected" }, { result: "duplicate" }] });
    const kept = (await get(`/diagnoses/${id}/events`)) as { events: { id: string; by: string; byName: string }[] };
    expect(kept.events).toMatchObject([{ id: events[0]?.id, by: ines.person.userId, byName: "Ines" }, { id: events[2]?.id }]);
    expect(await get(`/diagnoses?open=yes`)).toMatchObject({ items: [{ id, outcome: null }], next: null });
    expect(await get(`/diagnoses/${id}/story`)).toMatchObject({
      treeNumber: expect.any(Number),
      steps: [{ title: "What is wrong" }, { title: "It runs again by itself" }],
    });
  });

  test("a character that no database can keep is left out of what somebody wrote, and elsewhere is that event's own fault", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const events = [
      phone.begin(ines.engineId, treeId, { complaint: "wont\0 rev" }),
      phone.write("noted", { note: "thumbs \ud83d", photos: [] }),
      phone.write("answered", { check: "filter-vacuum", answer: { value: 5, unit: "in\0Hg" }, photos: [] }),
      phone.write("noted", { note: "after it", photos: [] }, { seen: { "\ud800": 1 } }),
      phone.write("runs-again", {}),
    ];
    const post = async () => (await call("POST", at(`/diagnoses/${id}/events`), { as: ines.person, body: { events } })).json();
    const results = async () => ((await post()) as { receipts: { result: string }[] }).receipts.map(({ result }) => result);
    expect(await results()).toEqual(["stored", "stored", "rejected", "rejected", "stored"]);
    expect(await results()).toEqual(["duplicate", "duplicate", "rejected", "rejected", "duplicate"]);
    expect(await get(`/diagnoses/${id}/events`)).toMatchObject({
      events: [{ payload: { complaint: "wont rev" } }, { payload: { note: "thumbs \ufffd" } }, { kind: "runs-again" }],
    });
  });

  test("a beginning that cannot be read takes what follows with it, in one answer, so that the outbox empties", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const begun = { ...phone.begin(ines.engineId, treeId), madeAt: "yesterday" };
    const events = [begun, phone.write("runs-again", {})];
    const answer = await call("POST", at(`/diagnoses/${id}/events`), { as: ines.person, body: { events } });
    expect(answer.status).toBe(200);
    expect(await answer.json()).toMatchObject({
      receipts: [{ result: "rejected" }, { result: "rejected", because: expect.stringMatching(/not begun/) }],
    });
    await problem(await call("POST", at(`/diagnoses/${id}/events`), { as: ines.person, body: { events: [events[1]] } }), 404);
  });

  test("an empty batch, one without ids and one too long are refused whole", async () => {
    const id = uuidv7();
    for (const events of [[], [{ kind: "begun" }], Array.from({ length: 501 }, () => ({ id: uuidv7() }))]) {
      await problem(await call("POST", at(`/diagnoses/${id}/events`), { as: ines.person, body: { events } }), 422);
    }
  });
});

describe("photos over the wire", () => {
  const put = (bytes: Uint8Array, type: string, headers: Record<string, string> = {}) =>
    call("PUT", at(`/files/${uuidv7()}`), { as: ines.person, bytes, type, headers });

  test("over 8 MB are refused, said or unsaid", async () => {
    await problem(await put(new Uint8Array(10), "image/jpeg", { "content-length": String(MAX_UPLOAD_BYTES + 1) }), 413);
    await problem(await put(new Uint8Array(MAX_UPLOAD_BYTES + 1), "image/jpeg"), 413);
  });

  test("that are none are refused, whatever they are called", async () => {
    await problem(await put(Buffer.from("<svg xmlns='http://www.w3.org/2000/svg'/>"), "image/jpeg"), 415);
    await problem(await put(Buffer.from("hello"), "text/plain"), 415);
  });

  test("come back as they are kept", async () => {
    const photo = await sharp({ create: { width: 8, height: 8, channels: 3, background: "#abc" } })
      .webp()
      .toBuffer();
    const kept = (await (await put(photo, "image/webp")).json()) as { id: string };
    const answer = await call("GET", at(`/files/${kept.id}`), { as: ines.person });
    expect(answer.headers.get("content-type")).toBe("image/jpeg");
    expect(answer.headers.get("x-content-type-options")).toBe("nosniff");
    expect((await sharp(await answer.bytes()).metadata()).width).toBe(8);
  });
});

describe("what the phone keeps", () => {
  test("is all it needs: boats, engines, open diagnoses with their events, the log, the tree's version, odds by engine", async () => {
    const who = await afloat("Runa");
    const repair = (n: number) =>
      call("POST", `/fleets/${who.fleetId}/engines/${who.engineId}/repairs`, {
        as: who.person,
        body: {
          id: uuidv7(),
          engineId: who.engineId,
          doneAt: `2026-03-0${n}T10:00:00+02:00`,
          outcome: "cured",
          cause: "filter-blocked",
          engineHours: n * 10,
          symptoms: ["lost-rpm"],
        },
      });
    expect((await repair(1)).status).toBe(201);
    expect((await repair(2)).status).toBe(201);
    const id = uuidv7();
    const phone = phoneOf(id);
    const events = [
      phone.begin(who.engineId, treeId),
      phone.write("answered", { check: "bowl-look", answer: { finding: "slime" }, photos: [] }),
    ];
    await call("POST", `/fleets/${who.fleetId}/diagnoses/${id}/events`, { as: who.person, body: { events } });

    const kept = Phone.parse(await (await call("GET", `/fleets/${who.fleetId}/phone`, { as: who.person })).json());
    expect(kept).toMatchObject({
      fleet: { id: who.fleetId, name: "Runa's boats" },
      roles: ["owner", "skipper", "mechanic"],
      boats: [{ id: who.boatId }],
      engines: [{ id: who.engineId, hours: 20 }],
      openDiagnoses: [{ id, engineId: who.engineId, treeVersionId: treeId, events }],
      treeVersion: { id: treeId },
    });
    expect(kept.recentLog.map((line) => [line.outcome, line.timesHere])).toEqual([
      [null, 0],
      ["cured", 2],
      ["cured", 1],
    ]);
    expect(kept.multipliers[who.engineId]).toMatchObject([{ cause: "filter-blocked", times: expect.any(Number) }]);
    const tree = await (await call("GET", `/fleets/${who.fleetId}/trees/versions/${kept.treeVersion.id}`, { as: who.person })).json();
    expect(tree).toMatchObject({ from: "shipped", hash: kept.treeVersion.hash, document: { key: "small" } });
    expect(await (await call("GET", `/fleets/${who.fleetId}/engines/${who.engineId}/repeats`, { as: who.person })).json()).toMatchObject({
      items: [{ count: 2, gapsHours: [10] }],
    });
    expect(await (await call("GET", `/fleets/${who.fleetId}/engines/${who.engineId}/evidence`, { as: who.person })).json()).toMatchObject({
      items: [{ cause: "filter-blocked", trend: "too-few", frequency: "no-fleet" }],
    });
  });

  test("me says who is signed in and where they belong", async () => {
    const answer = await (await call("GET", "/me", { as: ines.person })).json();
    expect(answer).toMatchObject({
      user: { id: ines.person.userId, name: "Ines" },
      fleets: [{ id: ines.fleetId, roles: ["owner", "skipper", "mechanic"] }],
    });
    await problem(await call("GET", "/me"), 401);
  });
});
