import { sql } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { APPEND_ONLY_TABLES, IDENTITY_TABLES, OWNER_TABLES, SHARED_TABLES } from "@/scripts/lib/roles.mjs";
import { appDatabase, identityDatabase, type Database } from "@/db/client";
import { boats, engines } from "@/db/schema/boats";
import { credentials, users } from "@/db/schema/users";
import { inFleet } from "@/lib/server/auth/fleet-transaction";
import { testDatabase } from "../support/database";
import { addFleet, addPerson } from "../support/people";

let owner: Database;
const a = { fleetId: "", boatId: "", engineId: "", userId: "" };
const b = { ...a };
const refused = { cause: { code: "42501" } };

async function fleetWithBoat(name: string) {
  const person = await addPerson({ name });
  const fleetId = await addFleet(`${name}'s fleet`, person);
  const boatId = crypto.randomUUID();
  const engineId = crypto.randomUUID();
  await inFleet(fleetId, async (tx) => {
    await tx.insert(boats).values({ fleetId, id: boatId, name: `${name}'s boat` });
    await tx
      .insert(engines)
      .values({ fleetId, id: engineId, boatId, name: "main engine", profile: { features: {}, figures: {}, healthy: {} } });
  });
  return { fleetId, boatId, engineId, userId: person.userId };
}

beforeAll(async () => {
  ({ owner } = await testDatabase());
  Object.assign(a, await fleetWithBoat("Ada"));
  Object.assign(b, await fleetWithBoat("Ben"));
});

describe("the catalogue", () => {
  const tables = () =>
    owner.execute<{ name: string; enabled: boolean; forced: boolean; policies: number; checked: boolean; key: string[] | null }>(sql`
      select c.relname as name, c.relrowsecurity as enabled, c.relforcerowsecurity as forced,
        (select count(*)::int from pg_policy p where p.polrelid = c.oid) as policies,
        coalesce((select bool_and(p.polpermissive and pg_get_expr(p.polqual, p.polrelid) like '%app.fleet_id%' and pg_get_expr(p.polwithcheck, p.polrelid) like '%app.fleet_id%')
          from pg_policy p where p.polrelid = c.oid), false) as checked,
        (select array_agg(at.attname::text order by k.ord) from pg_index i, unnest(i.indkey) with ordinality k(attnum, ord)
          join pg_attribute at on at.attnum = k.attnum where i.indrelid = c.oid and i.indisprimary and at.attrelid = c.oid) as key
      from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p')`);
  const exceptions = [...IDENTITY_TABLES, ...SHARED_TABLES, ...OWNER_TABLES];

  test("every table is walled or a named exception", async () => {
    const { rows } = await tables();
    expect(rows.length).toBeGreaterThan(15);
    for (const t of rows.filter((row) => !exceptions.includes(row.name))) {
      expect(t, t.name).toMatchObject({ enabled: true, forced: true, policies: 1, checked: true });
      if (t.name === "fleets") expect(t.key).toEqual(["id"]);
      else expect(t.key?.[0], `${t.name}: fleet_id is first in the key`).toBe("fleet_id");
    }
  });

  test("every exception is a table that is there", async () => {
    const names = (await tables()).rows.map((t) => t.name);
    expect(names).toEqual(expect.arrayContaining(exceptions));
  });

  test("fleet_id is first in every index, unique key and foreign key of a walled table", async () => {
    const { rows } = await owner.execute<{ name: string; first: string }>(sql`
      select i.indexrelid::regclass::text as name, a.attname as first from pg_index i join pg_class c on c.oid = i.indrelid and c.relrowsecurity
        join pg_attribute a on a.attrelid = c.oid and a.attnum = i.indkey[0] where c.relname <> 'fleets'
      union all
      select k.conname, a.attname from pg_constraint k join pg_class c on c.oid = k.conrelid and c.relrowsecurity
        join pg_class r on r.oid = k.confrelid and r.relrowsecurity
        join pg_attribute a on a.attrelid = c.oid and a.attnum = k.conkey[1] where k.contype = 'f'`);
    expect(rows.length).toBeGreaterThan(20);
    expect(rows.filter((row) => row.first !== "fleet_id")).toEqual([]);
  });

  test("the server's roles own nothing and cannot bypass the wall", async () => {
    const { rows } = await owner.execute<{ name: string }>(sql`
      select r.rolname as name from pg_roles r where r.rolname in ('template_gudgeon_app', 'template_gudgeon_identity')
        and not r.rolsuper and not r.rolbypassrls and not r.rolcreaterole and not r.rolcreatedb
        and not exists (select from pg_class c where c.relowner = r.oid) and not exists (select from pg_auth_members m where m.member = r.oid)`);
    expect(rows).toHaveLength(2);
  });

  test("the app role may only add to append-only tables and only read shared ones", async () => {
    for (const [names, allowed] of [
      [APPEND_ONLY_TABLES, ["INSERT", "SELECT"]],
      [SHARED_TABLES, ["SELECT"]],
    ] as const) {
      for (const name of names) {
        const { rows } = await owner.execute<{ may: string }>(
          sql`select privilege_type as may from information_schema.role_table_grants where grantee = 'template_gudgeon_app' and table_name = ${name} order by 1`,
        );
        expect(rows.map((r) => r.may)).toEqual(allowed);
      }
    }
  });
});

describe("a WHERE left out", () => {
  test("reads the rows of the transaction's fleet only", async () => {
    const seen = await inFleet(a.fleetId, (tx) => tx.select().from(boats));
    expect(seen.map((x) => x.id)).toEqual([a.boatId]);
  });

  test("changes the rows of that fleet only", async () => {
    const changed = await inFleet(a.fleetId, (tx) => tx.update(boats).set({ name: "Renamed" }).returning({ id: boats.id }));
    expect(changed).toEqual([{ id: a.boatId }]);
    const { rows } = await owner.execute<{ name: string }>(sql`select name from boats where id = ${b.boatId}`);
    expect(rows).toEqual([{ name: "Ben's boat" }]);
  });

  test("sees nothing where no fleet is set, also on a connection that served a fleet before", async () => {
    await Promise.all(Array.from({ length: 5 }, () => inFleet(a.fleetId, (tx) => tx.select().from(boats))));
    for (let i = 0; i < 10; i++) expect(await appDatabase().select().from(boats)).toEqual([]);
  });
});

describe("no writing across", () => {
  test("a row cannot be put into another fleet", async () => {
    const write = inFleet(a.fleetId, (tx) => tx.insert(boats).values({ fleetId: b.fleetId, id: crypto.randomUUID(), name: "Stray" }));
    await expect(write).rejects.toMatchObject(refused);
  });

  test("a row cannot be given away", async () => {
    await expect(inFleet(a.fleetId, (tx) => tx.update(boats).set({ fleetId: b.fleetId }))).rejects.toMatchObject(refused);
  });

  test("an engine cannot stand on another fleet's boat", async () => {
    const write = inFleet(a.fleetId, (tx) =>
      tx.insert(engines).values({
        fleetId: a.fleetId,
        id: crypto.randomUUID(),
        boatId: b.boatId,
        name: "x",
        profile: { features: {}, figures: {}, healthy: {} },
      }),
    );
    await expect(write).rejects.toMatchObject({ cause: { code: "23503" } });
  });
});

describe("the two roles", () => {
  test("the app role reads nothing of who people are", async () => {
    for (const name of IDENTITY_TABLES) {
      await expect(
        inFleet(a.fleetId, (tx) => tx.execute(sql.raw(`select 1 from ${name}`))),
        name,
      ).rejects.toMatchObject(refused);
    }
  });

  test("the identity role reads nothing of what they do", async () => {
    for (const name of ["fleets", "boats", "diagnoses", "diagnosis_events", "log_entries", "files", "shipped_tree_versions"]) {
      await expect(identityDatabase().execute(sql.raw(`select 1 from ${name}`)), name).rejects.toMatchObject(refused);
    }
    expect(await identityDatabase().select({ id: users.id }).from(users)).toHaveLength(2);
    expect(await identityDatabase().select().from(credentials)).toEqual([]);
  });

  test("neither may make tables or turn the wall off", async () => {
    await expect(inFleet(a.fleetId, (tx) => tx.execute(sql`create table mine (id int)`))).rejects.toMatchObject(refused);
    await expect(inFleet(a.fleetId, (tx) => tx.execute(sql`alter table boats disable row level security`))).rejects.toMatchObject(refused);
  });
});

describe("the log of a diagnosis", () => {
  const event = { diagnosisId: crypto.randomUUID(), id: crypto.randomUUID(), version: crypto.randomUUID() };

  test("cannot be rewritten, not by the app role and not by the owner", async () => {
    await owner.execute(
      sql`insert into shipped_tree_versions (id, key, title, number, document, hash) values (${event.version}, 't', 'T', 1, '{}', 'h')`,
    );
    await inFleet(a.fleetId, async (tx) => {
      await tx.execute(sql`insert into diagnoses (fleet_id, id, engine_id, shipped_version_id, begun_at, begun_by, last_event_at)
        values (${a.fleetId}, ${event.diagnosisId}, ${a.engineId}, ${event.version}, now(), ${a.userId}, now())`);
      await tx.execute(sql`insert into diagnosis_events (fleet_id, id, diagnosis_id, device, sequence, kind, payload, made_at, by)
        values (${a.fleetId}, ${event.id}, ${event.diagnosisId}, ${crypto.randomUUID()}, 1, 'noted', '{}', now(), ${a.userId})`);
    });
    await expect(inFleet(a.fleetId, (tx) => tx.execute(sql`update diagnosis_events set kind = 'ended'`))).rejects.toMatchObject(refused);
    await expect(inFleet(a.fleetId, (tx) => tx.execute(sql`delete from diagnosis_events`))).rejects.toMatchObject(refused);
    for (const statement of [
      sql`update diagnosis_events set kind = 'ended'`,
      sql`delete from diagnosis_events`,
      sql`truncate diagnosis_events`,
    ]) {
      await expect(owner.execute(statement)).rejects.toMatchObject({ cause: { code: "23001" } });
    }
    await expect(owner.execute(sql`update shipped_tree_versions set title = 'X'`)).rejects.toMatchObject({ cause: { code: "23001" } });
  });
});
