import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";

const files = execFileSync("git", ["ls-files", "--cached", "--others", "--exclude-standard"], { encoding: "utf8" })
  .split("\n")
  .filter(Boolean);
const code = files.filter((f) => /\.(ts|tsx|mjs)$/.test(f));

describe("the house", () => {
  test("has no drawers: no barrels, utils, helpers, common or misc", () => {
    expect(code.filter((f) => /(^|\/)(utils?|helpers?|common|misc|types|index)\.(ts|tsx|mjs)$/.test(f))).toEqual([]);
  });
  test("names its files in kebab-case", () => {
    const own = code.filter((f) => !/^(\.|README|DEVELOPERS)/.test(f));
    expect(own.filter((f) => !/^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z]+)*\.(ts|tsx|mjs)$/.test(path.basename(f)))).toEqual([]);
  });
  test("marks every file of lib/server as the server's", () => {
    expect(
      files.filter(
        (f) => /^lib\/server\/.*\.tsx?$/.test(f) && !/^(\/\*[\s\S]*?\*\/\s*|\/\/.*\n)*import "server-only";/.test(readFileSync(f, "utf8")),
      ),
    ).toEqual([]);
  });
  test("puts every test where a suite runs it", () => {
    const suites = /^tests\/(core|trees|reference|server|api|architecture)\/.*\.test\.ts$|^tests\/e2e\/.*\.(spec|setup)\.ts$/;
    expect(files.filter((f) => /\.(test|spec|setup)\.tsx?$/.test(f) && !suites.test(f))).toEqual([]);
  });
  test("names no host in its lock file", () => {
    expect(readFileSync("package-lock.json", "utf8")).not.toMatch(/"resolved": "https?:/);
  });
  test.each(["README.md", "DEVELOPERS.md"])("names only paths that exist in %s", (paper) => {
    const named = [...readFileSync(paper, "utf8").matchAll(/`([a-z.]+\/[A-Za-z0-9_./()[\]-]*[A-Za-z0-9_/)\]])`/g)].map((m) =>
      m[1]!.replace(/\/$/, ""),
    );
    const known = (p: string) => files.includes(p) || files.some((f) => f.startsWith(`${p}/`)) || p.startsWith(".data");
    expect(named.filter((p) => !known(p))).toEqual([]);
  });
});
