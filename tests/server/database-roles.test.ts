import { randomBytes } from "node:crypto";
import pg from "pg";
import { beforeAll, describe, expect, inject, test } from "vitest";
import { migrate } from "@/scripts/lib/migrate.mjs";
import { ensureRoles } from "@/scripts/lib/roles.mjs";

// What a hosted database gives: an owner that is no superuser.
const suffix = randomBytes(4).toString("hex");
let adminUrl: string;

const withClient = async <T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
};

async function database(name: string, attributes: string): Promise<string> {
  await withClient(adminUrl, async (admin) => {
    await admin.query(`create role owner_${name} login ${attributes} password 'an owner''s password'`);
    await admin.query(`create database ${name} owner owner_${name}`);
  });
  const url = Object.assign(new URL(adminUrl), {
    pathname: `/${name}`,
    username: `owner_${name}`,
    password: "an owner's password",
  }).toString();
  await withClient(Object.assign(new URL(adminUrl), { pathname: `/${name}` }).toString(), (c) =>
    c.query(`alter schema public owner to owner_${name}`),
  );
  return url;
}

beforeAll(() => {
  ({ adminUrl } = inject("postgres"));
});

describe("an owner that is no superuser", () => {
  test("migrates, makes the two roles, and stands before the wall itself", async () => {
    const url = await database(`hosted_${suffix}`, "createrole");
    await migrate(url);
    const first = await ensureRoles(url, {});
    const again = await ensureRoles(url, {});
    expect(again).toEqual(first);
    const [fleetA, fleetB] = [crypto.randomUUID(), crypto.randomUUID()];
    await withClient(first.appUrl, async (app) => {
      for (const [fleet, name] of [
        [fleetA, "A"],
        [fleetB, "B"],
      ]) {
        await app.query("begin");
        await app.query("select set_config('app.fleet_id', $1, true)", [fleet]);
        await app.query("insert into fleets (id, name) values ($1, $2)", [fleet, name]);
        await app.query("insert into boats (fleet_id, id, name) values ($1, gen_random_uuid(), $2)", [fleet, `boat of ${name}`]);
        expect((await app.query("select name from boats")).rows).toEqual([{ name: `boat of ${name}` }]);
        await app.query("commit");
      }
      expect((await app.query("select * from boats")).rows).toEqual([]);
      await expect(app.query("select * from users")).rejects.toMatchObject({ code: "42501" });
    });
    // A membership refers to a fleet that the identity role cannot see: the reference is still checked, and holds.
    await withClient(first.identityUrl, async (identity) => {
      const user = crypto.randomUUID();
      await identity.query("insert into users (id, name, email) values ($1, 'Ada', 'ada@example.test')", [user]);
      await identity.query("insert into memberships (fleet_id, user_id, roles) values ($1, $2, '{owner}')", [fleetA, user]);
      await expect(
        identity.query("insert into memberships (fleet_id, user_id, roles) values (gen_random_uuid(), $1, '{owner}')", [user]),
      ).rejects.toMatchObject({ code: "23503" });
      await expect(identity.query("select * from boats")).rejects.toMatchObject({ code: "42501" });
    });
    await withClient(url, async (owner) => {
      expect((await owner.query("select * from boats")).rows, "forced on the owner too").toEqual([]);
    });
  });

  test("takes from everybody the right to make things beside its tables, which older servers give", async () => {
    const url = await database(`older_${suffix}`, "createrole");
    await withClient(url, (owner) => owner.query("grant create on schema public to public"));
    await migrate(url);
    const { appUrl, identityUrl } = await ensureRoles(url, {});
    for (const role of [appUrl, identityUrl])
      await expect(withClient(role, (client) => client.query("create table mine (id int)"))).rejects.toMatchObject({ code: "42501" });
  });

  test("that may not make roles is given the statement to run", async () => {
    const url = await database(`strict_${suffix}`, "");
    await migrate(url);
    await expect(ensureRoles(url, {})).rejects.toThrow(
      /Run this once as a superuser.*\n\s+CREATE ROLE "strict_.*_app" LOGIN PASSWORD '.+';/s,
    );
  });
});

describe("roles given by hand", () => {
  test("that could pass the wall are refused", async () => {
    const { ownerUrl } = inject("postgres");
    const name = `given_${suffix}`;
    await withClient(adminUrl, async (admin) => {
      await admin.query(`create database ${name} template template_gudgeon`);
      await admin.query(`create role strong_${suffix} login bypassrls password 'x'`);
      await admin.query(`create role plain_${suffix} login password 'x'`);
    });
    const url = Object.assign(new URL(ownerUrl), { pathname: `/${name}` });
    const as = (user: string) => Object.assign(new URL(url), { username: user, password: "x" }).toString();
    await expect(ensureRoles(url.toString(), { appUrl: as(`strong_${suffix}`), identityUrl: as(`plain_${suffix}`) })).rejects.toThrow(
      /can pass the fleet wall/,
    );
    await expect(ensureRoles(url.toString(), { appUrl: url.toString(), identityUrl: as(`plain_${suffix}`) })).rejects.toThrow(
      /can pass the fleet wall/,
    );
    await expect(ensureRoles(url.toString(), { appUrl: as(`plain_${suffix}`), identityUrl: as(`plain_${suffix}`) })).rejects.toThrow(
      /two different roles/,
    );
  });
});
