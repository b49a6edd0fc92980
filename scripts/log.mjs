// npm run log -- rebuild: works out the log anew from the events of the diagnoses. On DATABASE_URL, or on this checkout's own
// database while the site is stopped.
import path from "node:path";
import { claimCheckout } from "./lib/checkout.mjs";
import { ensureNodeModules } from "./lib/npm.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { root, UserError } from "./lib/proc.mjs";

const database = { stop: async () => undefined };
try {
  if (process.argv[2] !== "rebuild" || process.argv.length > 3) throw new UserError("Say what to do with the log: npm run log -- rebuild");
  if (!process.env.DATABASE_URL) claimCheckout();
  await ensureNodeModules();
  const { rebuildLog } = await import("./lib/database.mjs");
  await rebuildLog(process.env.DATABASE_URL ?? (await ownDatabase()));
} catch (e) {
  console.error(e instanceof UserError ? e.message : e);
  process.exitCode = 1;
} finally {
  await database.stop();
}

async function ownDatabase() {
  const server = await startPostgres({ dir: path.join(root, ".data/postgres"), database: "gudgeon" });
  database.stop = () => server.stop();
  return server.url;
}
