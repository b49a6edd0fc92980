import path from "node:path";
import { defineConfig } from "vitest/config";

const run = process.env.RUN_DIR ?? ".data/manual";
const alias = {
  "@": import.meta.dirname,
  // Throws outside a React Server build.
  "server-only": path.resolve(import.meta.dirname, "tests/support/server-only.ts"),
};
const pure = (name: string, extra: object = {}) => ({
  resolve: { alias },
  test: { name, include: [`tests/${name}/**/*.test.ts`], environment: "node", ...extra },
});
const withDatabase = {
  globalSetup: ["tests/support/postgres-setup.ts"],
  testTimeout: 20_000,
  hookTimeout: 30_000,
  // It imports "next/server" without an ending, which Node alone does not find.
  server: { deps: { inline: ["next-auth"] } },
};

export default defineConfig({
  test: {
    // A zone with odd minutes: a forgotten time zone fails loudly.
    env: { TZ: "Asia/Kathmandu" },
    reporters: ["default", ["json", { outputFile: `${run}/vitest.json` }]],
    projects: [
      pure("core", { testTimeout: 30_000, hookTimeout: 30_000 }),
      pure("trees", { testTimeout: 60_000, hookTimeout: 60_000 }),
      pure("reference", { testTimeout: 60_000, hookTimeout: 60_000 }),
      pure("architecture", { testTimeout: 60_000, hookTimeout: 120_000 }),
      pure("server", withDatabase),
      pure("api", withDatabase),
    ],
  },
});
