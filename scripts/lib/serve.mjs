// Serves a build and waits until it answers.
import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { daemon, root, UserError } from "./proc.mjs";
import { secrets } from "./secrets.mjs";

/** The site's name: "localhost", never 127.0.0.1. Next.js writes every loopback host as localhost in request URLs, and a cookie set under the other name would stay behind. */
export const addressOf = (port) => process.env.APP_URL ?? `http://localhost:${port}`;

/** What a Node process is begun with so that nobody can choose where they come from. */
export const SOCKET_ADDRESS = ["--import", pathToFileURL(path.join(import.meta.dirname, "socket-address.mjs")).href];

/** @param {{ dir: string, port: number, host?: string, env?: Record<string, string>, stdio?: "inherit" | "ignore" }} options */
export async function serve({ dir, port, host = "127.0.0.1", env = {}, stdio = "inherit" }) {
  const url = addressOf(port);
  const hashes = path.join(dir, "script-hashes.json");
  // The owner's address may do anything; what serves people never sees it.
  const inherited = { ...process.env, DATABASE_URL: undefined };
  const child = daemon(process.execPath, [...SOCKET_ADDRESS, path.join(dir, "server.js")], {
    cwd: root,
    stdio: ["ignore", stdio, stdio],
    env: {
      ...inherited,
      NEXT_TELEMETRY_DISABLED: "1",
      AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: "true",
      NODE_ENV: "production",
      ...secrets(),
      PORT: String(port),
      HOSTNAME: host,
      AUTH_URL: url,
      SCRIPT_HASHES: existsSync(hashes) ? JSON.parse(readFileSync(hashes, "utf8")).join(" ") : "",
      ...env,
    },
  });
  await untilHealthy(child, `http://${["127.0.0.1", "0.0.0.0", "::"].includes(host) ? "localhost" : bracketed(host)}:${port}`);
  return { child, url };
}

const bracketed = (host) => (host.includes(":") ? `[${host}]` : host);

async function untilHealthy(child, url) {
  let ended = false;
  child.once("exit", () => (ended = true));
  for (let i = 0; i < 600; i++) {
    if (ended) throw new UserError("The web server ended while starting; what it said stands above.");
    const ok = await fetch(`${url}/api/health`).then(
      (r) => r.ok,
      () => false,
    );
    if (ok) return;
    await new Promise((r) => setTimeout(r, 50));
  }
  child.kill("SIGKILL");
  throw new UserError("The web server did not answer within 30 s; what it said stands above.");
}
