import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { PassageQuery } from "@/lib/core/contract/passage";
import { withScope } from "@/lib/server/auth/scope";
import { planForBoat } from "@/lib/server/boats/passage";
import { logRepair } from "@/lib/server/log/commands";
import { afloat, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

beforeAll(async () => {
  const { owner } = await testDatabase();
  await shipTree(owner);
});

const plan = (who: Afloat, asked: Record<string, string>, boatId = who.boatId) =>
  withScope(who.person, who.fleetId, "log:read", (scope) => planForBoat(scope, boatId, PassageQuery.parse(asked)));

describe("spares for a passage", () => {
  test("a dirty tank asks for more elements, and says so", async () => {
    const ines = await afloat("Ines");
    const clean = (await plan(ines, { hours: "60", litres: "200" })).find(({ part }) => part === "primary-element");
    const dirty = (await plan(ines, { hours: "60", litres: "200", dirtyLitres: "150", clogged: "5", cloggedLitres: "100" })).find(
      ({ part }) => part === "primary-element",
    );
    // (1 + 5) / (50 + 100) a litre over 150 litres.
    expect(dirty?.mean).toBeCloseTo((clean?.mean ?? 0) + 6, 2);
    expect(dirty?.reasons[0]).toMatchObject({ kind: "dirty-tank" });
    expect(dirty?.carry.at99).toBeGreaterThan(dirty?.carry.at90 ?? 99);
  });

  test("upkeep that falls due on the way is carried for certain", async () => {
    const ines = await afloat("Ines");
    await withScope(ines.person, ines.fleetId, "log:write", (scope) =>
      logRepair(scope, {
        id: uuidv7(),
        engineId: ines.engineId,
        doneAt: new Date(Date.UTC(2026, 0, 1)).toISOString(),
        outcome: "cured",
        cause: "filter-blocked",
        engineHours: 500,
        parts: [],
        symptoms: [],
      }),
    );
    const lines = await plan(ines, { hours: "300" });
    // Without a record half of the 100 h are taken as gone: at 50, 150 and 250 h.
    expect(lines.find(({ part }) => part === "engine-oil-and-filter")?.carry).toEqual({ at90: 3, at95: 3, at99: 3 });
  });

  test("a boat of another fleet is not there", async () => {
    const [ines, otto] = [await afloat("Ines"), await afloat("Otto")];
    await expect(plan(otto, { hours: "60" }, ines.boatId)).rejects.toMatchObject({ status: 404 });
  });

  test("what was counted of a dirty tank is given whole or not at all", () => {
    expect(PassageQuery.safeParse({ hours: "1", clogged: "3" }).success).toBe(false);
    expect(PassageQuery.safeParse({ hours: "-1" }).success).toBe(false);
  });
});
