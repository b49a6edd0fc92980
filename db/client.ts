import { drizzle, type NodePgDatabase } from "drizzle-orm/node-postgres";
import { Pool } from "pg";

export type Database = NodePgDatabase;
export type Transaction = Parameters<Parameters<Database["transaction"]>[0]>[0];
type Connection = { pool: Pool; db: Database };

// One pool a process and address: the bundler may make several copies of this module, and `next dev` loads it anew after each change.
const store = globalThis as unknown as { gudgeonPools?: Map<string, Connection> };
const pools = (store.gudgeonPools ??= new Map());

/** Opens no connection before the first query, so `next build` may load it without a database. */
function connect(name: "DATABASE_APP_URL" | "DATABASE_IDENTITY_URL"): Database {
  const url = process.env[name];
  if (!url) throw new Error(`${name} is not set: the start command sets it (scripts/lib/roles.mjs).`);
  const known = pools.get(url);
  if (known) return known.db;
  const pool = new Pool({ connectionString: url, max: Number(process.env.DATABASE_POOL ?? 10), connectionTimeoutMillis: 5_000 });
  // A connection lost while idle (the server was restarted) must not end the process.
  pool.on("error", (error) => console.error("postgres:", error.message));
  const db = drizzle(pool, { casing: "snake_case" });
  pools.set(url, { pool, db });
  return db;
}

/** As the app role: sees no row of a fleet table until a fleet is set for the transaction. Only lib/server/auth opens those. */
export const appDatabase = (): Database => connect("DATABASE_APP_URL");

/** As the identity role: who people are, their sessions and memberships. Only lib/server/auth and lib/server/people use it. */
export const identityDatabase = (): Database => connect("DATABASE_IDENTITY_URL");

/** For tests and for the end of a script. */
export async function closePools(): Promise<void> {
  const open = [...pools.values()];
  pools.clear();
  await Promise.all(open.map((c) => c.pool.end()));
}
