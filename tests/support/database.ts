import { randomBytes } from "node:crypto";
import { drizzle } from "drizzle-orm/node-postgres";
import pg from "pg";
import { afterAll, inject } from "vitest";
import { closePools, type Database } from "@/db/client";

const inDatabase = (url: string, name: string) => Object.assign(new URL(url), { pathname: `/${name}` }).toString();

/**
 * A database of this test file's own, a copy of the migrated template (some 50 ms), with the server's two pools led to
 * it. `owner` is a superuser's view, for setting up and for looking behind the wall.
 */
export async function testDatabase(): Promise<{ owner: Database; ownerUrl: string }> {
  const { adminUrl, ownerUrl, appUrl, identityUrl } = inject("postgres");
  const name = `t_${randomBytes(6).toString("hex")}`;
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  await admin.query(`create database ${name} template template_gudgeon`);
  await admin.end();
  process.env.DATABASE_APP_URL = inDatabase(appUrl, name);
  process.env.DATABASE_IDENTITY_URL = inDatabase(identityUrl, name);
  process.env.AUTH_SECRET ??= randomBytes(32).toString("base64url");
  const pool = new pg.Pool({ connectionString: inDatabase(ownerUrl, name), max: 2 });
  // The whole server is thrown away later: no drop needed.
  afterAll(async () => {
    await closePools();
    await pool.end();
  });
  return { owner: drizzle(pool, { casing: "snake_case" }), ownerUrl: inDatabase(ownerUrl, name) };
}
