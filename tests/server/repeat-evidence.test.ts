import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { RepeatEvidence } from "@/lib/core/contract/repeat-evidence";
import { withScope } from "@/lib/server/auth/scope";
import { logRepair } from "@/lib/server/log/commands";
import { listEvidence } from "@/lib/server/log/evidence";
import { addEngineTo, afloat, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

beforeAll(async () => {
  const { owner } = await testDatabase();
  await shipTree(owner);
});

const day = (n: number) => new Date(Date.UTC(2026, 0, n, 12)).toISOString();
const cured = (who: Afloat, n: number, engineHours: number, rest: { engineId?: string; cause?: string; proof?: string | undefined } = {}) =>
  withScope(who.person, who.fleetId, "log:write", (scope) =>
    logRepair(scope, {
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
    }),
  );
const evidence = (who: Afloat, engineId = who.engineId) =>
  withScope(who.person, who.fleetId, "log:read", (scope) => listEvidence(scope, engineId));

describe("the evidence behind a fault that came back", () => {
  test("gaps that shorten after a long quiet are said to be getting worse, with the numbers", async () => {
    const ines = await afloat("Ines");
    await cured(ines, 1, 100, { cause: "tank-dirty" });
    for (const [n, hours] of [700, 820, 910, 970, 1015, 1045, 1063].entries()) await cured(ines, 10 + n, hours);
    const [found, ...rest] = await evidence(ines);
    expect(rest).toEqual([]);
    expect(RepeatEvidence.parse(found)).toMatchObject({
      cause: "filter-blocked",
      unit: "hours",
      trend: "getting-worse",
      frequency: "no-fleet",
    });
    expect(found?.words[0]).toBe("Came back 6 times; first gap 120 h, last gap 18 h.");
  });

  test("twice is too few to tell, once is nothing", async () => {
    const ines = await afloat("Ines");
    await cured(ines, 1, 100);
    expect(await evidence(ines)).toEqual([]);
    await cured(ines, 9, 150, { proof: undefined });
    expect(await evidence(ines)).toMatchObject([{ trend: "too-few", unit: "hours", laplace: null }]);
  });

  test("the fleet's other engines are what it is compared with, and their faults are not shown here", async () => {
    const ines = await afloat("Ines");
    const other = uuidv7();
    await addEngineTo({ ...ines, engineId: other }, { name: "port" });
    for (const [n, hours] of [100, 400, 700].entries()) await cured(ines, 1 + n, hours);
    for (const [n, hours] of [50, 2050].entries()) await cured(ines, 1 + n, hours, { engineId: other, cause: "tank-dirty" });
    const found = await evidence(ines);
    expect(found.map(({ engineId }) => engineId)).toEqual([ines.engineId]);
    // Half a fault in the other's 2000 h, over this one's 600 h.
    expect(found[0]?.expected).toBeCloseTo((0.5 / 2000) * 600, 9);
  });
});
