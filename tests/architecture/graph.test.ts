import { cruise, type IReporterOutput, type ICruiseResult } from "dependency-cruiser";
import extractTSConfig from "dependency-cruiser/config-utl/extract-ts-config";
import { existsSync } from "node:fs";
import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";

/** What no single file shows: cycles, and what is reached through any number of hops. */
describe("the graph of imports", () => {
  let result: ICruiseResult;
  beforeAll(async () => {
    const roots = ["app", "components", "db", "lib", "proxy.ts", "instrumentation.ts"].filter((p) => existsSync(p));
    const report: IReporterOutput = await cruise(
      roots,
      {
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
      undefined,
      { tsConfig: extractTSConfig(path.resolve("tsconfig.json")) },
    );
    result = report.output as ICruiseResult;
  });

  test("has been read at all", () => {
    expect(result.summary.totalCruised).toBeGreaterThan(20);
    const aliased = result.modules.filter((m) => m.dependencies.some((d) => d.module.startsWith("@/") && !d.couldNotResolve));
    expect(aliased.length, "aliases are resolved").toBeGreaterThan(0);
  });
  test("has no cycles, and no path from the skipper's surface or the core to the server", () => {
    const broken = result.summary.violations.map(
      (v) => `${v.rule.name}: ${v.from} -> ${v.to}${v.cycle ? ` via ${v.cycle.map((c) => c.name).join(" -> ")}` : ""}`,
    );
    expect(broken).toEqual([]);
  });
});
