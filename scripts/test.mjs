// npm test: lint, types, unit and database tests, then the built site in a browser. A fresh clone will do.
import { cpSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { ensureNodeModules } from "./lib/npm.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { ensureDebian, freePort, log, root, run, stop, which } from "./lib/proc.mjs";

const bin = (name) => path.join(root, "node_modules/.bin", name);
const started = [];
let closing;
async function cleanUp() {
  closing ??= (async () => {
    for (const s of started.reverse()) await s().catch((e) => console.error(e));
  })();
  return closing;
}
for (const [signal, code] of [
  ["SIGINT", 130],
  ["SIGTERM", 143],
  ["SIGHUP", 129],
])
  process.on(signal, () => cleanUp().then(() => process.exit(code)));
const parent = process.ppid;
if (process.env.npm_lifecycle_event) setInterval(() => process.ppid !== parent && cleanUp().then(() => process.exit(1)), 1000).unref();

const total = { passed: 0, failed: 0, skipped: 0 };
const times = [];
async function step(name, work) {
  log(`— ${name}`);
  const t = Date.now();
  let ok = false;
  try {
    ok = (await work()) !== false;
  } catch (e) {
    console.error(e.message ?? e);
  }
  times.push(`${name} ${((Date.now() - t) / 1000).toFixed(1)} s`);
  return ok;
}
/** A step that counts as one test: lint, types. */
const check = async (name, cmd, args) =>
  (await step(name, () => run(process.execPath, [bin(cmd), ...args]))) ? total.passed++ : total.failed++;
const env = {
  ...process.env,
  NEXT_TELEMETRY_DISABLED: "1",
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: "true",
  FORCE_COLOR: process.env.FORCE_COLOR ?? "0",
};
Object.assign(process.env, env);
// Everything that this run writes: two runs side by side must not share a file.
const scratch = path.join(root, `.data/test-run-${process.pid}`);
mkdirSync(scratch, { recursive: true });
process.env.RUN_DIR = scratch;
const report = (file) => JSON.parse(readFileSync(path.join(scratch, file), "utf8"));

try {
  await step("npm ci", ensureNodeModules);
  const chromium = () => process.env.CHROMIUM_PATH ?? which("chromium") ?? which("chromium-browser") ?? which("google-chrome");
  await step("Debian packages", () => ensureDebian(chromium, ["chromium", "fonts-liberation"], "Chromium (or set CHROMIUM_PATH)"));

  await step("route types", () => run(process.execPath, [bin("next"), "typegen"]));
  // The migrations say what src/db/schema.ts says. (drizzle-kit exits 0 even when it wanted to ask something.)
  const same = await step("schema and migrations agree", async () => {
    cpSync(path.join(root, "drizzle"), path.join(scratch, "drizzle"), { recursive: true });
    const out = path.relative(root, path.join(scratch, "drizzle"));
    const args = ["generate", "--dialect", "postgresql", "--schema", "src/db/schema.ts", "--out", out, "--casing", "snake_case"];
    const { out: said } = await run(process.execPath, [bin("drizzle-kit"), ...args], { stdio: ["ignore", "pipe", "pipe"] });
    if (!said.includes("No schema changes")) throw new Error(`Run: npx drizzle-kit generate\n${said}`);
  });
  total[same ? "passed" : "failed"]++;
  await check("eslint", "eslint", [".", "--max-warnings", "0"]);
  await check("tsc", "tsc", ["--noEmit"]);
  process.env.TYPES_CHECKED = "1";

  await step("vitest", () => run(process.execPath, [bin("vitest"), "run", ...(process.env.CI ? ["--coverage"] : [])]).catch(() => {}));
  try {
    const v = report("vitest.json");
    total.passed += v.numPassedTests;
    total.failed += v.numFailedTests + (v.success || v.numFailedTests ? 0 : 1); // a suite that does not load fails no test
    total.skipped += v.numPendingTests + v.numTodoTests;
  } catch {
    total.failed++;
  }

  const { build, seed, serve } = await import("./lib/app.mjs");
  const { migrate } = await import("./lib/migrate.mjs");
  const { startMail } = await import("./lib/mail.mjs");
  let dir;
  const up =
    (await step("build", async () => {
      dir = await build();
    })) &&
    (await step("start", async () => {
      const pg = await startPostgres({ dir: path.join(scratch, "pg"), ephemeral: true });
      started.push(() => pg.stop());
      await migrate(pg.url);
      await seed(pg.url);
      const mail = await startMail({ dir: path.join(scratch, "mail") });
      started.push(() => mail.stop());
      const site = await serve({
        dir,
        port: await freePort(),
        databaseUrl: pg.url,
        env: { SMTP_URL: mail.url, FILES_DIR: path.join(scratch, "files") },
      });
      started.push(() => stop(site.child));
      Object.assign(process.env, { BASE_URL: site.url, MAIL_DIR: path.join(scratch, "mail"), CHROMIUM_PATH: chromium() });
    }));
  if (up) {
    await step("playwright", () => run(process.execPath, [bin("playwright"), "test", ...process.argv.slice(2)]).catch(() => {}));
    try {
      const { stats } = report("playwright.json");
      total.passed += stats.expected;
      total.failed += stats.unexpected + stats.flaky;
      total.skipped += stats.skipped;
      if (!stats.expected) total.failed++;
    } catch {
      total.failed++;
    }
  } else total.failed++;
} finally {
  await cleanUp();
}
if (total.failed) log(`what the browser saw: ${path.relative(root, path.join(scratch, "test-results"))}`);
else rmSync(scratch, { recursive: true, force: true });
log(times.join(", "));
console.log(`${total.passed} passed, ${total.failed} failed${total.skipped ? `, ${total.skipped} skipped` : ""}`);
process.exit(total.failed || !total.passed ? 1 : 0);
