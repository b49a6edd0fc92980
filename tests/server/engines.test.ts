import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { withScope } from "@/lib/server/auth/scope";
import { addBoat, changeBoat, removeBoat } from "@/lib/server/boats/commands";
import { getBoat, listBoats } from "@/lib/server/boats/queries";
import { addEngine, addHourReading, changeEngine } from "@/lib/server/engines/commands";
import { getEngine, listEngines } from "@/lib/server/engines/queries";
import { listHourReadings } from "@/lib/server/engines/readings";
import { addEngineTo, afloat, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

let ines: Afloat;
beforeAll(async () => {
  await testDatabase();
  ines = await afloat("Ines");
});

const day = (n: number) => new Date(Date.UTC(2026, 2, n)).toISOString();
const inFleet = <T>(
  who: Afloat,
  permission: "fleet:read" | "engine:write" | "boat:write" | "boat:remove",
  run: Parameters<typeof withScope<typeof permission, T>>[3],
) => withScope(who.person, who.fleetId, permission, run);
const read = (engineId: string, reading: number, n: number, reset = false, id: string = uuidv7()) =>
  withScope(ines.person, ines.fleetId, "engine:write", (scope) => addHourReading(scope, { id, engineId, reading, readAt: day(n), reset }));
const engine = (id = ines.engineId) => withScope(ines.person, ines.fleetId, "fleet:read", (scope) => getEngine(scope, id));

test("an engine sent again with another name or profile is refused: it would be lost without a word", async () => {
  const mats = await afloat("Mats");
  await addEngineTo(mats);
  await expect(addEngineTo(mats, { name: "port" })).rejects.toMatchObject({ status: 409 });
  await expect(addEngineTo(mats, { profile: { features: {}, figures: { ratedRpm: 3000 }, healthy: {} } })).rejects.toMatchObject({
    status: 409,
  });
});

test("two engines of one name on a boat are refused, however it is written: nobody could tell them apart", async () => {
  const boat = await afloat("Twin");
  const twin = (name: string) => addEngineTo({ ...boat, engineId: uuidv7() }, { name });
  await expect(twin("Main engine ")).rejects.toMatchObject({ status: 422, extras: { errors: [{ path: "name" }] } });
  const starboard = { ...boat, engineId: uuidv7() };
  await addEngineTo(starboard, { name: "starboard" });
  const rename = withScope(boat.person, boat.fleetId, "engine:write", (scope) =>
    changeEngine(scope, starboard.engineId, { name: "MAIN engine" }, 1),
  );
  await expect(rename).rejects.toMatchObject({ status: 422 });
});

describe("boats", () => {
  test("a boat sent twice is one boat; another under its id is refused", async () => {
    const boat = { id: uuidv7(), name: "Turnstone", callMinutes: { atAnchor: 300 } };
    const add = (name: string) => withScope(ines.person, ines.fleetId, "boat:write", (scope) => addBoat(scope, { ...boat, name }));
    expect(await add("Turnstone")).toMatchObject({ ...boat, version: 1 });
    expect(await add("Turnstone")).toMatchObject({ ...boat, version: 1 });
    await expect(add("Dunlin")).rejects.toMatchObject({ status: 409 });
    expect((await inFleet(ines, "fleet:read", (scope) => listBoats(scope))).map((b) => b.name)).toEqual(["Petrel", "Turnstone"]);
  });

  test("of two people who change it at once the second is told what it says now", async () => {
    const change = (name: string, version: number) =>
      withScope(ines.person, ines.fleetId, "boat:write", (scope) => changeBoat(scope, ines.boatId, { name }, version));
    expect(await change("Storm petrel", 1)).toMatchObject({ name: "Storm petrel", version: 2 });
    await expect(change("Fulmar", 1)).rejects.toMatchObject({ status: 412, extras: { current: { name: "Storm petrel", version: 2 } } });
  });

  test("a boat taken off the lists takes its engines along", async () => {
    const mats = await afloat("Mats");
    await withScope(mats.person, mats.fleetId, "boat:remove", (scope) => removeBoat(scope, mats.boatId, 1));
    expect(await inFleet(mats, "fleet:read", (scope) => listEngines(scope))).toEqual([]);
    await expect(inFleet(mats, "fleet:read", (scope) => getBoat(scope, mats.boatId))).rejects.toMatchObject({ status: 404 });
  });
});

describe("engines", () => {
  test("twins stand under one boat by name, each with what is known of it", async () => {
    await addEngineTo(
      { ...ines, engineId: uuidv7() },
      { name: "starboard", profile: { features: { injection: "common-rail" }, figures: { ratedRpm: 3600 }, healthy: {} } },
    );
    const found = await inFleet(ines, "fleet:read", (scope) => listEngines(scope));
    expect(found.map((e) => [e.name, e.profile.figures.ratedRpm ?? null])).toEqual([
      ["main engine", null],
      ["starboard", 3600],
    ]);
  });

  test("an engine cannot be put on another fleet's boat", async () => {
    const mats = await afloat("Mats");
    const add = withScope(mats.person, mats.fleetId, "engine:write", (scope) =>
      addEngine(scope, {
        id: uuidv7(),
        boatId: ines.boatId,
        name: "port",
        hasHourMeter: true,
        profile: { features: {}, figures: {}, healthy: {} },
      }),
    );
    await expect(add).rejects.toMatchObject({ status: 404 });
  });

  test("what a change leaves out stays", async () => {
    const profile = { features: { voltage: "v24" }, figures: {}, healthy: {} };
    await withScope(ines.person, ines.fleetId, "engine:write", (scope) => changeEngine(scope, ines.engineId, { profile }, 1));
    expect(await engine()).toMatchObject({ name: "main engine", hasHourMeter: true, profile, version: 2 });
    await withScope(ines.person, ines.fleetId, "engine:write", (scope) => changeEngine(scope, ines.engineId, { name: "port" }, 2));
    expect(await engine()).toMatchObject({ name: "port", profile, version: 3 });
  });
});

describe("the hour meter", () => {
  test("hours follow the last reading; one sent twice is one, another under its id is refused", async () => {
    const id = uuidv7();
    await read(ines.engineId, 100, 1);
    await read(ines.engineId, 130, 10, false, id);
    await read(ines.engineId, 130, 10, false, id);
    await expect(read(ines.engineId, 131, 10, false, id)).rejects.toMatchObject({ status: 409 });
    expect(await engine()).toMatchObject({ hours: 130, hoursSinceNew: 130, hoursAreEstimated: false, hoursReadAt: day(10) });
  });

  test("a meter that ran back is refused in words, unless it was replaced", async () => {
    await expect(read(ines.engineId, 20, 12)).rejects.toMatchObject({
      status: 422,
      detail: expect.stringMatching(/showed 130 h on 10 Mar 2026/),
    });
    await read(ines.engineId, 20, 12, true);
    await read(ines.engineId, 25, 14);
    expect(await engine()).toMatchObject({ hours: 25, hoursSinceNew: 135 });
  });

  test("an older reading may be written in later", async () => {
    await read(ines.engineId, 110, 5);
    const readings = await inFleet(ines, "fleet:read", async (scope) => (await listHourReadings(scope, ines.engineId)).items);
    expect(readings.map((r) => [r.reading, r.hours, r.doubtful])).toEqual([
      [25, 135, false],
      [20, 130, false],
      [130, 130, false],
      [110, 110, false],
      [100, 100, false],
    ]);
  });

  test("an engine without a meter runs on estimated hours that say so", async () => {
    const runa = await afloat("Runa", { hasHourMeter: false, estimatedHoursPerYear: 200 });
    const found = await inFleet(runa, "fleet:read", (scope) => getEngine(scope, runa.engineId));
    expect(found).toMatchObject({ hoursAreEstimated: true, hoursReadAt: null });
    expect(found.hours).toBeGreaterThanOrEqual(0);
    expect(found.hours).toBeLessThan(0.1);
  });
});

test("a reading of a day that is still to come is refused in words", async () => {
  const readAt = new Date(Date.now() + 3 * 24 * 3600 * 1000).toISOString();
  await expect(
    withScope(ines.person, ines.fleetId, "engine:write", (scope) =>
      addHourReading(scope, { id: uuidv7(), engineId: ines.engineId, reading: 5, readAt, reset: false }),
    ),
  ).rejects.toMatchObject({ status: 422, extras: { errors: [{ path: "readAt" }] } });
});
