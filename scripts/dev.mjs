// npm run dev: the site for work, rebuilt as files change, with the same database and mailbox as npm start.
import path from "node:path";
import { claimCheckout } from "./lib/checkout.mjs";
import { ensureNodeModules } from "./lib/npm.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { bin, daemon, freePort, log, root, stop, UserError } from "./lib/proc.mjs";
import { SOCKET_ADDRESS } from "./lib/serve.mjs";
import { stopping } from "./lib/stopping.mjs";

const { add, end } = stopping();

try {
  const announce = claimCheckout();
  await ensureNodeModules();
  const { prepareDatabase } = await import("./lib/database.mjs");
  const { startMail } = await import("./lib/mail.mjs");
  const { secrets } = await import("./lib/secrets.mjs");

  let ownerUrl = process.env.DATABASE_URL;
  if (!ownerUrl) {
    const server = await startPostgres({ dir: path.join(root, ".data/postgres"), database: "gudgeon" });
    add(() => server.stop());
    ownerUrl = server.url;
  }
  const { env } = await prepareDatabase(ownerUrl, { demo: true });
  const mail = await startMail({ dir: path.join(root, ".data/mail"), onMail: (m) => log(`mail to ${m.to}: ${m.subject}`) });
  add(() => mail.stop());
  const port = await freePort(Number(process.env.PORT ?? 3000));
  const url = `http://localhost:${port}`;
  const child = daemon(process.execPath, [...SOCKET_ADDRESS, bin("next"), "dev", "-p", String(port)], {
    stdio: ["ignore", "inherit", "inherit"],
    env: {
      ...process.env,
      DATABASE_URL: undefined, // the owner's address: what serves people never sees it
      ...secrets(),
      ...env,
      NEXT_TELEMETRY_DISABLED: "1",
      AUTH_URL: url,
      SMTP_URL: mail.url,
      MAIL_DIR: path.join(root, ".data/mail"),
      FILES_DIR: path.join(root, ".data/files"),
    },
  });
  add(() => stop(child));
  child.once("exit", () => end(1, "next dev ended"));
  announce(url);
} catch (e) {
  console.error(e instanceof UserError ? e.message : e);
  await end(1);
}
