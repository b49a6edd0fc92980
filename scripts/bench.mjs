// npm run bench -- NAME [--json] [...]: one bench of tests/bench, measured on this machine.
import { existsSync, readdirSync } from "node:fs";
import path from "node:path";
import { ensureNodeModules } from "./lib/npm.mjs";
import { root, run } from "./lib/proc.mjs";

const [name, ...rest] = process.argv.slice(2);
const file = name && path.join(root, "tests/bench", `${name}.ts`);
if (!file || !existsSync(file)) {
  const names = readdirSync(path.join(root, "tests/bench"))
    .filter((f) => f.endsWith(".ts"))
    .map((f) => f.replace(/\.ts$/, ""));
  console.error(`Say which: npm run bench -- ${names.join(" | ")} [--json]`);
  process.exit(2);
}
await ensureNodeModules();
const { code } = await run(process.execPath, ["--conditions=react-server", "--import", "tsx", file, ...rest], { check: false });
process.exit(code ?? 1);
