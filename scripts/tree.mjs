// npm run tree -- check|show|prove|schema: brings node_modules in line, then hands over to scripts/tree/main.ts.
import { spawn } from "node:child_process";
import { pathToFileURL } from "node:url";
import path from "node:path";

// The command's own lines alone go to stdout: they may be read by a machine.
console.log = console.error;
const { root } = await import("./lib/proc.mjs");
const { ensureNodeModules } = await import("./lib/npm.mjs");
await ensureNodeModules();

const tsx = pathToFileURL(path.join(root, "node_modules/tsx/dist/loader.mjs")).href;
const child = spawn(
  process.execPath,
  // react-server: lib/server's modules refuse to load anywhere else.
  ["--conditions=react-server", "--import", tsx, path.join(root, "scripts/tree/main.ts"), ...process.argv.slice(2)],
  { stdio: "inherit", env: { ...process.env, TSX_TSCONFIG_PATH: path.join(root, "tsconfig.json") } },
);
child.on("error", (error) => {
  console.error(error.message);
  process.exitCode = 1;
});
child.on("exit", (code, signal) => {
  process.exitCode = signal ? 1 : (code ?? 1);
});
