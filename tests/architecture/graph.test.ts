import { cruise, type ICruiseResult } from "dependency-cruiser";
import extractTSConfig from "dependency-cruiser/config-utl/extract-ts-config";
import { existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";

const ROOTS = ["app", "components", "db", "lib", "proxy.ts", "instrumentation.ts"];

/** What no single file shows: cycles, and what is reached through any number of hops. */
async function readGraph(baseDir: string): Promise<ICruiseResult> {
  const report = await cruise(
    ROOTS.filter((root) => existsSync(path.join(baseDir, root))),
    {
      baseDir,
      validate: true,
      ruleSet: {
        forbidden: [
          { name: "no-cycle", severity: "error", from: {}, to: { circular: true, viaOnly: { dependencyTypesNot: ["type-only"] } } },
          {
            name: "flow-stays-off-the-server",
            severity: "error",
            from: { path: "^app/\\(flow\\)/" },
            to: { path: "^(lib/server|db)/", reachable: true },
          },
          {
            name: "core-is-pure",
            severity: "error",
            from: { path: "^lib/core/" },
            to: { path: "^(lib/(server|client)|db|components|app)/", reachable: true },
          },
        ],
      },
      doNotFollow: { path: "node_modules" },
      tsPreCompilationDeps: true,
      enhancedResolveOptions: { extensions: [".ts", ".tsx", ".mjs", ".js"] },
    },
    { alias: { "@": baseDir } },
    { tsConfig: extractTSConfig(path.resolve("tsconfig.json")) },
  );
  return report.output as ICruiseResult;
}
const brokenIn = (result: ICruiseResult) => result.summary.violations.map((v) => `${v.rule.name}: ${v.from} -> ${v.to}`);

describe("the graph of imports", () => {
  let result: ICruiseResult;
  beforeAll(async () => {
    result = await readGraph(process.cwd());
  });
  test("has been read, aliases and all", () => {
    expect(result.summary.totalCruised).toBeGreaterThan(100);
    expect(result.modules.some((m) => m.dependencies.some((d) => d.module.startsWith("@/") && !d.couldNotResolve))).toBe(true);
  });
  test("has no cycles, and no path from the skipper's surface or the core to the server", () => {
    expect(brokenIn(result)).toEqual([]);
  });
});

describe("the graph check itself", () => {
  const planted: [string, Record<string, string>, string][] = [
    [
      "sees the server behind two hops from the skipper's surface",
      {
        "app/(flow)/page.ts": 'import { b } from "@/components/b"; export const a = b;',
        "components/b.ts": 'import { c } from "../lib/client/c"; export const b = c;',
        "lib/client/c.ts": 'import { d } from "@/lib/server/d"; export const c = d;',
        "lib/server/d.ts": "export const d = 1;",
      },
      "flow-stays-off-the-server: app/(flow)/page.ts -> lib/server/d.ts",
    ],
    [
      "sees a cycle",
      {
        "lib/core/a.ts": 'import { b } from "./b"; export const a = () => b;',
        "lib/core/b.ts": 'import { a } from "./a"; export const b = () => a;',
      },
      "no-cycle: lib/core/a.ts -> lib/core/b.ts",
    ],
  ];
  test.each(planted)("%s", async (_title, files, breach) => {
    const dir = mkdtempSync(path.join(os.tmpdir(), "planted-"));
    try {
      for (const [name, text] of Object.entries(files)) {
        mkdirSync(path.dirname(path.join(dir, name)), { recursive: true });
        writeFileSync(path.join(dir, name), text);
      }
      expect(brokenIn(await readGraph(dir))).toContain(breach);
    } finally {
      rmSync(dir, { recursive: true });
    }
  });
});
