import { mkdtempSync } from "node:fs";
import os from "node:os";
import sharp from "sharp";
import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { routes } from "@/app/api/v1/routes";
import type { Verb } from "@/lib/server/web/openapi";
import { prove } from "@/lib/server/auth/scope";
import { keepFile } from "@/lib/server/files/commands";
import { afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { call, type Asked } from "../support/call";
import { testDatabase } from "../support/database";
import { testMailbox } from "../support/mailbox";
import { addMember, addPerson, type TestPerson } from "../support/people";

const REPAIR = { doneAt: "2026-03-01T10:00:00Z", outcome: "held", causeInWords: "Chafed hose" };
const READING = { reading: 12, readAt: "2026-03-02T10:00:00Z" };

/** Real things of one fleet, by the name they have in addresses. */
let ids: Record<string, string>;
let ines: Afloat;
let mats: Afloat;
let skipper: TestPerson;

beforeAll(async () => {
  const { owner } = await testDatabase();
  await testMailbox();
  process.env.FILES_DIR = mkdtempSync(`${os.tmpdir()}/gudgeon-files-`);
  const versionId = await shipTree(owner);
  [ines, mats] = [await afloat("Ines"), await afloat("Mats")];
  skipper = await addPerson({ name: "Sander" });
  await addMember(ines.fleetId, skipper, ["skipper"]);
  const diagnosisId = uuidv7();
  const fileId = uuidv7();
  const phone = phoneOf(diagnosisId);
  const begun = await call("POST", `/fleets/${ines.fleetId}/diagnoses/${diagnosisId}/events`, {
    as: ines.person,
    body: { events: [phone.begin(ines.engineId, versionId)] },
  });
  expect(await begun.json()).toMatchObject({ receipts: [{ result: "stored" }] });
  const photo = await sharp({ create: { width: 9, height: 9, channels: 3, background: "#123" } })
    .png()
    .toBuffer();
  await keepFile(await prove(ines.person, ines.fleetId, "file:write"), fileId, photo);
  const invited = await call("POST", `/fleets/${ines.fleetId}/invitations`, {
    as: ines.person,
    body: { id: uuidv7(), email: "guest@example.test", roles: ["skipper"] },
  });
  expect(invited.status).toBe(201);
  const [repairId, readingId] = [uuidv7(), uuidv7()];
  const written = [
    call("POST", `/fleets/${ines.fleetId}/engines/${ines.engineId}/repairs`, {
      as: ines.person,
      body: { id: repairId, engineId: ines.engineId, ...REPAIR },
    }),
    call("POST", `/fleets/${ines.fleetId}/engines/${ines.engineId}/hours`, {
      as: ines.person,
      body: { id: readingId, engineId: ines.engineId, ...READING },
    }),
  ];
  for (const answer of await Promise.all(written)) expect(answer.status).toBe(201);
  const invitationId = ((await invited.json()) as { id: string }).id;
  ids = {
    fleetId: ines.fleetId,
    boatId: ines.boatId,
    engineId: ines.engineId,
    diagnosisId,
    fileId,
    versionId,
    userId: skipper.userId,
    invitationId,
    repairId,
    readingId,
  };
});

const operations = Object.entries(routes)
  .filter(([address]) => address.includes("{fleetId}"))
  .flatMap(([address, verbs]) => Object.entries(verbs).map(([verb, handler]) => ({ verb: verb as Verb, address, spec: handler.spec })));

const inAddress = (address: string, given: Record<string, string>) =>
  address.replaceAll(/\{(\w+)\}/g, (_, name: string) => given[name] ?? "missing");

/** Something well-formed for any verb: what is refused must be the person, not the content. */
const filled = (verb: Verb): Asked =>
  verb === "GET" ? {} : verb === "PUT" ? { bytes: new Uint8Array(9), type: "image/png", version: 1 } : { body: {}, version: 1 };

describe.each(operations)("$verb $address", ({ verb, address, spec }) => {
  test("is 401 for somebody signed out", async () => {
    const answer = await call(verb, inAddress(address, ids), filled(verb));
    expect(answer.status).toBe(401);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
  });

  test("is 404 for a stranger, told apart from nothing that is not there", async () => {
    const real = await call(verb, inAddress(address, ids), { as: mats.person, ...filled(verb) });
    const never = await call(verb, inAddress(address, { ...ids, fleetId: uuidv7() }), { as: mats.person, ...filled(verb) });
    expect([real.status, never.status]).toEqual([404, 404]);
    expect(await real.text()).toBe(await never.text());
  });

  test("is 404 for another fleet's things under one's own fleet's address", async () => {
    // Trees that are shipped belong to everyone, and lists hold one's own.
    if (!address.replace("/fleets/{fleetId}", "").includes("{") || address.includes("versions") || spec.status === 201) return;
    if (verb === "PUT" && spec.raw) return; // one's own photo under an id that another fleet uses too
    const body =
      address.endsWith("events") && verb === "POST"
        ? { body: { events: [phoneOf(ids.diagnosisId ?? "").write("runs-again", {})] } }
        : spec.input
          ? validChange(address)
          : {};
    const sent = spec.input ? { version: 1, ...body } : { ...filled(verb), ...body };
    const answer = await call(verb, inAddress(address, { ...ids, fleetId: mats.fleetId }), { as: mats.person, ...sent });
    expect(answer.status).toBe(404);
  });
});

function validChange(address: string): Asked {
  if (address.includes("repairs")) return { body: REPAIR };
  if (address.includes("hours")) return { body: READING };
  return { body: address.includes("people") ? { roles: ["skipper"] } : { name: "Taken over" } };
}

test("nothing of the fleet has changed by all this", async () => {
  const boats = await (await call("GET", `/fleets/${ines.fleetId}/boats`, { as: ines.person })).json();
  expect(boats).toMatchObject({ items: [{ name: "Petrel", version: 1 }] });
  const events = (await (await call("GET", `/fleets/${ines.fleetId}/diagnoses/${ids.diagnosisId}/events`, { as: ines.person })).json()) as {
    events: unknown[];
  };
  expect(events.events).toHaveLength(1);
  const engine = `/fleets/${ines.fleetId}/engines/${ines.engineId}`;
  for (const line of [`${engine}/repairs/${ids.repairId}`, `${engine}/hours/${ids.readingId}`])
    expect(await (await call("GET", line, { as: ines.person })).json()).toMatchObject({ version: 1, corrections: [], takenBackAt: null });
});

test("a repair and a reading are corrected with the version that was seen, and say so to who comes too late", async () => {
  const engine = `/fleets/${ines.fleetId}/engines/${ines.engineId}`;
  for (const [line, body] of [
    [`${engine}/repairs/${ids.repairId}`, { ...REPAIR, note: "Right" }],
    [`${engine}/hours/${ids.readingId}`, { ...READING, reading: 13 }],
  ] as const) {
    const put = (version?: number) => call("PUT", line, { as: skipper, body, ...(version === undefined ? {} : { version }) });
    expect((await put()).status).toBe(428);
    const done = await put(1);
    expect([done.status, done.headers.get("etag")]).toEqual([200, '"2"']);
    expect(await done.json()).toMatchObject({ version: 2, corrections: [{ version: 1, by: "Sander" }] });
    const late = await put(1);
    expect([late.status, late.headers.get("etag")]).toEqual([412, '"2"']);
    expect((await call("DELETE", line, { as: skipper, version: 1 })).status).toBe(412);
    expect((await call("DELETE", line, { as: skipper, version: 2 })).status).toBe(204);
    expect(await (await call("GET", line, { as: ines.person })).json()).toMatchObject({ takenBackAt: expect.any(String), version: 3 });
  }
});

test("no answer may be kept by a cache between here and there", async () => {
  for (const { verb, address, spec } of operations) {
    if (verb !== "GET") continue;
    const answer = await call(verb, inAddress(address, ids), { as: ines.person });
    // The fleet has no draft.
    const isThere = !address.includes("/trees/draft");
    expect(answer.status, address).toBe(isThere ? 200 : 404);
    // Bytes that never change under their address may stay in this person's own browser.
    expect(answer.headers.get("cache-control"), address).toMatch(isThere && !spec.output ? /^private/ : /no-store/);
  }
});

test("a member without the permission is told so, and may read all the same", async () => {
  const remove = await call("DELETE", `/fleets/${ines.fleetId}/boats/${ines.boatId}`, { as: skipper, version: 1 });
  expect(remove.status).toBe(403);
  expect(await remove.json()).toMatchObject({ type: "urn:gudgeon:problem:not-allowed" });
  expect((await call("GET", `/fleets/${ines.fleetId}/boats/${ines.boatId}`, { as: skipper })).status).toBe(200);
});

test("another site's page cannot ask for a change with this person's cookie", async () => {
  const answer = await call("POST", `/fleets/${ines.fleetId}/boats`, {
    as: ines.person,
    body: { id: uuidv7(), name: "Trap" },
    headers: { "sec-fetch-site": "cross-site" },
  });
  expect(answer.status).toBe(403);
});
