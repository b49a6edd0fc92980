// Process helpers. Node built-ins only: these run before `npm ci`.
import { spawn } from "node:child_process";
import { accessSync, constants, existsSync, readFileSync } from "node:fs";
import net from "node:net";
import path from "node:path";
import { stripVTControlCharacters } from "node:util";

export const root = path.resolve(import.meta.dirname, "../..");
export const isRoot = process.getuid?.() === 0;
/** A program that npm installed. */
export const bin = (name) => path.join(root, "node_modules/.bin", name);
const t0 = Date.now();
export const log = (msg) => console.log(`[${((Date.now() - t0) / 1000).toFixed(1)}s] ${msg}`);
/** A failure whose message says what to do; shown without a stack. */
export class UserError extends Error {}

export function which(name, extraDirs = []) {
  for (const dir of [...extraDirs, ...(process.env.PATH ?? "").split(path.delimiter), "/usr/sbin", "/sbin"]) {
    if (!dir) continue;
    const file = path.join(dir, name);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {}
  }
  return null;
}

const setpriv = process.platform === "linux" ? which("setpriv") : null;

/**
 * A program and its arguments, so that the kernel signals it when we die, even by kill -9 (prctl PR_SET_PDEATHSIG through
 * util-linux's setpriv, where that exists).
 */
const endedWithUs = (signal, cmd, args, drop = []) =>
  setpriv ? [setpriv, [...drop, `--pdeathsig=${signal}`, "--", cmd, ...args]] : [cmd, args];

/** Runs to the end, or to ours unless `mayOutlive`; throws on a non-zero exit unless `check: false`. */
export function run(cmd, args, { check = true, mayOutlive = false, ...opts } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(...(mayOutlive ? [cmd, args] : endedWithUs("TERM", cmd, args)), { cwd: root, stdio: "inherit", ...opts });
    let out = "";
    child.stdout?.on("data", (d) => (out += d));
    child.stderr?.on("data", (d) => (out += d));
    child.on("error", reject);
    child.on("close", (code, signal) => {
      if (check && code !== 0) reject(new Error(`${cmd} ${args.join(" ")} ended with ${signal ?? code}\n${out}`));
      else resolve({ code, signal, out });
    });
  });
}

const LAST_LINES = 25;

/**
 * Runs to the end with what it prints kept back; where it fails, that is a UserError that says what failed, the last
 * lines of what it printed itself, and what to do.
 *
 * @param {{ failed: string, whatToDo: string }} says in plain words
 */
export async function runOrSay(cmd, args, { failed, whatToDo }, options = {}) {
  const told = (why, out) => {
    const lines = stripVTControlCharacters(out).trimEnd().split("\n").slice(-LAST_LINES);
    const said = out.trim() ? ["The last lines of what it said:", "", ...lines.map((line) => `  ${line}`.trimEnd())] : ["It said nothing."];
    return new UserError([`${failed} (${why}).`, "", ...said, "", whatToDo].join("\n"));
  };
  const { code, signal, out } = await run(cmd, args, { stdio: ["ignore", "pipe", "pipe"], ...options, check: false }).catch((error) => {
    throw told("it could not be started", error.message);
  });
  if (code !== 0) throw told(signal ? `it was ended by ${signal}` : `exit code ${code}`, out);
}

/**
 * A long-running child in a session of its own (so a Ctrl+C in the terminal reaches only us
 * and we decide the order of shutdown) that ends with us.
 */
export function daemon(cmd, args, { deathSignal = "TERM", as, ...opts } = {}) {
  const drop = as ? [`--reuid=${as.uid}`, `--regid=${as.gid}`, "--clear-groups"] : [];
  return spawn(...endedWithUs(deathSignal, cmd, args, drop), { detached: true, cwd: root, ...(setpriv ? {} : as), ...opts });
}

export function exited(child) {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((r) => child.once("exit", r));
}

/** Signal, then kill after a grace period; resolves when it is gone. */
export async function stop(child, signal = "SIGTERM", graceMs = 10_000) {
  if (!child || child.exitCode !== null || child.signalCode !== null) return;
  child.kill(signal);
  const timer = setTimeout(() => child.kill("SIGKILL"), graceMs);
  await exited(child);
  clearTimeout(timer);
}

export function alive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (e) {
    return e.code === "EPERM";
  }
}

/** "pid:starttime" names one process even after its pid is used again. */
export function processTag(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    return `${pid}:${stat.slice(stat.lastIndexOf(")") + 2).split(" ")[19]}`;
  } catch {
    return alive(pid) ? `${pid}:?` : null;
  }
}

function canListen(port, host) {
  return new Promise((resolve) => {
    const s = net.createServer();
    s.once("error", () => resolve(null));
    s.listen({ port, host, exclusive: true }, () => {
      const p = s.address().port;
      s.close(() => resolve(p));
    });
  });
}

/** `preferred` where nothing listens there (on any address), else a port the kernel picks. */
export async function freePort(preferred = 0, host = "127.0.0.1") {
  if (preferred && (await canListen(preferred, host)) && (await canListen(preferred, "::").then((p) => p ?? true))) return preferred;
  return await canListen(0, host);
}

/** Installs Debian packages when a program is missing; explains what to do when it can't. */
export async function ensureDebian(present, packages, why) {
  if (present()) return;
  const hint = `${why} is missing. Install it, for example: apt-get install ${packages.join(" ")}`;
  if (!isRoot || !existsSync("/usr/bin/apt-get")) throw new UserError(hint);
  log(`installing ${packages.join(" ")} with apt-get`);
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  const apt = async (...args) => {
    for (const end = Date.now() + 300_000; ; await new Promise((r) => setTimeout(r, 1000))) {
      const { code, out } = await run("apt-get", ["-q", ...args], { env, stdio: "pipe", check: false, mayOutlive: true });
      if (code === 0) return;
      // Another run (or unattended-upgrades) has apt at this moment. DPkg::Lock::Timeout does not cover `update`.
      if (!/Could not get lock|Unable to lock/.test(out) || Date.now() > end) throw new Error(`apt-get ${args.join(" ")}:\n${out}`);
    }
  };
  await apt("update");
  if (!present()) await apt("install", "-y", "--no-install-recommends", ...packages);
  if (!present()) throw new UserError(hint);
}
