// Build, serve, wait. Needs node_modules.
import { createHash, randomBytes } from "node:crypto";
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from "node:fs";
import path from "node:path";
import { daemon, log, processTag, root, run, UserError, withLock } from "./proc.mjs";

const bin = (name) => path.join(root, "node_modules/.bin", name);
const quiet = { NEXT_TELEMETRY_DISABLED: "1" };

/** Made once per checkout, kept in .data: sessions outlive a restart. */
export function secrets() {
  const file = path.join(root, ".data/secrets.json");
  if (!existsSync(file)) {
    mkdirSync(path.dirname(file), { recursive: true });
    writeFileSync(file, JSON.stringify({ AUTH_SECRET: randomBytes(32).toString("base64url") }), { mode: 0o600 });
  }
  return JSON.parse(readFileSync(file, "utf8"));
}

export const seed = (url) => run(process.execPath, ["--import", "tsx", "src/db/seed.ts"], { env: { ...process.env, DATABASE_URL: url } });

function sourceHash() {
  const h = createHash("sha256").update(process.version);
  const add = (p) => {
    const full = path.join(root, p);
    if (!existsSync(full)) return;
    let names;
    try {
      names = readdirSync(full).sort();
    } catch {
      names = null;
    }
    if (names) for (const n of names) add(path.join(p, n));
    else h.update(p).update("\0").update(readFileSync(full));
  };
  ["src", "public", "next.config.ts", "tsconfig.json", "postcss.config.mjs", "package-lock.json"].forEach(add);
  return h.digest("hex");
}

/**
 * A production build of the sources as they are now, in a folder of its own: .data/builds/<hash>. A server
 * that runs from one is not disturbed by the next build, and the same sources are not built twice.
 */
export async function build() {
  const hash = sourceHash();
  const builds = path.join(root, ".data/builds");
  const dir = path.join(builds, hash);
  return withLock("build", async () => {
    if (existsSync(path.join(dir, "server.js"))) {
      log("the build is up to date");
      return dir;
    }
    log("next build");
    await run(process.execPath, [bin("next"), "build"], { env: { ...process.env, ...quiet, NODE_ENV: "production" } });
    const standalone = path.join(root, ".next/standalone");
    // The standalone folder leaves these two to a CDN or to us.
    cpSync(path.join(root, ".next/static"), path.join(standalone, ".next/static"), { recursive: true });
    if (existsSync(path.join(root, "public"))) cpSync(path.join(root, "public"), path.join(standalone, "public"), { recursive: true });
    mkdirSync(builds, { recursive: true });
    rmSync(dir, { recursive: true, force: true });
    renameSync(standalone, dir);
    // Keep the last three.
    const old = readdirSync(builds)
      .map((n) => ({ n, at: statSync(path.join(builds, n)).mtimeMs }))
      .sort((a, b) => b.at - a.at)
      .slice(3);
    for (const { n } of old) rmSync(path.join(builds, n), { recursive: true, force: true });
    return dir;
  });
}

export async function serve({ dir, port, host = "127.0.0.1", databaseUrl, env = {}, stdio = "inherit" }) {
  // "localhost", not 127.0.0.1: Next.js writes every loopback host as localhost in request URLs, so its
  // redirects lead there, and a cookie set on 127.0.0.1 would be left behind.
  const url = process.env.APP_URL ?? `http://localhost:${port}`;
  const child = daemon(process.execPath, [path.join(dir, "server.js")], {
    cwd: root,
    stdio: ["ignore", stdio, stdio],
    env: {
      ...process.env,
      ...quiet,
      NODE_ENV: "production",
      ...secrets(),
      PORT: String(port),
      HOSTNAME: host,
      DATABASE_URL: databaseUrl,
      AUTH_URL: url,
      ...env,
    },
  });
  let dead = false;
  child.once("exit", () => (dead = true));
  for (let i = 0; i < 600; i++) {
    if (dead) throw new Error("the web server ended while starting");
    const ok = await fetch(`${url}/api/health`).then(
      (r) => r.ok,
      () => false,
    );
    if (ok) return { child, url };
    await new Promise((r) => setTimeout(r, 50));
  }
  child.kill("SIGKILL");
  throw new Error("the web server did not become healthy within 30 s");
}

/** One `npm start` per checkout: a second one is told where the first one is. */
export function claimCheckout() {
  const file = path.join(root, ".data/start.lock");
  mkdirSync(path.dirname(file), { recursive: true });
  for (;;) {
    try {
      writeFileSync(file, JSON.stringify({ tag: processTag(process.pid) }), { flag: "wx" });
      break;
    } catch (e) {
      if (e.code !== "EEXIST") throw e;
      let other = {};
      try {
        other = JSON.parse(readFileSync(file, "utf8"));
      } catch {}
      const pid = Number(String(other.tag).split(":")[0]);
      if (pid && processTag(pid) === other.tag) throw new UserError(`Already running${other.url ? ` at ${other.url}` : ""} (pid ${pid}).`);
      rmSync(file, { force: true });
    }
  }
  process.on("exit", () => rmSync(file, { force: true }));
  return (url) => writeFileSync(file, JSON.stringify({ tag: processTag(process.pid), url }));
}
