// Brings node_modules in line with package-lock.json, once per change of the lock file.
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { withLock } from "./lock-file.mjs";
import { log, root, runOrSay } from "./proc.mjs";

const INSTALL = {
  failed: "The packages could not be installed",
  whatToDo: "Look whether the package registry can be reached and the disk has room (about 1 GB), then run the command again.",
};

const marker = path.join(root, "node_modules/.lock-hash");
const want = () =>
  createHash("sha256")
    .update(readFileSync(path.join(root, "package-lock.json")))
    .update(process.version)
    .digest("hex");
const current = () => existsSync(marker) && readFileSync(marker, "utf8") === want();

export async function ensureNodeModules() {
  if (current()) return;
  await withLock("npm-ci", async () => {
    if (current()) return; // another run did it meanwhile
    log("npm ci");
    // --include=dev: NODE_ENV=production in the environment would leave out what the build needs.
    await runOrSay("npm", ["ci", "--include=dev", "--no-audit", "--no-fund"], INSTALL);
    writeFileSync(marker, want());
  });
}
