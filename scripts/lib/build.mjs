// The production build, made once for each state of the sources. Needs node_modules.
import { createHash } from "node:crypto";
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from "node:fs";
import path from "node:path";
import { withLock } from "./lock-file.mjs";
import { bin, log, root, runOrSay } from "./proc.mjs";

const SOURCES = [
  "app",
  "components",
  "db",
  "lib",
  "public",
  "proxy.ts",
  "instrumentation.ts",
  "next.config.mjs",
  "postcss.config.mjs",
  "tsconfig.json",
  "package-lock.json",
];
const KEPT_BUILDS = 3;

const BUILD = {
  failed: "The site could not be built",
  whatToDo: [
    "Nothing was started, and earlier builds are as they were. What to do:",
    "  - Where it names a file, that file is at fault: mend it (git status shows what was changed here), then run npm start again.",
    "  - Where it speaks of memory or space, make room: a build takes about 2 GB of memory and 1 GB of disk.",
    "  - Where it names no file: delete .next and node_modules, then run npm start again.",
  ].join("\n"),
};

/**
 * Builds into a folder of its own, .data/builds/<hash of the sources>: a server that runs from one is not disturbed
 * by the next build, and the same sources are not built twice. Returns the folder.
 */
export async function build() {
  const builds = path.join(root, ".data/builds");
  const dir = path.join(builds, hashOfSources());
  return withLock("build", async () => {
    if (existsSync(path.join(dir, "server.js"))) {
      log("the build is up to date");
      return dir;
    }
    log("building (half a minute or so)");
    const env = { ...process.env, NEXT_TELEMETRY_DISABLED: "1", NODE_ENV: "production" };
    await runOrSay(process.execPath, [bin("next"), "build"], BUILD, { env });
    const standalone = path.join(root, ".next/standalone");
    // The standalone folder leaves these two out.
    cpSync(path.join(root, ".next/static"), path.join(standalone, ".next/static"), { recursive: true });
    if (existsSync(path.join(root, "public"))) cpSync(path.join(root, "public"), path.join(standalone, "public"), { recursive: true });
    writeFileSync(path.join(standalone, "script-hashes.json"), JSON.stringify(scriptHashes(path.join(root, ".next/server/app"))));
    mkdirSync(builds, { recursive: true });
    rmSync(dir, { recursive: true, force: true });
    renameSync(standalone, dir);
    forgetOldBuilds(builds);
    return dir;
  });
}

function hashOfSources() {
  const hash = createHash("sha256").update(process.version);
  const add = (name) => {
    const full = path.join(root, name);
    if (!existsSync(full)) return;
    if (statSync(full).isDirectory()) for (const child of readdirSync(full).sort()) add(path.join(name, child));
    else hash.update(name).update("\0").update(readFileSync(full));
  };
  SOURCES.forEach(add);
  return hash.digest("hex");
}

/**
 * The hashes of the inline scripts of every page that was rendered at build time. Such a page is the same bytes for
 * everyone and cannot carry a nonce; its content security policy names its scripts by these (proxy.ts).
 */
function scriptHashes(folder) {
  const hashes = new Set();
  const visit = (dir) => {
    for (const entry of readdirSync(dir, { withFileTypes: true })) {
      const full = path.join(dir, entry.name);
      if (entry.isDirectory()) visit(full);
      else if (entry.name.endsWith(".html")) {
        for (const [, text] of readFileSync(full, "utf8").matchAll(/<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g)) {
          if (text) hashes.add(`'sha256-${createHash("sha256").update(text).digest("base64")}'`);
        }
      }
    }
  };
  visit(folder);
  return [...hashes].sort();
}

function forgetOldBuilds(builds) {
  const newestFirst = readdirSync(builds)
    .map((name) => ({ name, at: statSync(path.join(builds, name)).mtimeMs }))
    .sort((a, b) => b.at - a.at);
  for (const { name } of newestFirst.slice(KEPT_BUILDS)) rmSync(path.join(builds, name), { recursive: true, force: true });
}
