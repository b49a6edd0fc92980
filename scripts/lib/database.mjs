// From a server to a database that the site can use: migrated, its roles made, the shipped tree loaded, the demo seeded.
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { migrate } from "./migrate.mjs";
import { log, root, run } from "./proc.mjs";
import { ensureRoles } from "./roles.mjs";

/** Runs one of our TypeScript programs on the server's side of the house. */
const runTypeScript = (file, args = [], options = {}) =>
  run(process.execPath, ["--conditions=react-server", "--import", "tsx", path.join(root, file), ...args], options);

/**
 * @param {string} ownerUrl the owner's address: it migrates and is never served from
 * @param {{ demo: boolean }} options whether to seed the demo fleet, once
 * @returns {Promise<{ env: Record<string, string>, demo: null | { password: string, people: { email: string, roles: string[] }[] } }>}
 */
export async function prepareDatabase(ownerUrl, { demo }) {
  await migrate(ownerUrl);
  // After the migrations: what it grants depends on the tables there are.
  const roles = await ensureRoles(ownerUrl);
  const env = { DATABASE_APP_URL: roles.appUrl, DATABASE_IDENTITY_URL: roles.identityUrl };
  const reports = mkdtempSync(path.join(os.tmpdir(), "gudgeon-"));
  const report = path.join(reports, "demo.json");
  try {
    const withOwner = { env: { ...process.env, ...env, DATABASE_URL: ownerUrl, DEMO_REPORT: report } };
    await runTypeScript("db/load-shipped-tree.ts", [], withOwner);
    if (demo) await runTypeScript("db/seed.ts", [], withOwner);
    log("the database is ready");
    return { env, demo: demo ? JSON.parse(readFileSync(report, "utf8")) : null };
  } finally {
    rmSync(reports, { recursive: true, force: true });
  }
}

/** Works out every fleet's log anew from its events, on a database that is brought up to date first. */
export async function rebuildLog(ownerUrl) {
  await migrate(ownerUrl);
  const { appUrl, identityUrl } = await ensureRoles(ownerUrl);
  const env = { ...process.env, DATABASE_URL: ownerUrl, DATABASE_APP_URL: appUrl, DATABASE_IDENTITY_URL: identityUrl };
  await runTypeScript("db/rebuild-log.ts", [], { env });
}
