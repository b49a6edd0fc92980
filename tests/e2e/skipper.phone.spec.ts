import { expect, test, type Page } from "@playwright/test";
import { demo, stateOf } from "./support/demo";
import { Fleet } from "./support/fleet";
import { playAt } from "./support/play";

test.use({ storageState: stateOf("skipper@example.test") });

async function say(page: Page, fleet: Fleet, engineId: string, complaint: string, symptom: string) {
  await page.goto(`/diagnose?fleet=${fleet.id}&engine=${engineId}`);
  await page.getByText("alongside", { exact: true }).click();
  await page.getByLabel("In your own words").fill(complaint);
  await expect(page.getByRole("checkbox", { name: symptom }).or(page.getByRole("button", { name: symptom }))).toBeVisible();
  await page.getByRole("button", { name: /^Go on with (this one|these)/ }).click();
  await expect(page.getByRole("heading", { name: "Anything dangerous?" })).toBeVisible();
  await page.getByRole("button", { name: /^None of these/ }).click();
  await expect(page.locator("main h1").first()).not.toHaveText(/Anything dangerous|One moment/);
}

async function logIt(page: Page, hours: number) {
  await page.getByLabel("Engine hours now").fill(String(hours));
  await page.getByRole("button", { name: "Log it" }).click();
  await expect(page.getByRole("heading", { name: /it is logged$/ })).toBeVisible();
}

test("the demo skipper is one of those the start command names", () => {
  expect(demo().people.map((p) => p.email)).toContain("skipper@example.test");
});

test("lost top revs lead to the blocked filter, a proved cure, and the word that it came back", async ({ page }) => {
  const fleet = await Fleet.of(page.request);
  const engine = await fleet.engine("Marrowfat");
  const { document: tree } = await fleet.tree();
  const before = await fleet.log(engine.id);
  const timesBefore = before.filter((e) => e.cause?.key === "primary-filter-blocked").length;
  expect(timesBefore).toBeGreaterThan(1);

  await say(page, fleet, engine.id, "wont rev out, down on revs", "Will not reach full revs");
  const steps = await playAt(page, tree, "primary-filter-blocked");
  expect(steps.length).toBeLessThan(15);

  await expect(page.getByRole("region", { name: "Been here before" })).toContainText(`${timesBefore} times before`);
  await logIt(page, (engine.hours ?? 0) + 19);
  await expect(page.getByText("Cured, and proved")).toBeVisible();

  await expect(async () => {
    const [newest] = await fleet.log(engine.id);
    expect(newest).toMatchObject({ outcome: "cured", cause: { key: "primary-filter-blocked" }, timesHere: timesBefore + 1 });
  }).toPass();
  await page.goto(`/f/${fleet.id}/engines/${engine.id}`);
  await expect(page.getByText(`Primary filter blocked: ${timesBefore + 1} times`, { exact: false })).toBeVisible();
});

test("a cold start leads to a proved cure and stands in the log step by step", async ({ page }) => {
  const fleet = await Fleet.of(page.request);
  const engine = await fleet.engine("Tin Whistle", "starboard");
  const { document: tree } = await fleet.tree();

  await say(page, fleet, engine.id, "takes forever to start in the morning", "Slow to start from cold");
  await playAt(page, tree, "glow-plug-failed");
  await logIt(page, (engine.hours ?? 0) + 3);

  await expect(async () => {
    const [newest] = await fleet.log(engine.id);
    expect(newest).toMatchObject({ outcome: "cured", cause: { key: "glow-plug-failed" } });
  }).toPass();
  await page.getByRole("link", { name: "Step by step in the log" }).click();
  await expect(page.getByRole("heading", { name: "Slow to start from cold" })).toBeVisible();
  await expect(page.getByText("Asked, because", { exact: false }).first()).toBeVisible();
});

test("an answer is changed, taken back, and survives a reload", async ({ page }) => {
  const fleet = await Fleet.of(page.request);
  const engine = await fleet.engine("Tin Whistle", "starboard");
  await say(page, fleet, engine.id, "hard to start cold", "Slow to start from cold");
  const first = (await page.locator("main h1").first().innerText()).trim();
  await page.getByRole("button", { name: /^Can.t tell, or can.t get to it$/ }).click();
  await expect(page.locator("main h1").first()).not.toHaveText(first);
  await page.reload();
  await page.getByRole("link", { name: /1 answer given/ }).click();
  await expect(page.getByText(first)).toBeVisible();
});

test("what is said with no signal is kept on the phone and goes ashore when the signal returns", async ({ page, context }) => {
  const fleet = await Fleet.of(page.request);
  const engine = await fleet.engine("Tin Whistle", "starboard");
  await say(page, fleet, engine.id, "hard to start cold", "Slow to start from cold");
  const heading = page.locator("main h1").first();
  const first = (await heading.innerText()).trim();
  await context.setOffline(true);
  await page.getByRole("button", { name: /^Can.t tell, or can.t get to it$/ }).click();
  await expect(heading).not.toHaveText(first);
  await expect(page.getByText(/kept/i).first()).toBeVisible();
  const id = new URL(page.url()).searchParams.get("d")!;
  await context.setOffline(false);
  await expect(async () => {
    const { events } = await fleet.get<{ events: { kind: string }[] }>(`diagnoses/${id}/events`);
    expect(events.filter((e) => e.kind === "answered")).toHaveLength(1);
  }).toPass({ timeout: 30_000 });
});
