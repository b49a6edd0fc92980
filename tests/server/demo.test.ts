import { sql } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import type { Database } from "@/db/client";
import { loadDemo, type Demo } from "@/db/demo/load-demo";
import { users } from "@/db/schema/users";
import { checkPassword } from "@/lib/server/auth/check-password";
import { withScope } from "@/lib/server/auth/scope";
import { readStory } from "@/lib/server/diagnoses/story";
import { listEngines } from "@/lib/server/engines/queries";
import { listHourReadings } from "@/lib/server/engines/readings";
import { listLog, listRepeats } from "@/lib/server/log/queries";
import { listBoats } from "@/lib/server/boats/queries";
import { loadShippedTree } from "@/lib/server/trees/load-shipped-tree";
import type { FleetScope } from "@/lib/server/auth/scope";
import { testDatabase } from "../support/database";

const TODAY = new Date("2026-11-30T08:00:00Z");
let owner: Database;
let demo: Demo;
let loadedAnew: boolean[];
let asOwner: <T>(run: (scope: FleetScope<"fleet:read">) => Promise<T>) => Promise<T>;

beforeAll(async () => {
  const database = await testDatabase();
  owner = database.owner;
  await loadShippedTree(database.ownerUrl);
  const starts = await Promise.all([loadDemo(TODAY), loadDemo(TODAY)]);
  loadedAnew = starts.map((start) => start.isNew);
  demo = starts[0];
  const [person] = await owner
    .select({ userId: users.id })
    .from(users)
    .where(sql`email = ${demo.people[0]?.email}`);
  asOwner = (run) => withScope({ userId: person?.userId ?? "" }, demo.fleetId, "fleet:read", run);
}, 60_000);

describe("the demo fleet", () => {
  test("has four boats, five engines, three people who can sign in and a stranger", async () => {
    expect(await asOwner(listBoats)).toHaveLength(4);
    expect(await asOwner(listEngines)).toHaveLength(5);
    expect(demo.people).toHaveLength(4);
    for (const { email } of demo.people) expect(await checkPassword(email, demo.password, "127.0.0.1")).toMatchObject({ result: "right" });
  });

  test("tells of a filter that blocks sooner each time, and of an impeller that keeps failing under four spellings", async () => {
    const [filter, impeller, ...others] = await asOwner((scope) => listRepeats(scope));
    expect(filter).toMatchObject({ cause: "primary-filter-blocked", count: 7, unprovedBefore: 1 });
    expect(filter?.gapsHours).toEqual([124, 99, 74, 52, 35, 22]);
    expect(filter?.upstream.length).toBeGreaterThan(0);
    expect(impeller).toMatchObject({ count: 4, title: "Raw water impeller torn", system: null });
    expect(others).toEqual([]);
  });

  test("spans eighteen months, with one diagnosis open and one engine simply well", async () => {
    const log = (await asOwner((scope) => listLog(scope, { limit: 200 }))).items;
    const days = (at: string | undefined) => (TODAY.getTime() - Date.parse(at ?? "")) / 86_400_000;
    expect(days(log.at(-1)?.at)).toBeGreaterThan(500);
    expect(log.filter((line) => line.outcome === null)).toMatchObject([{ boatName: "Tin Whistle", engineName: "port" }]);
    expect(log.filter((line) => line.boatName === "Tin Whistle" && line.engineName === "starboard")).toEqual([]);
    expect(log.filter((line) => line.outcome === "handed-over")).toEqual([]);
    expect(log.filter((line) => line.boatName === "Late Supper")).toMatchObject([{ hoursAreEstimated: true }]);
  });

  test("has hours that fit together", async () => {
    for (const engine of await asOwner(listEngines)) {
      const readings = await asOwner(async (scope) => (await listHourReadings(scope, engine.id)).items);
      expect(readings.filter((reading) => reading.doubtful)).toEqual([]);
    }
  });

  test("has diagnoses that can be read step by step, each asked for a reason", async () => {
    const log = (await asOwner((scope) => listLog(scope, { cause: "primary-filter-blocked" }))).items;
    const id = log.find((line) => line.diagnosisId !== null)?.diagnosisId ?? "";
    const story = await asOwner((scope) => readStory(scope, id));
    const asked = story.steps.filter((step) => ["answered", "remedy-tried"].includes(step.kind));
    expect(asked.length).toBeGreaterThan(1);
    for (const step of asked) expect(step.askedWhy).toMatch(/\w/);
  });

  test("is loaded once by two starts at the same moment", async () => {
    expect(loadedAnew.sort()).toEqual([false, true]);
    const { rows } = await owner.execute(sql`select name from fleets`);
    expect(rows).toHaveLength(2);
  });

  test("is loaded once", async () => {
    const lines = async () => (await asOwner((scope) => listLog(scope, { limit: 200 }))).items.map(({ id, at }) => [id, at]);
    const before = await lines();
    expect(await loadDemo(new Date("2027-01-15T08:00:00Z"))).toMatchObject({ isNew: false, fleetId: demo.fleetId });
    expect(await lines()).toEqual(before);
  });
});
