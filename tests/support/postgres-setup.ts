import path from "node:path";
import pg from "pg";
import type { TestProject } from "vitest/node";
import { migrate } from "../../scripts/lib/migrate.mjs";
import { startPostgres } from "../../scripts/lib/postgres.mjs";
import { ensureRoles } from "../../scripts/lib/roles.mjs";

declare module "vitest" {
  export interface ProvidedContext {
    postgres: { adminUrl: string; ownerUrl: string; appUrl: string; identityUrl: string };
  }
}

/** One server for the run and one migrated template; each test file copies it (database.ts). The roles' grants are copied with it. */
export default async function setup(project: TestProject) {
  const server = await startPostgres({
    dir: path.resolve(`.data/test-${process.pid}-${project.name}`),
    database: "template_gudgeon",
    ephemeral: true,
  });
  try {
    await migrate(server.url);
    const { appUrl, identityUrl } = await ensureRoles(server.url, {});
    const adminUrl = server.urlFor("postgres");
    const admin = new pg.Client({ connectionString: adminUrl });
    await admin.connect();
    await admin.query("alter database template_gudgeon with is_template true allow_connections false");
    await admin.end();
    project.provide("postgres", { adminUrl, ownerUrl: server.url, appUrl, identityUrl });
  } catch (e) {
    await server.stop();
    throw e;
  }
  return () => server.stop();
}
