import { eq, sql } from "drizzle-orm";
import { identityDatabase } from "@/db/client";
import { users } from "@/db/schema/users";
import type { Permission } from "@/lib/core/access/permissions";
import { multipliersFor } from "@/lib/core/diagnosis/odds-of-this-engine";
import { makeUser } from "@/lib/server/account/make-user";
import { hashPassword } from "@/lib/server/auth/password";
import { withScope, type FleetScope } from "@/lib/server/auth/scope";
import { addBoat } from "@/lib/server/boats/commands";
import { recordEvents } from "@/lib/server/diagnoses/commands";
import { listDiagnoses } from "@/lib/server/diagnoses/queries";
import { addEngine, addHourReading } from "@/lib/server/engines/commands";
import { logRepair } from "@/lib/server/log/commands";
import { listLog } from "@/lib/server/log/queries";
import { getFleet, fleetsOf } from "@/lib/server/people/queries";
import { addMember, joinAsFirst, startFleet } from "@/lib/server/people/start-fleet";
import { getCurrentTreeVersion, getTreeVersion } from "@/lib/server/trees/queries";
import { daysBefore, whenAt } from "./calendar";
import { OPEN_RUN, REPAIRS, RUNS, type DemoRepair, type DemoRun } from "./history";
import { play } from "./play";
import { steadyId } from "./steady-id";
import { ENGINES, FLEET, PASSWORD, PEOPLE, STRANGER, type DemoEngine, type Who } from "./story";

export type Demo = {
  password: string;
  people: { email: string; name: string; roles: string[]; fleet: string }[];
  fleetId: string;
  isNew: boolean;
};

/**
 * Loads the demo fleet through the commands that people's own devices call.
 * A second time it does nothing; broken off half way it goes on where it was;
 * of two starts at once the second waits for the first.
 *
 * @param today the day that the story ends on
 */
export const loadDemo = (today: Date): Promise<Demo> =>
  identityDatabase().transaction(async (tx) => {
    await tx.execute(sql`select pg_advisory_xact_lock(hashtext('demo fleet'))`);
    return load(today);
  });

async function load(today: Date): Promise<Demo> {
  const ids = await makePeople();
  await makeStrangersFleet(ids.stranger);
  const known = (await fleetsOf({ userId: ids.owner }))[0]?.id;
  const fleetId =
    known ??
    (await startFleet(FLEET, { userId: ids.owner, name: PEOPLE[0].name }, (fleet) => joinAsFirst(identityDatabase(), fleet, ids.owner)));
  for (const { who, name, roles } of PEOPLE) if (who !== "owner") await addMember(fleetId, { userId: ids[who], name }, roles);
  const as = <P extends Permission, T>(who: Who, permission: P, run: (scope: FleetScope<P>) => Promise<T>) =>
    withScope({ userId: ids[who] }, fleetId, permission, run);

  const done = await as("owner", "diagnosis:read", (scope) => listDiagnoses(scope, { limit: 200 }));
  const isNew = !done.items.some((diagnosis) => diagnosis.id === steadyId(`${OPEN_RUN.key} diagnosis`));
  if (isNew) await tellStory(as, known ? new Date((await as("owner", "fleet:read", getFleet)).createdAt) : today);
  const people = PEOPLE.map(({ who, email, name, roles }) => ({
    email,
    name,
    roles: who === "owner" ? ["owner", "skipper", "mechanic"] : [...roles],
    fleet: FLEET,
  }));
  return {
    password: PASSWORD,
    people: [...people, { email: STRANGER.email, name: STRANGER.name, roles: ["owner", "skipper", "mechanic"], fleet: STRANGER.fleet }],
    fleetId,
    isNew,
  };
}

type As = <P extends Permission, T>(who: Who, permission: P, run: (scope: FleetScope<P>) => Promise<T>) => Promise<T>;

async function tellStory(as: As, today: Date): Promise<void> {
  for (const name of new Set(ENGINES.map((engine) => engine.boat))) {
    await as("owner", "boat:write", (scope) => addBoat(scope, { id: steadyId(name), name, callMinutes: {} }));
  }
  for (const engine of ENGINES) await addDemoEngine(as, engine, today);

  for (const repair of REPAIRS) await tellRepair(as, repair, today);
  for (const run of RUNS) await tellRun(as, run, today);
  await tellRun(as, OPEN_RUN, today, OPEN_RUN.steps);
}

async function tellRepair(as: As, repair: DemoRepair, today: Date): Promise<void> {
  const engine = engineOf(repair.engine);
  const { cause, causeInWords, remedyInWords, proof, minutes, note } = repair;
  await as(repair.by, "log:write", (scope) =>
    logRepair(scope, {
      id: steadyId(`${repair.key} repair`),
      engineId: steadyId(engine.key),
      doneAt: whenAt(engine, repair.at, today).toISOString(),
      outcome: proof ? "cured" : "held",
      ...{ cause, causeInWords, remedyInWords, proof, minutes, note },
      ...(engine.hoursPerYear === undefined ? { engineHours: repair.at } : {}),
      symptoms: repair.symptom ? [repair.symptom] : [],
      parts: (repair.parts ?? []).map((title) => ({ title, quantity: 1 })),
    }),
  );
}

async function addDemoEngine(as: As, engine: DemoEngine, today: Date): Promise<void> {
  const { key, boat, name, profile, hoursPerYear, meter } = engine;
  await as("owner", "engine:write", (scope) =>
    addEngine(scope, {
      id: steadyId(key),
      boatId: steadyId(boat),
      name,
      profile,
      hasHourMeter: hoursPerYear === undefined,
      ...(hoursPerYear === undefined ? {} : { estimatedHoursPerYear: hoursPerYear }),
    }),
  );
  for (const [days, reading] of meter) {
    const readAt = daysBefore(today, days).toISOString();
    await as("skipper", "engine:write", (scope) =>
      addHourReading(scope, { id: steadyId(`${key} at ${reading}`), engineId: steadyId(key), reading, readAt, reset: false }),
    );
  }
}

async function tellRun(as: As, run: DemoRun, today: Date, steps?: number): Promise<void> {
  const engine = engineOf(run.engine);
  const { key, symptom, cause, complaint, note, at } = run;
  await as(run.by, "diagnosis:write", async (scope) => {
    const { document, id } = await getTreeVersion(scope, (await getCurrentTreeVersion(scope)).id);
    const beginsAt = steps === undefined ? whenAt(engine, at, today) : daysBefore(today, 1, 16);
    const before = (await listLog(scope, { engineId: steadyId(engine.key), limit: 200 })).items.filter(
      (line) => new Date(line.at) < beginsAt,
    );
    const events = play({
      key,
      device: steadyId(`${run.by}'s phone`),
      engineId: steadyId(engine.key),
      treeVersionId: id,
      tree: document,
      profile: engine.profile,
      symptom,
      complaint,
      cause,
      beginsAt,
      multipliers: multipliersFor(document, before),
      ...(steps === undefined ? { engineHours: at } : { steps }),
      proved: run.proved !== false,
      note,
    });
    const refused = (await recordEvents(scope, steadyId(`${key} diagnosis`), events)).filter((receipt) => receipt.result === "rejected");
    if (refused.length > 0)
      throw new Error(`the demo's diagnosis "${key}" was refused: ${refused.map((receipt) => receipt.because).join("; ")}`);
  });
}

const engineOf = (key: string): DemoEngine => {
  const engine = ENGINES.find((one) => one.key === key);
  if (!engine) throw new Error(`the demo has no engine "${key}"`);
  return engine;
};

async function makePeople(): Promise<Record<Who, string>> {
  const passwordHash = await hashPassword(PASSWORD);
  const ids: Partial<Record<Who, string>> = {};
  for (const { who, name, email } of [...PEOPLE, STRANGER]) {
    const made = await makeUser(identityDatabase(), { name, email, passwordHash });
    const [there] = made ? [{ id: made }] : await identityDatabase().select({ id: users.id }).from(users).where(eq(users.email, email));
    if (there) ids[who] = there.id;
  }
  return ids as Record<Who, string>;
}

async function makeStrangersFleet(userId: string): Promise<void> {
  const known = (await fleetsOf({ userId }))[0]?.id;
  const fleetId =
    known ?? (await startFleet(STRANGER.fleet, { userId, name: STRANGER.name }, (fleet) => joinAsFirst(identityDatabase(), fleet, userId)));
  await withScope({ userId }, fleetId, "boat:write", (scope) =>
    addBoat(scope, { id: steadyId(STRANGER.boat), name: STRANGER.boat, callMinutes: {} }),
  );
  await withScope({ userId }, fleetId, "engine:write", (scope) =>
    addEngine(scope, {
      id: steadyId("stranger's engine"),
      boatId: steadyId(STRANGER.boat),
      name: "main engine",
      hasHourMeter: true,
      profile: { features: {}, figures: {}, healthy: {} },
    }),
  );
}
