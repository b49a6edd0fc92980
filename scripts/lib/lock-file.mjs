// Lock files that outlive their holder without harm. Node built-ins only: these are taken before `npm ci`.
import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { log, processTag, root } from "./proc.mjs";

const pause = (ms) => Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, ms);

/**
 * Takes a lock file for this process: null when it is ours, else what its living holder wrote. A lock whose holder has
 * died is taken over; of several that find it so, one gets it.
 * @returns {null | { tag: string, url?: string }}
 */
export function takeLock(file) {
  mkdirSync(path.dirname(file), { recursive: true });
  for (let waited = false; ;) {
    try {
      writeFileSync(file, JSON.stringify({ tag: processTag(process.pid) }), { flag: "wx" });
      return null;
    } catch (e) {
      if (e.code !== "EEXIST") throw e;
    }
    const held = read(file);
    if (held === "" && !waited) {
      pause(200); // made a moment ago and still to be written
      waited = true;
    } else if (held !== null) {
      const holder = parse(held);
      if (holder && processTag(Number(holder.tag.split(":")[0])) === holder.tag) return holder;
      moveAway(file, held);
    }
  }
}

/** Removes a dead holder's lock; one that somebody else has put there since is put back. */
function moveAway(file, held) {
  const aside = `${file}.${process.pid}`;
  try {
    renameSync(file, aside);
  } catch (e) {
    if (e.code === "ENOENT") return; // somebody was quicker
    throw e;
  }
  if (read(aside) === held) rmSync(aside, { force: true });
  else renameSync(aside, file);
}

function read(file) {
  try {
    return readFileSync(file, "utf8");
  } catch (e) {
    if (e.code === "ENOENT") return null;
    throw e;
  }
}

function parse(text) {
  try {
    const holder = JSON.parse(text);
    return typeof holder?.tag === "string" ? holder : null;
  } catch {
    return null;
  }
}

/** One at a time in this checkout. */
export async function withLock(name, work) {
  const file = path.join(root, `.data/${name}.lock`);
  for (let told = false; takeLock(file); told = true) {
    if (!told) log(`waiting for another run (${name})`);
    await new Promise((r) => setTimeout(r, 300));
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}
