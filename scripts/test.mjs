// npm test: format, lint, types, unit and database tests, then the built site in a browser. A fresh clone will do.
// `npm test -- tests/e2e/one.spec.ts` hands its arguments to Playwright.
import { cpSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { ensureNodeModules } from "./lib/npm.mjs";
import { startPostgres } from "./lib/postgres.mjs";
import { bin, ensureDebian, freePort, log, root, run, stop, which } from "./lib/proc.mjs";
import { stopping } from "./lib/stopping.mjs";

const { add, end } = stopping();
const total = { passed: 0, failed: 0, skipped: 0 };
const times = [];

/** Runs one part and takes its time; false when it failed. */
async function part(name, work) {
  log(`— ${name}`);
  const began = Date.now();
  let ok = true;
  try {
    await work();
  } catch (e) {
    ok = false;
    console.error(e.message ?? e);
  }
  times.push(`${name} ${((Date.now() - began) / 1000).toFixed(1)} s`);
  return ok;
}
/** A part that counts as one test. */
const check = async (name, work) => ((await part(name, work)) ? total.passed++ : total.failed++);
const tool = (name, ...args) => run(process.execPath, [bin(name), ...args]);

// Everything that this run writes: two runs side by side must not share a file.
const scratch = path.join(root, `.data/test-run-${process.pid}`);
mkdirSync(scratch, { recursive: true });
Object.assign(process.env, {
  RUN_DIR: scratch,
  NEXT_TELEMETRY_DISABLED: "1",
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: "true",
  FORCE_COLOR: process.env.FORCE_COLOR ?? "0",
});
const report = (file) => JSON.parse(readFileSync(path.join(scratch, file), "utf8"));
const chromium = () => process.env.CHROMIUM_PATH ?? which("chromium") ?? which("chromium-browser") ?? which("google-chrome");

try {
  const ready =
    (await part("npm ci", ensureNodeModules)) &&
    (await part("Debian packages", () => ensureDebian(chromium, ["chromium", "fonts-liberation"], "Chromium (or set CHROMIUM_PATH)")));
  if (ready) {
    await part("route types", () => tool("next", "typegen"));
    await check("schema and migrations agree", schemaAgrees);
    await check("format", () => tool("prettier", "--check", "--log-level", "warn", "."));
    await check("lint", () => tool("eslint", ".", "--max-warnings", "0"));
    await check("types", () => tool("tsc", "--noEmit"));
    process.env.TYPES_CHECKED = "1";
    await part("vitest", () => tool("vitest", "run").catch(() => {}));
    countVitest();
    if (await part("site", startSite)) {
      await part("playwright", () => tool("playwright", "test", ...process.argv.slice(2)).catch(() => {}));
      countPlaywright();
    } else total.failed++;
  } else total.failed++;
} catch (e) {
  console.error(e);
  total.failed++;
}
if (total.failed) log(`what the browser saw: ${path.relative(root, path.join(scratch, "test-results"))}`);
log(times.join(", "));
const code = total.failed || !total.passed ? 1 : 0;
await end(code, "", () => {
  if (!code) rmSync(scratch, { recursive: true, force: true });
  console.log(`${total.passed} passed, ${total.failed} failed${total.skipped ? `, ${total.skipped} skipped` : ""}`);
});

/** The migrations say what db/schema says. drizzle-kit exits 0 even when it wanted to ask something. */
async function schemaAgrees() {
  cpSync(path.join(root, "drizzle"), path.join(scratch, "drizzle"), { recursive: true });
  const out = path.relative(root, path.join(scratch, "drizzle"));
  const args = ["generate", "--dialect", "postgresql", "--schema", "db/schema", "--out", out, "--casing", "snake_case"];
  const { out: said } = await run(process.execPath, [bin("drizzle-kit"), ...args], { stdio: ["ignore", "pipe", "pipe"] });
  if (!said.includes("No schema changes")) throw new Error(`Run: npm run db:generate\n${said}`);
}

async function startSite() {
  const { build } = await import("./lib/build.mjs");
  const { prepareDatabase } = await import("./lib/database.mjs");
  const { startMail } = await import("./lib/mail.mjs");
  const { serve } = await import("./lib/serve.mjs");
  const dir = await build();
  const server = await startPostgres({ dir: path.join(scratch, "postgres"), database: "gudgeon", ephemeral: true });
  add(() => server.stop());
  const { env, demo } = await prepareDatabase(server.url, { demo: true });
  writeFileSync(path.join(scratch, "demo.json"), JSON.stringify(demo)); // who may sign in, for the browser tests
  const mailDir = path.join(scratch, "mail");
  const mail = await startMail({ dir: mailDir });
  add(() => mail.stop());
  const site = await serve({
    dir,
    port: await freePort(),
    env: { ...env, SMTP_URL: mail.url, MAIL_DIR: mailDir, FILES_DIR: path.join(scratch, "files") },
  });
  add(() => stop(site.child));
  Object.assign(process.env, { BASE_URL: site.url, MAIL_DIR: mailDir, CHROMIUM_PATH: chromium() });
}

function countVitest() {
  try {
    const v = report("vitest.json");
    total.passed += v.numPassedTests;
    total.failed += v.numFailedTests + (v.success || v.numFailedTests ? 0 : 1); // a file that does not load fails no test
    total.skipped += v.numPendingTests + v.numTodoTests;
  } catch {
    total.failed++;
  }
}

function countPlaywright() {
  try {
    const { stats } = report("playwright.json");
    total.passed += stats.expected;
    total.failed += stats.unexpected + stats.flaky + (stats.expected ? 0 : 1);
    total.skipped += stats.skipped;
  } catch {
    total.failed++;
  }
}
