import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import type { Database } from "@/db/client";
import { withScope } from "@/lib/server/auth/scope";
import { recordEvents, type PostedEvent } from "@/lib/server/diagnoses/commands";
import { getDiagnosis, getEvents, listDiagnoses } from "@/lib/server/diagnoses/queries";
import { readStory } from "@/lib/server/diagnoses/story";
import { addHourReading } from "@/lib/server/engines/commands";
import { listHourReadings } from "@/lib/server/engines/readings";
import { logRepair } from "@/lib/server/log/commands";
import { getLogEntry } from "@/lib/server/log/queries";
import { addEngineTo, afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

// What a broken phone, or a member who means ill, may send.

let owner: Database;
let treeId: string;
let ines: Afloat;

beforeAll(async () => {
  ({ owner } = await testDatabase());
  treeId = await shipTree(owner);
  ines = await afloat("Ines");
});

const post = (diagnosisId: string, events: readonly object[]) =>
  withScope(ines.person, ines.fleetId, "diagnosis:write", (scope) => recordEvents(scope, diagnosisId, events as PostedEvent[]));
const read = <T>(run: Parameters<typeof withScope<"diagnosis:read", T>>[3]) => withScope(ines.person, ines.fleetId, "diagnosis:read", run);
const readings = () => read(async (scope) => (await listHourReadings(scope, ines.engineId)).items);
const write = (id: string, reading: number) =>
  withScope(ines.person, ines.fleetId, "engine:write", (scope) =>
    addHourReading(scope, { id, engineId: ines.engineId, reading, readAt: "2026-05-01T00:00:00.000Z", reset: false }),
  );

describe("a moment", () => {
  test.each(["0000-01-01T00:00:00Z", "0001-01-01T00:00:00+14:00", "9999-12-31T23:59:59-14:00"])(
    "that no database can keep (%s) is that event's own fault, and holds up no other",
    async (madeAt) => {
      const id = uuidv7();
      const phone = phoneOf(id);
      const receipts = await post(id, [phone.begin(ines.engineId, treeId), phone.write("noted", { note: "x", photos: [] }, { madeAt })]);
      expect(receipts.map((receipt) => receipt.result)).toEqual(["stored", "rejected"]);
      expect(await read((scope) => getEvents(scope, id))).toHaveLength(1);
    },
  );

  test("ahead of ours does not begin a diagnosis in the future", async () => {
    const id = uuidv7();
    await post(id, [phoneOf(id, "2199-01-01T00:00:00.000Z").begin(ines.engineId, treeId)]);
    expect(Date.parse((await read((scope) => getDiagnosis(scope, id))).begunAt)).toBeLessThanOrEqual(Date.now());
    expect(Date.parse((await read((scope) => getLogEntry(scope, id))).at)).toBeLessThanOrEqual(Date.now());
  });
});

describe("a beginning", () => {
  test("whose first form was refused does not leave the diagnosis on that one's engine", async () => {
    const second = { ...ines, engineId: uuidv7() };
    await addEngineTo(second, { name: "port" });
    const other = uuidv7();
    const taken = phoneOf(other).begin(ines.engineId, treeId);
    await post(other, [taken]);
    const id = uuidv7();
    const phone = phoneOf(id);
    const wrong = { ...phone.begin(ines.engineId, treeId), id: taken.id };
    const right = phone.begin(second.engineId, treeId);
    await post(id, [wrong, right]).catch(() => null);
    const shown = await read((scope) => listDiagnoses(scope, { limit: 200 }));
    for (const diagnosis of shown.items.filter((one) => one.id === id)) {
      const [begun] = await read((scope) => getEvents(scope, id));
      expect(begun).toMatchObject({ kind: "begun", payload: { engineId: diagnosis.engineId } });
    }
  });

  test("under the id of a repair in the log is refused, and the repair stays", async () => {
    const id = uuidv7();
    const repair = {
      id,
      engineId: ines.engineId,
      doneAt: "2026-04-01T00:00:00.000Z",
      outcome: "cured" as const,
      causeInWords: "Chafed hose",
    };
    await withScope(ines.person, ines.fleetId, "log:write", (scope) => logRepair(scope, { ...repair, parts: [], symptoms: [] }));
    const phone = phoneOf(id);
    const posted = await post(id, [phone.begin(ines.engineId, treeId)]);
    expect(posted).toMatchObject([{ result: "rejected" }]);
    expect(await read((scope) => getLogEntry(scope, id))).toMatchObject({ cause: { title: "Chafed hose" }, diagnosisId: null });
  });
});

describe("an outcome", () => {
  test("under the id of a reading of the meter is refused, and the reading stays", async () => {
    const reading = uuidv7();
    await write(reading, 77);
    const id = uuidv7();
    const phone = phoneOf(id);
    const ended = { ...phone.write("ended", { outcome: "held", parts: [] }), id: reading };
    const posted = await post(id, [phone.begin(ines.engineId, treeId), ended]);
    expect(posted.map((receipt) => receipt.result)).toEqual(["stored", "rejected"]);
    expect((await readings()).find((one) => one.id === reading)).toMatchObject({ reading: 77 });
  });

  test("keeps its id: no reading of the meter can be written under it", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const ended = phone.write("ended", { outcome: "held", parts: [] });
    await post(id, [phone.begin(ines.engineId, treeId), ended]);
    await expect(write(ended.id, 78)).rejects.toMatchObject({ status: 409 });
  });

  test("whose meter was replaced is a reading that the hours go on from", async () => {
    const cora = await afloat("Cora");
    const scope = <T>(run: Parameters<typeof withScope<"diagnosis:write" | "log:write", T>>[3]) =>
      withScope(cora.person, cora.fleetId, "diagnosis:write", run as never) as Promise<T>;
    const end = async (day: string, engineHours: number, rest: object = {}) => {
      const id = uuidv7();
      const phone = phoneOf(id, day);
      const ended = phone.write("ended", { outcome: "held", parts: [], engineHours, ...rest });
      await scope((s) => recordEvents(s as never, id, [phone.begin(cora.engineId, treeId), ended] as never));
    };
    await end("2026-05-01T00:00:00.000Z", 900);
    await end("2026-05-02T00:00:00.000Z", 5, { meterReset: true });
    const found = await withScope(cora.person, cora.fleetId, "fleet:read", async (s) => (await listHourReadings(s, cora.engineId)).items);
    expect(found).toMatchObject([
      { reading: 5, reset: true, hours: 900, doubtful: false },
      { reading: 900, reset: false },
    ]);
  });
});

describe("a diagnosis", () => {
  test("has an end: past a thousand events more are refused, and what is there stays", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const note = () => phone.write("noted", { note: "x", photos: [] });
    await post(id, [phone.begin(ines.engineId, treeId)]);
    for (let i = 0; i < 2; i++) await post(id, Array.from({ length: 500 }, note));
    expect(await post(id, [note()])).toMatchObject([{ result: "rejected" }]);
    expect(await read((scope) => getEvents(scope, id))).toHaveLength(1000);
  });

  test("takes no event with lists or maps without end", async () => {
    const id = uuidv7();
    const phone = phoneOf(id);
    const many = Array.from({ length: 300 }, (_, i) => i);
    const posted = await post(id, [
      phone.begin(ines.engineId, treeId),
      phone.write("noted", { note: "x", photos: [] }, { seen: Object.fromEntries(many.map(() => [uuidv7(), 1])) }),
      phone.write("ended", { outcome: "held", parts: many.map((i) => ({ title: `part ${i}`, quantity: 1 })) }),
    ]);
    expect(posted.map((receipt) => receipt.result)).toEqual(["stored", "rejected", "rejected"]);
    const other = uuidv7();
    const features = Object.fromEntries(many.map((i) => [`feature-${i}`, "yes"]));
    const begun = phoneOf(other).begin(ines.engineId, treeId, { profile: { features, figures: {}, healthy: {} } });
    expect(await post(other, [begun])).toMatchObject([{ result: "rejected", because: expect.stringMatching(/more than an engine has/) }]);
    await expect(read((scope) => getDiagnosis(scope, other))).rejects.toMatchObject({ status: 404 });
  });
});

test("the story of a long log lets others be served while it is worked out", async () => {
  const id = uuidv7();
  const phone = phoneOf(id);
  await post(id, [
    phone.begin(ines.engineId, treeId),
    ...Array.from({ length: 300 }, () => phone.write("noted", { note: "x", photos: [] })),
  ]);
  const began = performance.now();
  let [last, longestWait, done] = [began, 0, false];
  const wait = () => {
    const now = performance.now();
    longestWait = Math.max(longestWait, now - last);
    last = now;
    if (!done) setImmediate(wait);
  };
  setImmediate(wait);
  await read((scope) => readStory(scope, id));
  done = true;
  expect(longestWait * 4).toBeLessThan(performance.now() - began);
});
