import { eq } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import type { Database } from "@/db/client";
import { corrections } from "@/db/schema/corrections";
import type { ReadingChange } from "@/lib/core/contract/engine";
import type { NewRepair, RepairChange } from "@/lib/core/contract/log";
import { withScope } from "@/lib/server/auth/scope";
import { recordEvents } from "@/lib/server/diagnoses/commands";
import { addHourReading } from "@/lib/server/engines/commands";
import { correctReading, takeBackReading } from "@/lib/server/engines/correct-reading";
import { getEngine } from "@/lib/server/engines/queries";
import { getReading, listHourReadings } from "@/lib/server/engines/readings";
import { correctRepair, takeBackRepair } from "@/lib/server/log/correct-repair";
import { logRepair } from "@/lib/server/log/commands";
import { getLogEntry, listLog, listRepeats } from "@/lib/server/log/queries";
import { getRepair } from "@/lib/server/log/repairs";
import { addEngineTo, afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";
import { addMember, addPerson } from "../support/people";

let owner: Database;
let treeId: string;

beforeAll(async () => {
  ({ owner } = await testDatabase());
  treeId = await shipTree(owner);
});

const day = (n: number) => new Date(Date.UTC(2026, 0, n, 12)).toISOString();
const content = (n: number, rest: Partial<RepairChange> = {}): RepairChange => ({
  doneAt: day(n),
  outcome: "cured",
  cause: "filter-blocked",
  remedy: "change-filter",
  proof: "Full revs",
  parts: [],
  symptoms: ["lost-rpm"],
  ...rest,
});
const inFleet = <T>(who: Afloat, run: Parameters<typeof withScope<"log:write", T>>[3]) =>
  withScope(who.person, who.fleetId, "log:write", run);
const asEngineer = <T>(who: Afloat, run: Parameters<typeof withScope<"engine:write", T>>[3]) =>
  withScope(who.person, who.fleetId, "engine:write", run);

async function logged(who: Afloat, n: number, rest: Partial<NewRepair> = {}): Promise<string> {
  const id = uuidv7();
  await inFleet(who, (scope) => logRepair(scope, { id, engineId: who.engineId, ...content(n), ...rest }));
  return id;
}
const correct = (who: Afloat, id: string, change: RepairChange, version = 1) =>
  inFleet(who, (scope) => correctRepair(scope, who.engineId, id, change, version));
const takeBack = (who: Afloat, id: string, version = 1) => inFleet(who, (scope) => takeBackRepair(scope, who.engineId, id, version));
const repair = (who: Afloat, id: string) => inFleet(who, (scope) => getRepair(scope, who.engineId, id));
const log = (who: Afloat) => inFleet(who, (scope) => listLog(scope));
const repeats = (who: Afloat) => inFleet(who, (scope) => listRepeats(scope));

describe("a repair that is corrected", () => {
  test("says the new words everywhere, and keeps the old ones with who put them aside and when", async () => {
    const ines = await afloat("Ines");
    const id = await logged(ines, 1, { engineHours: 812, note: "Old words" });
    const mate = await addPerson({ name: "Mats" });
    await addMember(ines.fleetId, mate, ["mechanic"]);
    const change = content(2, { cause: "tank-dirty", remedy: undefined, remedyInWords: "Tank drained", engineHours: 815, minutes: 40 });
    const done = await correct({ ...ines, person: mate }, id, change);
    expect(done).toMatchObject({ version: 2, meterShowed: 815, takenBackAt: null });
    expect((await log(ines)).items).toMatchObject([
      {
        id,
        version: 2,
        at: day(2),
        cause: { key: "tank-dirty" },
        remedy: { key: null, title: "Tank drained" },
        minutes: 40,
        note: null,
        by: "Ines",
      },
    ]);
    expect(done.corrections).toMatchObject([
      {
        version: 1,
        takenBack: false,
        by: "Mats",
        was: { doneAt: day(1), cause: { key: "filter-blocked" }, meterShowed: 812, meterReset: false, note: "Old words" },
      },
    ]);
    const third = await correct(ines, id, content(2), 2);
    expect(third.corrections.map((one) => [one.version, one.by])).toEqual([
      [1, "Mats"],
      [2, "Ines"],
    ]);
  });

  test("counts by the corrected words: what came back, and the engine's clock", async () => {
    const ines = await afloat("Ines");
    const first = await logged(ines, 1, { engineHours: 100 });
    const second = await logged(ines, 31, { engineHours: 160 });
    expect(await repeats(ines)).toMatchObject([{ count: 2, gapsHours: [60] }]);
    await correct(ines, second, content(31, { engineHours: 150 }));
    expect(await repeats(ines)).toMatchObject([{ count: 2, gapsHours: [50] }]);
    expect(await inFleet(ines, (scope) => getEngine(scope, ines.engineId))).toMatchObject({ hours: 150 });
    await correct(ines, second, content(31, { cause: "tank-dirty", remedy: undefined }), 2);
    expect(await repeats(ines)).toEqual([]);
    // It named no hours this time, so the meter's last word is the first repair's.
    expect(await inFleet(ines, (scope) => getEngine(scope, ines.engineId))).toMatchObject({ hours: 100 });
    expect((await inFleet(ines, (scope) => getLogEntry(scope, first))).timesHere).toBe(1);
  });

  test("of a version that was corrected meanwhile is refused with what it says now, and nothing is put aside", async () => {
    const ines = await afloat("Ines");
    const id = await logged(ines, 1);
    await correct(ines, id, content(1, { note: "First" }));
    await expect(correct(ines, id, content(1, { note: "Second" }))).rejects.toMatchObject({
      status: 412,
      extras: { current: { version: 2, entry: { note: "First" } } },
    });
    const both = await Promise.allSettled([
      correct(ines, id, content(1, { note: "A" }), 2),
      correct(ines, id, content(1, { note: "B" }), 2),
    ]);
    expect(both.map((one) => one.status).sort()).toEqual(["fulfilled", "rejected"]);
    expect((await repair(ines, id)).corrections).toHaveLength(2);
  });

  test("is not undone by its first form coming once more", async () => {
    const ines = await afloat("Ines");
    const id = await logged(ines, 1);
    await correct(ines, id, content(1, { note: "Right" }));
    await inFleet(ines, (scope) => logRepair(scope, { id, engineId: ines.engineId, ...content(1) }));
    expect((await log(ines)).items).toMatchObject([{ note: "Right" }]);
  });

  test("is refused with keys the tree does not have, in another fleet, on another engine, and for a diagnosis", async () => {
    const [ines, mats] = [await afloat("Ines"), await afloat("Mats")];
    const id = await logged(ines, 1);
    await expect(correct(ines, id, content(1, { cause: "gremlins" }))).rejects.toMatchObject({ status: 422 });
    await expect(correct(mats, id, content(1))).rejects.toMatchObject({ status: 404 });
    const port = { ...ines, engineId: uuidv7() };
    await addEngineTo(port, { name: "port" });
    await expect(correct(port, id, content(1))).rejects.toMatchObject({ status: 404 });
    const diagnosis = uuidv7();
    await withScope(ines.person, ines.fleetId, "diagnosis:write", (scope) =>
      recordEvents(scope, diagnosis, [phoneOf(diagnosis).begin(ines.engineId, treeId)]),
    );
    await expect(correct(ines, diagnosis, content(1))).rejects.toMatchObject({ status: 404 });
    expect((await repair(ines, id)).corrections).toEqual([]);
  });
});

describe("a repair that is taken back", () => {
  test("is off the log and out of the counts, and stays readable", async () => {
    const ines = await afloat("Ines");
    await logged(ines, 1, { engineHours: 100 });
    const id = await logged(ines, 31, { engineHours: 160 });
    await takeBack(ines, id);
    expect((await log(ines)).items).toHaveLength(1);
    expect(await repeats(ines)).toEqual([]);
    expect(await inFleet(ines, (scope) => getEngine(scope, ines.engineId))).toMatchObject({ hours: 100 });
    expect(await repair(ines, id)).toMatchObject({
      takenBackAt: expect.any(String),
      version: 2,
      corrections: [{ takenBack: true, was: { meterShowed: 160, cause: { key: "filter-blocked" } } }],
    });
    await expect(takeBack(ines, id, 2)).rejects.toMatchObject({ status: 409 });
    await expect(correct(ines, id, content(1), 2)).rejects.toMatchObject({ status: 409 });
  });
});

describe("a reading of the meter", () => {
  const read = async (who: Afloat, n: number, reading: number, reset = false) => {
    const id = uuidv7();
    await asEngineer(who, (scope) => addHourReading(scope, { id, engineId: who.engineId, reading, readAt: day(n), reset }));
    return id;
  };
  const amend = (who: Afloat, id: string, change: ReadingChange, version = 1) =>
    asEngineer(who, (scope) => correctReading(scope, who.engineId, id, change, version));
  const list = async (who: Afloat) => (await asEngineer(who, (scope) => listHourReadings(scope, who.engineId))).items;

  test("corrected is what the hours go by, and what it said stays readable", async () => {
    const ines = await afloat("Ines");
    await read(ines, 1, 100);
    const id = await read(ines, 5, 1100);
    expect(await amend(ines, id, { reading: 110, readAt: day(6), reset: false })).toMatchObject({
      reading: 110,
      version: 2,
      corrections: [{ version: 1, by: "Ines", takenBack: false, was: { reading: 1100, readAt: day(5), reset: false } }],
    });
    expect(await list(ines)).toMatchObject([
      { id, reading: 110, version: 2, hours: 110, doubtful: false },
      { reading: 100, version: 1 },
    ]);
    await expect(amend(ines, id, { reading: 120, readAt: day(6), reset: false })).rejects.toMatchObject({ status: 412 });
    await expect(amend(ines, id, { reading: 90, readAt: day(6), reset: false }, 2)).rejects.toMatchObject({ status: 422 });
    expect((await asEngineer(ines, (scope) => getReading(scope, ines.engineId, id))).corrections).toHaveLength(1);
  });

  test("taken back counts for nothing, and stays readable", async () => {
    const ines = await afloat("Ines");
    await read(ines, 1, 100);
    const id = await read(ines, 5, 1100);
    await asEngineer(ines, (scope) => takeBackReading(scope, ines.engineId, id, 1));
    expect(await list(ines)).toMatchObject([{ reading: 100 }]);
    expect(await inFleet(ines, (scope) => getEngine(scope, ines.engineId))).toMatchObject({ hours: 100 });
    // It would have run back from the one that was wrong.
    await read(ines, 7, 120);
    expect(await asEngineer(ines, (scope) => getReading(scope, ines.engineId, id))).toMatchObject({
      takenBackAt: expect.any(String),
      corrections: [{ takenBack: true, was: { reading: 1100 } }],
    });
  });

  test("that came with a repair or an outcome is corrected there", async () => {
    const ines = await afloat("Ines");
    const id = await logged(ines, 1, { engineHours: 100 });
    const diagnosis = uuidv7();
    const phone = phoneOf(diagnosis);
    const ended = phone.write("ended", { outcome: "held", parts: [], engineHours: 130 });
    await withScope(ines.person, ines.fleetId, "diagnosis:write", (scope) =>
      recordEvents(scope, diagnosis, [phone.begin(ines.engineId, treeId), ended]),
    );
    expect((await list(ines)).map((one) => one.partOf)).toEqual(["diagnosis", "repair"]);
    for (const part of [id, ended.id])
      await expect(amend(ines, part, { reading: 101, readAt: day(1), reset: false })).rejects.toMatchObject({ status: 409 });
  });

  test("is one of a list that goes on page by page past a thousand", async () => {
    const ines = await afloat("Ines");
    const many = Array.from(
      { length: 1005 },
      (_, i) =>
        `('${ines.fleetId}', '${uuidv7()}', '${ines.engineId}', ${i}, '2026-02-01'::timestamptz + interval '${Math.floor(i / 3)} hours', '${ines.person.userId}')`,
    );
    await owner.execute(`insert into hour_readings (fleet_id, id, engine_id, reading, read_at, by) values ${many.join(",")}`);
    const seen = new Set<string>();
    let after: string | undefined;
    for (let pages = 0; pages < 10; pages++) {
      const page = await asEngineer(ines, (scope) => listHourReadings(scope, ines.engineId, { limit: 200, after }));
      for (const { id } of page.items) seen.add(id);
      if (page.next === null) break;
      after = page.next;
    }
    expect(seen.size).toBe(1005);
  });
});

test("what was put aside can be neither changed nor thrown away, by the owner of the database either", async () => {
  const ines = await afloat("Ines");
  const id = await logged(ines, 1);
  await correct(ines, id, content(2));
  await expect(owner.delete(corrections).where(eq(corrections.subjectId, id))).rejects.toMatchObject({ cause: { code: "23001" } });
  await expect(owner.update(corrections).set({ takenBack: true }).where(eq(corrections.subjectId, id))).rejects.toMatchObject({
    cause: { code: "23001" },
  });
});
