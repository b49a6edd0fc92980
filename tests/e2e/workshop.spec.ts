import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { stateOf } from "./support/demo";
import { Fleet } from "./support/fleet";

// The stranger's fleet: what is published there changes nobody else's questions.
test.use({ storageState: stateOf("stranger@example.test") });
test.describe.configure({ mode: "serial" });

async function openWorkshop(page: Page): Promise<Fleet> {
  const fleet = await Fleet.of(page.request);
  await page.goto(`/workshop/${fleet.id}`);
  await expect(page.getByText(/^Sound: 0 errors/)).toBeVisible({ timeout: 30_000 });
  return fleet;
}

const sheet = (page: Page) => page.getByRole("complementary", { name: "The chosen node" });

async function find(page: Page, name: string): Promise<void> {
  await page.getByRole("searchbox").fill(name);
  await page.getByRole("search").getByRole("button").first().click();
}

test("a mechanic adds a cause, is refused while no remedy cures it, mends it and publishes; the version says what changed", async ({
  page,
}) => {
  const fleet = await openWorkshop(page);
  await page.getByRole("button", { name: "Add" }).click();
  await page.getByLabel("What is it called?").fill("Mud dauber in the tank vent");
  await page.getByRole("button", { name: "Add it" }).click();
  await expect(sheet(page).getByRole("heading", { name: "Mud dauber in the tank vent" })).toBeVisible();
  await expect(page.getByText(/^[1-9]\d* errors?/)).toBeVisible({ timeout: 15_000 });
  await page.getByRole("button", { name: "Publish" }).click();
  await expect(page.getByRole("dialog").getByText(/keeps? it from being published/)).toBeVisible();
  await expect(page.getByRole("dialog").locator("button[type=submit]")).toBeDisabled();
  await page.keyboard.press("Escape");

  // What it gives at a check, what cures it, and how it is told from its rivals.
  await sheet(page).getByRole("combobox", { name: "What the checks then find" }).selectOption({ index: 1 });
  await expect(page.getByRole("button", { name: "Undo" })).toHaveAttribute("title", /changed/);
  await page.getByRole("button", { name: "Undo" }).click();
  await expect(sheet(page).getByText("Nothing yet: it behaves as a sound engine")).toBeVisible();
  await page.getByRole("button", { name: "Undo" }).click();
  await expect(page.getByText(/^Sound: 0 errors/)).toBeVisible({ timeout: 15_000 });

  // A change that is sound: how common a cause is.
  await find(page, "Primary filter blocked");
  await sheet(page).getByRole("radio", { name: "occasional" }).check({ force: true });
  await expect(page.getByText(/^Saved /)).toBeVisible({ timeout: 15_000 });
  await page.reload();
  await expect(sheet(page).getByRole("radio", { name: "occasional" })).toBeChecked({ timeout: 30_000 });
  await expect(page.getByText(/^Proved on/)).toBeVisible({ timeout: 60_000 });
  await page.getByRole("button", { name: "Publish" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog.getByText(/how common/)).toBeVisible();
  for (const box of await dialog.getByRole("checkbox").all()) await box.check();
  await dialog.getByLabel("Note").fill("Our tanks are clean");
  await dialog.getByRole("button", { name: "Publish it" }).click();
  await expect(page).toHaveURL(new RegExp(`/f/${fleet.id}/trees$`), { timeout: 30_000 });
  await expect(page.getByText("Our tanks are clean").first()).toBeVisible();
  const { document } = await fleet.tree();
  expect(document.causes.find(({ key }) => key === "primary-filter-blocked")?.base).toBe("occasional");
});

test("with the connection lost in the middle the work stays on the device and is saved when it is back", async ({ page, context }) => {
  const fleet = await openWorkshop(page);
  await find(page, "Primary filter blocked");
  await expect(sheet(page).getByRole("heading", { name: "Primary filter blocked" })).toBeVisible();
  await context.setOffline(true);
  await sheet(page).getByRole("radio", { name: "rare" }).check({ force: true });
  await expect(page.getByText(/^No signal: kept on this device/)).toBeVisible({ timeout: 15_000 });
  await context.setOffline(false);
  await expect(page.getByText(/^Saved /)).toBeVisible({ timeout: 15_000 });
  const draft = await fleet.get<{ document: { causes: { key: string; base: unknown }[] } }>("trees/draft");
  expect(draft.document.causes.find(({ key }) => key === "primary-filter-blocked")?.base).toBe("rare");
});

test("the table is typed into like a sheet, and what was typed can be undone", async ({ page }) => {
  await openWorkshop(page);
  await page.getByRole("button", { name: "Table" }).click();
  const cell = page.locator('[data-cell="0,0"]');
  await cell.focus();
  const before = (await cell.textContent()) ?? "";
  await page.keyboard.type("seldom");
  await page.keyboard.press("Enter");
  await expect(cell).toHaveText("seldom");
  await page.keyboard.press("Control+z");
  await expect(cell).toHaveText(before);
});

for (const view of ["Graph", "Table", "Try it", "Prove it", "Learn"])
  test(`axe finds nothing serious in the workshop's view "${view}", by day and by night, and nothing scrolls sideways on a phone`, async ({
    page,
  }) => {
    test.slow(); // axe looks at each of some two thousand cells
    for (const { width, light } of [
      { width: 1440, light: "day" },
      { width: 390, light: "night" },
    ]) {
      await page.setViewportSize({ width, height: 850 });
      await page.addInitScript((l) => localStorage.setItem("light", l), light);
      await openWorkshop(page);
      await page.getByRole("button", { name: view }).click();
      await expect(page.getByRole("main").getByRole("heading", { level: 2 }).first()).toBeVisible();
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow, `scrolls sideways at ${width} px`).toBeLessThanOrEqual(0);
      const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"]).analyze();
      const grave = violations.filter((v) => v.impact === "serious" || v.impact === "critical");
      expect(grave.map((v) => `${v.id}: ${v.nodes.map((n) => n.target.join(" ")).join(", ")}`)).toEqual([]);
    }
  });
