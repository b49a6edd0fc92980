// The two roles the server signs in to PostgreSQL as. Needs node_modules (pg).
//
// The owner of the tables migrates and never serves. `app` sees fleet tables only, and those only through the fleet
// wall; `identity` sees who people are and nothing of what they do. Roles belong to a whole server while databases are
// many, so they are named after the database. Their passwords follow from the owner's: a second machine with the same
// DATABASE_URL arrives at the same ones, and nothing has to be kept.
import { createHmac } from "node:crypto";
import pg from "pg";
import { UserError } from "./proc.mjs";

/** Seen by the identity role alone; they stand outside the fleet wall because they are read before a fleet is known. */
export const IDENTITY_TABLES = ["users", "credentials", "sessions", "one_time_tokens", "attempts", "memberships", "invitations"];
/** The same for every fleet; the app role only reads them. */
export const SHARED_TABLES = ["shipped_tree_versions"];
/** The app role may add to them and read them. A trigger refuses the rest to the owner as well. */
export const APPEND_ONLY_TABLES = ["diagnosis_events", "corrections"];
/** Seen by neither. */
export const OWNER_TABLES = ["applied_migrations"];

const quote = (name) => `"${name.replaceAll('"', '""')}"`;
const literal = (text) => `'${text.replaceAll("'", "''")}'`;

function roleUrl(ownerUrl, given, kind) {
  if (given) return new URL(given);
  const url = new URL(ownerUrl);
  const owner = decodeURIComponent(url.password);
  if (!owner) {
    throw new UserError(
      `DATABASE_URL carries no password to derive the roles' own from. Make two roles yourself and set DATABASE_APP_URL and DATABASE_IDENTITY_URL:\n${advice(url, "app")}\n${advice(url, "identity")}`,
    );
  }
  const database = decodeURIComponent(url.pathname.slice(1));
  // PostgreSQL cuts names at 63 bytes.
  url.username = `${database.slice(0, 50)}_${kind}`;
  url.password = createHmac("sha256", owner).update(`gudgeon ${database} ${kind}`).digest("base64url");
  return url;
}

const advice = (url, kind) =>
  `  CREATE ROLE ${quote(`${decodeURIComponent(url.pathname.slice(1)).slice(0, 50)}_${kind}`)} LOGIN PASSWORD '...';`;

/**
 * Makes or mends the two roles and their grants, and returns the addresses to sign in with. Run it after every
 * migration: a table that it does not know is the app role's only if it is walled.
 * @param {string} ownerUrl
 * @param {{ appUrl?: string, identityUrl?: string }} [given] addresses of roles that somebody else has made
 * @returns {Promise<{ appUrl: string, identityUrl: string }>}
 */
export async function ensureRoles(
  ownerUrl,
  given = { appUrl: process.env.DATABASE_APP_URL, identityUrl: process.env.DATABASE_IDENTITY_URL },
) {
  const urls = { app: roleUrl(ownerUrl, given.appUrl, "app"), identity: roleUrl(ownerUrl, given.identityUrl, "identity") };
  const names = { app: decodeURIComponent(urls.app.username), identity: decodeURIComponent(urls.identity.username) };
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query("select pg_advisory_lock(727002)"); // two starts at once
    if (!given.appUrl) await ensureLogin(client, names.app, decodeURIComponent(urls.app.password));
    if (!given.identityUrl) await ensureLogin(client, names.identity, decodeURIComponent(urls.identity.password));
    await refuseStrongRoles(client, names);
    await client.query("begin");
    for (const statement of await grants(client, names)) await client.query(statement);
    await client.query("commit");
  } finally {
    await client.end();
  }
  return { appUrl: urls.app.toString(), identityUrl: urls.identity.toString() };
}

async function ensureLogin(client, name, password) {
  const { rows } = await client.query("select 1 from pg_roles where rolname = $1", [name]);
  const sql = `${rows.length ? "ALTER" : "CREATE"} ROLE ${quote(name)} LOGIN PASSWORD ${literal(password)}`;
  try {
    await client.query(sql);
  } catch (e) {
    if (e.code !== "42501") throw e;
    throw new UserError(`The owner of the database may not make roles. Run this once as a superuser, then start again:\n  ${sql};`);
  }
}

/** A role that walks through the wall is worse than none: it would go unnoticed. */
async function refuseStrongRoles(client, names) {
  if (names.app === names.identity) throw new UserError("DATABASE_APP_URL and DATABASE_IDENTITY_URL must name two different roles.");
  for (const name of Object.values(names)) {
    const { rows } = await client.query(
      `select r.rolsuper or r.rolbypassrls as strong, pg_has_role(r.oid, (select relowner from pg_class where oid = 'public.fleets'::regclass), 'member') as owner
       from pg_roles r where r.rolname = $1`,
      [name],
    );
    const role = rows[0];
    if (!role) throw new UserError(`The database has no role ${name}.`);
    if (role.strong || role.owner)
      throw new UserError(`The role ${name} can pass the fleet wall (superuser, BYPASSRLS or owner of the tables). Use a plain role.`);
  }
  const crossed = await client.query("select pg_has_role($1, $2, 'member') or pg_has_role($2, $1, 'member') as crossed", [
    names.app,
    names.identity,
  ]);
  if (crossed.rows[0].crossed) throw new UserError(`The roles ${names.app} and ${names.identity} must not be members of each other.`);
}

async function grants(client, { app, identity }) {
  const { rows } = await client.query(
    "select c.relname as name, c.relrowsecurity and c.relforcerowsecurity as walled from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p')",
  );
  const both = `${quote(app)}, ${quote(identity)}`;
  const out = [`REVOKE ALL ON ALL TABLES IN SCHEMA public FROM ${both}`, `GRANT USAGE ON SCHEMA public TO ${both}`];
  // Before PostgreSQL 15 everybody may make tables and functions there.
  const mayMake = await client.query("select has_schema_privilege($1, 'public', 'CREATE') as may", [app]);
  if (mayMake.rows[0].may) out.push("REVOKE CREATE ON SCHEMA public FROM PUBLIC");
  for (const { name, walled } of rows) {
    const table = `public.${quote(name)}`;
    if (IDENTITY_TABLES.includes(name)) out.push(`GRANT SELECT, INSERT, UPDATE, DELETE ON ${table} TO ${quote(identity)}`);
    else if (SHARED_TABLES.includes(name)) out.push(`GRANT SELECT ON ${table} TO ${quote(app)}`);
    else if (walled)
      out.push(`GRANT SELECT, INSERT${APPEND_ONLY_TABLES.includes(name) ? "" : ", UPDATE, DELETE"} ON ${table} TO ${quote(app)}`);
  }
  return out;
}
