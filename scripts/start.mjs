// npm start: everything from a fresh clone to a running site. Node built-ins only up to ensureNodeModules().
import path from "node:path";
import { claimCheckout } from "./lib/checkout.mjs";
import { ensureNodeModules } from "./lib/npm.mjs";
import { isForThisMachine } from "./lib/own-machine.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { freePort, log, root, stop, UserError } from "./lib/proc.mjs";
import { addressOf, serve } from "./lib/serve.mjs";
import { stopping } from "./lib/stopping.mjs";

const { add, end } = stopping();

try {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 19)) throw new UserError(`Gudgeon needs Node.js 20.19 or newer; this is ${process.version}.`);
  const announce = claimCheckout();
  await ensureNodeModules();
  const { build } = await import("./lib/build.mjs");

  const host = process.env.HOST ?? "127.0.0.1";
  // Demo people sign in with a password that anyone can read: where others can come, they are there only if asked for.
  const demo = process.env.DEMO ? process.env.DEMO !== "0" : isForThisMachine(host, addressOf(Number(process.env.PORT ?? 3000)));
  const database = (async () => {
    const { prepareDatabase } = await import("./lib/database.mjs");
    return prepareDatabase(process.env.DATABASE_URL ?? (await ownServer()), { demo });
  })();
  const [built, urls] = await Promise.allSettled([build(), database]);
  for (const result of [built, urls]) if (result.status === "rejected") throw result.reason;

  const port = await portFor(host);
  const env = { ...urls.value.env, FILES_DIR: process.env.FILES_DIR ?? path.join(root, ".data/files"), ...(await ownMailbox(host, port)) };
  const site = await serve({ dir: built.value, port, host, env });
  add(() => stop(site.child));
  site.child.once("exit", () => end(1, "the web server ended"));
  announce(site.url);
  log(`ready: ${site.url}`);
  if (urls.value.demo) console.log(demoSignIns(urls.value.demo, site.url, env.MAIL_DIR));
} catch (e) {
  console.error(e instanceof UserError ? e.message : e);
  await end(1);
}

async function ownServer() {
  const server = await startPostgres({ dir: path.join(root, ".data/postgres"), database: "gudgeon" });
  add(() => server.stop());
  server.child.once("exit", () => end(1, "PostgreSQL ended; its log is in .data/postgres/server.log"));
  log("PostgreSQL runs on loopback, its data in .data/postgres");
  return server.url;
}

/** PORT, or 3000, or the next free one; a PORT that was asked for and is taken is an error. */
async function portFor(host) {
  const wanted = Number(process.env.PORT ?? 3000);
  const port = await freePort(wanted, host);
  if (port === wanted) return port;
  if (process.env.PORT) throw new UserError(`Port ${wanted} is taken. Set PORT to a free one, or leave it out.`);
  log(`port ${wanted} is taken; using ${port}`);
  return port;
}

/** Without SMTP_URL, mail stays here: a mailbox on loopback, shown on /dev/mail where nobody else can look. */
async function ownMailbox(host, port) {
  if (process.env.SMTP_URL) return {};
  const { startMail } = await import("./lib/mail.mjs");
  const dir = path.join(root, ".data/mail");
  const shown = isForThisMachine(host, addressOf(port));
  if (!shown) log("others can open this site: /dev/mail is not shown, mail is kept in .data/mail. Set SMTP_URL to send it.");
  const where = shown ? "kept in .data/mail, shown on /dev/mail" : "kept in .data/mail";
  const mail = await startMail({ dir, onMail: (m) => log(`mail to ${m.to}: ${m.subject} (${where})`) });
  add(() => mail.stop());
  return { SMTP_URL: mail.url, ...(shown && { MAIL_DIR: dir }) };
}

function demoSignIns({ people, password }, url, mailDir) {
  const lines = people.map((p) => `  ${p.email.padEnd(28)} ${p.roles.join(", ")}`);
  return [
    "",
    `Demo sign-ins, all with the password "${password}":`,
    ...lines,
    mailDir ? `Mail that was sent: ${url}/dev/mail` : "",
    "Stop with Ctrl-C.",
    "",
  ].join("\n");
}
