// npm start: everything from a fresh clone to a running site. Node built-ins only up to ensureNodeModules().
import path from "node:path";
import { ensureNodeModules } from "./lib/npm.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { freePort, log, root, stop, UserError } from "./lib/proc.mjs";

let web, pg, mail, closing;
async function shutdown(code, why) {
  if (closing) return;
  closing = true;
  if (why) log(why);
  await stop(web); // first what uses the database
  await mail?.stop();
  await pg?.stop();
  process.exit(code);
}
for (const [signal, code] of [
  ["SIGINT", 130],
  ["SIGTERM", 143],
  ["SIGHUP", 129],
])
  process.on(signal, () => shutdown(code, `${signal}: stopping`));
// npm itself killed hard: nobody is left to stop us, so we go too.
const parent = process.ppid;
if (process.env.npm_lifecycle_event) setInterval(() => process.ppid !== parent && shutdown(1, "npm is gone: stopping"), 1000).unref();

try {
  const major = Number(process.versions.node.split(".")[0]);
  if (major < 20) throw new UserError(`Node.js 20 or newer is needed; this is ${process.version}.`);
  await ensureNodeModules();
  const { build, claimCheckout, secrets, seed, serve } = await import("./lib/app.mjs");
  const { migrate } = await import("./lib/migrate.mjs");
  const announce = claimCheckout();
  secrets();

  let databaseUrl = process.env.DATABASE_URL;
  const database = (async () => {
    if (!databaseUrl) {
      pg = await startPostgres({ dir: path.join(root, ".data/postgres") });
      pg.child.once("exit", () => shutdown(1, "PostgreSQL ended"));
      databaseUrl = pg.url;
    }
    await migrate(databaseUrl);
    await seed(databaseUrl);
    log("the database is ready");
  })();
  const results = await Promise.allSettled([build(), database]);
  for (const r of results) if (r.status === "rejected") throw r.reason;
  const dir = results[0].value;

  const env = {};
  if (!process.env.SMTP_URL) {
    const { startMail } = await import("./lib/mail.mjs");
    mail = await startMail({
      dir: path.join(root, ".data/mail"),
      onMail: (m) => log(`mail to ${m.to}: ${m.subject} (kept in .data/mail)`),
    });
    env.SMTP_URL = mail.url;
  }
  const host = process.env.HOST ?? "127.0.0.1";
  const wanted = Number(process.env.PORT ?? 3000);
  const port = await freePort(wanted, host);
  if (port !== wanted) {
    if (process.env.PORT) throw new UserError(`Port ${wanted} is taken.`);
    log(`port ${wanted} is taken; using ${port}`);
  }
  const site = await serve({ dir, port, host, databaseUrl, env });
  web = site.child;
  web.once("exit", () => shutdown(1, "the web server ended"));
  announce(site.url);
  log(`ready: ${site.url}`);
} catch (e) {
  console.error(e instanceof UserError ? e.message : e);
  await shutdown(1);
}
