// Secrets made once per checkout and kept in .data, so that sessions outlive a restart.
import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "./proc.mjs";

export function secrets() {
  if (process.env.AUTH_SECRET) return { AUTH_SECRET: process.env.AUTH_SECRET };
  const file = path.join(root, ".data/secrets.json");
  if (!existsSync(file)) {
    mkdirSync(path.dirname(file), { recursive: true });
    // Of two runs that make them at once, the second takes the first one's.
    const made = `${file}.${process.pid}`;
    writeFileSync(made, JSON.stringify({ AUTH_SECRET: randomBytes(32).toString("base64url") }), { mode: 0o600 });
    if (!existsSync(file)) renameSync(made, file);
    rmSync(made, { force: true });
  }
  return JSON.parse(readFileSync(file, "utf8"));
}
