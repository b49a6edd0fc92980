// Applies drizzle/*.sql, each file once and in the order of its name. Needs node_modules (pg).
//
// Not drizzle-orm's own migrator: it applies only files younger than the last one applied, so a migration
// made earlier on another branch and merged later is skipped without a word on databases that have the other.
import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import pg from "pg";
import { root } from "./proc.mjs";

export async function migrate(url, folder = path.join(root, "drizzle")) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await client.query("select pg_advisory_lock(727001)"); // two starts at once on one database
    await client.query(
      "create table if not exists public.applied_migrations (name text primary key, hash text not null, applied_at timestamptz not null default now())",
    );
    const done = new Map((await client.query("select name, hash from applied_migrations")).rows.map((r) => [r.name, r.hash]));
    for (const name of readdirSync(folder)
      .filter((f) => f.endsWith(".sql"))
      .sort()) {
      const text = readFileSync(path.join(folder, name), "utf8");
      const hash = createHash("sha256").update(text).digest("hex");
      if (done.has(name)) {
        if (done.get(name) !== hash) throw new Error(`${name} was changed after it had been applied: add a new migration instead.`);
        continue;
      }
      await client.query("begin");
      try {
        for (const statement of text.split("--> statement-breakpoint")) if (statement.trim()) await client.query(statement);
        await client.query("insert into applied_migrations (name, hash) values ($1, $2)", [name, hash]);
        await client.query("commit");
      } catch (e) {
        await client.query("rollback");
        throw Object.assign(new Error(`${name}: ${e.message}`), { cause: e });
      }
    }
  } finally {
    await client.end();
  }
}
