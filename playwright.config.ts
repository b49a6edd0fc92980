import { defineConfig } from "@playwright/test";

const run = process.env.RUN_DIR ?? ".data/manual"; // what one run writes

// The site, its database and its mailbox are started by scripts/test.mjs, which says where they are.
export default defineConfig({
  testDir: "tests/e2e",
  outputDir: `${run}/test-results`,
  fullyParallel: true,
  workers: 2,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  forbidOnly: Boolean(process.env.CI),
  reporter: [["list"], ["json", { outputFile: `${run}/playwright.json` }]],
  use: {
    baseURL: process.env.BASE_URL ?? "http://localhost:3000",
    trace: "retain-on-failure",
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium", // Debian's; nothing is downloaded
      args: [
        "--no-sandbox", // Chromium refuses its sandbox as root
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
        "--disable-dev-shm-usage",
      ],
    },
  },
  projects: [
    { name: "sign-in", testMatch: /.*\.setup\.ts/ },
    {
      name: "phone",
      testMatch: /.*\.phone\.spec\.ts/,
      dependencies: ["sign-in"],
      use: { browserName: "chromium", viewport: { width: 390, height: 844 }, hasTouch: true },
    },
    {
      name: "desk",
      testMatch: /^(?!.*\.phone).*\.spec\.ts/,
      dependencies: ["sign-in"],
      use: { browserName: "chromium", viewport: { width: 1440, height: 900 } },
    },
  ],
});
