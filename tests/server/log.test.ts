import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import type { NewRepair } from "@/lib/core/contract/log";
import { withScope } from "@/lib/server/auth/scope";
import { listEngines } from "@/lib/server/engines/queries";
import { logRepair } from "@/lib/server/log/commands";
import { listLog, listRepeats } from "@/lib/server/log/queries";
import { addEngineTo, afloat, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

beforeAll(async () => {
  const { owner } = await testDatabase();
  await shipTree(owner);
});

const day = (n: number) => new Date(Date.UTC(2026, 0, n, 12)).toISOString();
const repair = (who: Afloat, n: number, engineHours: number | undefined, rest: Partial<NewRepair> = {}) => {
  const whole: NewRepair = {
    id: uuidv7(),
    engineId: who.engineId,
    doneAt: day(n),
    outcome: "cured",
    cause: "filter-blocked",
    remedy: "change-filter",
    proof: "Full revs",
    engineHours,
    parts: [],
    symptoms: ["lost-rpm"],
    ...rest,
  };
  return withScope(who.person, who.fleetId, "log:write", (scope) => logRepair(scope, whole));
};
const log = (who: Afloat, query = {}) => withScope(who.person, who.fleetId, "log:read", (scope) => listLog(scope, query));
const repeats = (who: Afloat, engineId?: string) => withScope(who.person, who.fleetId, "log:read", (scope) => listRepeats(scope, engineId));

describe("a repair logged without a diagnosis", () => {
  test("is a line with the tree's titles, and its hours are a reading of the meter", async () => {
    const ines = await afloat("Ines");
    expect(await repair(ines, 1, 812)).toMatchObject({
      diagnosisId: null,
      symptoms: [{ key: "lost-rpm", title: "Will not reach full revs" }],
      cause: { key: "filter-blocked", title: "Primary filter blocked", system: "fuel" },
      remedy: { key: "change-filter", title: "Change the primary filter" },
      engineHours: 812,
      by: "Ines",
    });
    expect(await withScope(ines.person, ines.fleetId, "fleet:read", (scope) => listEngines(scope))).toMatchObject([{ hours: 812 }]);
  });

  test("sent twice is one line; another under its id is refused", async () => {
    const ines = await afloat("Ines");
    const id = uuidv7();
    await repair(ines, 1, 5, { id });
    await repair(ines, 1, 5, { id });
    expect((await log(ines)).items).toHaveLength(1);
    await expect(repair(ines, 2, 5, { id })).rejects.toMatchObject({ status: 409 });
    for (const other of [{ note: "Other words" }, { cause: "tank-dirty" }, { minutes: 5 }, { parts: [{ title: "Filter", quantity: 1 }] }])
      await expect(repair(ines, 1, 5, { id, ...other }), JSON.stringify(other)).rejects.toMatchObject({ status: 409 });
    expect((await log(ines)).items).toMatchObject([{ note: null, cause: { key: "filter-blocked" } }]);
  });

  test("with a meter that was replaced is a reading that the hours go on from", async () => {
    const ines = await afloat("Ines");
    await repair(ines, 1, 900);
    await repair(ines, 2, 4, { meterReset: true });
    expect(await withScope(ines.person, ines.fleetId, "fleet:read", (scope) => listEngines(scope))).toMatchObject([
      { hours: 4, hoursSinceNew: 900 },
    ]);
  });

  test("of a day that is still to come is refused", async () => {
    const ines = await afloat("Ines");
    const doneAt = new Date(Date.now() + 3 * 24 * 3600 * 1000).toISOString();
    await expect(repair(ines, 1, 5, { doneAt })).rejects.toMatchObject({ status: 422 });
  });

  test("is refused where the tree does not know its words for keys, and another fleet's engine is not found", async () => {
    const [ines, mats] = [await afloat("Ines"), await afloat("Mats")];
    await expect(repair(ines, 1, 5, { cause: "gremlins" })).rejects.toMatchObject({
      status: 422,
      detail: expect.stringMatching(/no cause "gremlins"/),
    });
    await expect(repair(ines, 1, 5, { engineId: mats.engineId })).rejects.toMatchObject({ status: 404 });
  });
});

describe("what came back", () => {
  test("is said from the second, with hours, gaps and what lies upstream", async () => {
    const ines = await afloat("Ines");
    await repair(ines, 1, 100);
    expect(await repeats(ines)).toEqual([]);
    const second = await repair(ines, 31, 160);
    expect(second.timesHere).toBe(2);
    await repair(ines, 61, 190, { proof: undefined });
    expect(await repeats(ines)).toMatchObject([
      {
        engineId: ines.engineId,
        cause: "filter-blocked",
        count: 3,
        hours: [100, 160, 190],
        gapsHours: [60, 30],
        gapsDays: [30, 30],
        unprovedBefore: 0,
        upstream: [{ cause: "tank-dirty", title: "Dirt in the tank", share: 0.66 }],
      },
    ]);
    expect((await log(ines)).items.map((line) => [line.timesHere, line.cameBackAfterHours, line.heldHours])).toEqual([
      [3, null, 0],
      [2, 30, null],
      [1, 60, null],
    ]);
  });

  test("is seen in words the tree does not have, whatever their case and spaces", async () => {
    const ines = await afloat("Ines");
    await repair(ines, 1, 10, { cause: undefined, causeInWords: "Impeller vanes torn", symptoms: [] });
    await repair(ines, 20, 70, { cause: undefined, causeInWords: "impeller  VANES torn.", symptoms: [] });
    expect(await repeats(ines, ines.engineId)).toMatchObject([{ count: 2, title: "impeller  VANES torn.", gapsHours: [60], upstream: [] }]);
  });

  test("keeps twins apart, and stays within the fleet", async () => {
    const ines = await afloat("Ines");
    const starboard = { ...ines, engineId: uuidv7() };
    await addEngineTo(starboard, { name: "starboard" });
    await repair(ines, 1, 10);
    await repair(starboard, 2, 20);
    expect(await repeats(ines)).toEqual([]);
  });
});

describe("the log's pages", () => {
  test("follow each other without gap or repeat, moments alike or not, and end", async () => {
    const ines = await afloat("Ines");
    for (let i = 0; i < 7; i++) await repair(ines, 1 + Math.floor(i / 3), undefined, { note: String(i) });
    const seen: string[] = [];
    let after: string | undefined;
    for (let page = 0; page < 4; page++) {
      const { items, next } = await log(ines, { limit: 3, after });
      seen.push(...items.map((line) => line.id));
      if (next === null) break;
      after = next;
    }
    expect(seen).toEqual((await log(ines)).items.map((line) => line.id));
    expect(new Set(seen).size).toBe(7);
  });

  test("can be narrowed, and refuse a next that no page gave", async () => {
    const ines = await afloat("Ines");
    await repair(ines, 1, 10);
    await repair(ines, 2, 11, { outcome: "held", cause: "battery-flat", remedy: undefined, symptoms: [] });
    expect((await log(ines, { cause: "battery-flat" })).items).toHaveLength(1);
    expect((await log(ines, { outcome: "cured" })).items).toHaveLength(1);
    expect((await log(ines, { outcome: "open" })).items).toEqual([]);
    expect((await log(ines, { engineId: uuidv7() })).items).toEqual([]);
    expect((await log(ines, { boatId: ines.boatId })).items).toHaveLength(2);
    await expect(log(ines, { after: "bm9uc2Vuc2U" })).rejects.toMatchObject({ status: 422 });
  });
});
