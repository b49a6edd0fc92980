import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { stateOf } from "./support/demo";
import { Fleet } from "./support/fleet";

test.use({ storageState: stateOf("owner@example.test") });

/** Every page there is; `of` makes the address from the demo fleet. */
const PAGES: [name: string, of: (ids: { fleet: string; engine: string; boat: string; diagnosis: string; tree: string }) => string][] = [
  ["front", () => "/"],
  ["sign in", () => "/sign-in"],
  ["sign up", () => "/sign-up"],
  ["forgotten password", () => "/forgotten"],
  ["a spent link", () => `/reset/${"x".repeat(43)}`],
  ["kept mail", () => "/dev/mail"],
  ["nothing here", () => "/no-such-page"],
  ["fleet", ({ fleet }) => `/f/${fleet}`],
  ["new boat", ({ fleet }) => `/f/${fleet}/boats/new`],
  ["boat", ({ fleet, boat }) => `/f/${fleet}/boats/${boat}`],
  ["spares for a passage", ({ fleet, boat }) => `/f/${fleet}/boats/${boat}/passage?hours=60&litres=200&dirtyLitres=200`],
  ["new engine", ({ fleet, boat }) => `/f/${fleet}/boats/${boat}/engines/new`],
  ["engine", ({ fleet, engine }) => `/f/${fleet}/engines/${engine}`],
  ["engine profile", ({ fleet, engine }) => `/f/${fleet}/engines/${engine}/edit`],
  ["hour readings", ({ fleet, engine }) => `/f/${fleet}/engines/${engine}/hours`],
  ["new repair", ({ fleet, engine }) => `/f/${fleet}/engines/${engine}/repairs/new`],
  ["log", ({ fleet }) => `/f/${fleet}/log`],
  ["a diagnosis", ({ fleet, diagnosis }) => `/f/${fleet}/log/${diagnosis}`],
  ["trees", ({ fleet }) => `/f/${fleet}/trees`],
  ["a tree", ({ fleet, tree }) => `/f/${fleet}/trees/${tree}?symptom=hard-start-hot`],
  ["people", ({ fleet }) => `/f/${fleet}/people`],
  ["account", () => "/account"],
  ["diagnose", ({ fleet }) => `/diagnose?fleet=${fleet}`],
  ["say it", ({ fleet, engine }) => `/diagnose?fleet=${fleet}&engine=${engine}`],
];

for (const [name, of] of PAGES) {
  test(`axe finds nothing serious on "${name}", by day and by night, on a phone and at a desk`, async ({ page }) => {
    const complaints: string[] = [];
    page.on("pageerror", (error) => complaints.push(String(error)));
    page.on("console", (message) => {
      if (message.type() === "error" && !message.text().includes("404")) complaints.push(message.text());
    });
    const fleet = await Fleet.of(page.request);
    const engine = await fleet.engine("Marrowfat");
    const diagnosis = (await fleet.log(engine.id)).find((e) => e.diagnosisId !== null)!.diagnosisId!;
    const { id: tree } = await fleet.tree();
    const address = of({ fleet: fleet.id, engine: engine.id, boat: engine.boatId, diagnosis, tree });
    for (const { width, light } of [
      { width: 1440, light: "day" },
      { width: 390, light: "night" },
      { width: 320, light: "day" },
    ]) {
      await page.setViewportSize({ width, height: 850 });
      await page.addInitScript((l) => localStorage.setItem("light", l), light);
      await page.goto(address);
      await expect(page.locator("h1").first()).toBeVisible();
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow, `scrolls sideways at ${width} px`).toBeLessThanOrEqual(0);
      if (width === 320) continue;
      const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"]).analyze();
      const grave = violations.filter((v) => v.impact === "serious" || v.impact === "critical");
      expect(
        grave.map(
          (v) =>
            `${v.id}: ${v.nodes
              .map((n) => n.target.join(" "))
              .slice(0, 3)
              .join("; ")}`,
        ),
      ).toEqual([]);
    }
    expect(complaints).toEqual([]);
  });
}
