import { mkdtempSync } from "node:fs";
import os from "node:os";
import sharp from "sharp";
import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { routes } from "@/app/api/v1/routes";
import type { Verb } from "@/lib/server/web/openapi";
import { withScope } from "@/lib/server/auth/scope";
import { keepFile } from "@/lib/server/files/commands";
import { afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { call, type Asked } from "../support/call";
import { testDatabase } from "../support/database";
import { testMailbox } from "../support/mailbox";
import { addMember, addPerson, type TestPerson } from "../support/people";

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
  await withScope(ines.person, ines.fleetId, "file:write", (scope) => keepFile(scope, fileId, photo));
  const invited = await call("POST", `/fleets/${ines.fleetId}/invitations`, {
    as: ines.person,
    body: { id: uuidv7(), email: "guest@example.test", roles: ["skipper"] },
  });
  expect(invited.status).toBe(201);
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
    if (verb === "PUT") return; // one's own photo under an id that another fleet uses too
    const body =
      address.endsWith("events") && verb === "POST"
        ? { body: { events: [phoneOf(ids.diagnosisId ?? "").write("runs-again", {})] } }
        : spec.input
          ? validChange(address)
          : {};
    const answer = await call(verb, inAddress(address, { ...ids, fleetId: mats.fleetId }), { as: mats.person, ...filled(verb), ...body });
    expect(answer.status).toBe(404);
  });
});

const validChange = (address: string): Asked => ({ body: address.includes("people") ? { roles: ["skipper"] } : { name: "Taken over" } });

test("nothing of the fleet has changed by all this", async () => {
  const boats = await (await call("GET", `/fleets/${ines.fleetId}/boats`, { as: ines.person })).json();
  expect(boats).toMatchObject({ items: [{ name: "Petrel", version: 1 }] });
  const events = (await (await call("GET", `/fleets/${ines.fleetId}/diagnoses/${ids.diagnosisId}/events`, { as: ines.person })).json()) as {
    events: unknown[];
  };
  expect(events.events).toHaveLength(1);
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
