import { expect, test, type Page } from "@playwright/test";
import { stateOf } from "./support/demo";
import { Fleet } from "./support/fleet";

test.use({ storageState: stateOf("skipper@example.test") });

const question = (page: Page) => page.locator("main h1").first();
const DRAINED = "It turns two full turns by hand, and the muffler is drained";

async function slowStart(page: Page) {
  const fleet = await Fleet.of(page.request);
  const engine = await fleet.engine("Tin Whistle", "starboard");
  await page.goto(`/diagnose?fleet=${fleet.id}&engine=${engine.id}`);
  await page.getByText("at anchor", { exact: true }).click();
  await page.getByLabel("In your own words").fill("takes forever to start in the morning");
  await page.getByRole("button", { name: /^Go on with (this one|these)/ }).click();
  await expect(page.getByRole("heading", { name: "Anything dangerous?" })).toBeVisible();
}

async function noneOfThese(page: Page) {
  await page.getByRole("button", { name: /^None of/ }).click();
  await expect(question(page)).not.toHaveText(/Anything dangerous|One moment/);
}

test("a stop rule outlives a reload, stays on the screens between steps, and lifting it by a slip can be undone", async ({ page }) => {
  await slowStart(page);
  const fire = page.getByRole("group", { name: /fire, smoke/ });
  await fire.getByRole("button", { name: "Yes" }).click();
  await fire.getByRole("button", { name: "No" }).click();
  await page
    .getByRole("group", { name: /stop dead/ })
    .getByRole("button", { name: "Yes" })
    .click();
  await page.reload();
  await expect(page.getByText("It may have water in a cylinder")).toBeVisible();
  await noneOfThese(page);

  const inForce = page.getByRole("region", { name: "In force" });
  await expect(inForce.getByText("Fire, or a mist of fuel")).toBeHidden();
  await page.getByRole("button", { name: DRAINED }).click();
  await expect(inForce).toBeHidden();
  await page.getByRole("button", { name: "Undo" }).click();
  await expect(inForce).toBeVisible();
  await page.getByRole("link", { name: /answers? given/ }).click();
  await expect(page.getByRole("heading", { name: "Answers given" })).toBeVisible();
  await expect(inForce).toBeVisible();
});

test("a finger that bounces answers one question, and a note half written outlives a reload", async ({ page }) => {
  await slowStart(page);
  await noneOfThese(page);
  const title = await question(page).innerText();
  await page.getByText("Add a note or a photo").click();
  await page.getByLabel("Note").fill("half a no");
  await page.reload();
  await expect(question(page)).toHaveText(title);
  await page.getByText("Add a note or a photo").click();
  await expect(page.getByLabel("Note")).toHaveValue("half a no");

  const answer = page.getByRole("button", { name: /^Can.t tell/ });
  await answer.scrollIntoViewIfNeeded();
  const at = (await answer.boundingBox())!;
  await page.mouse.click(at.x + 40, at.y + 20);
  await page.waitForTimeout(150);
  await page.mouse.click(at.x + 40, at.y + 20);
  await expect(question(page)).not.toHaveText(title);
  await expect(page.getByRole("link", { name: "1 answer given" })).toBeVisible();
});

test("a burst of cranking is counted though the page was gone meanwhile, and under way the boat comes first again", async ({ page }) => {
  await slowStart(page);
  await noneOfThese(page);
  const crankOutOfTurn = async () => {
    await page.getByRole("button", { name: "Say something else" }).click();
    await page.getByText("It is being cranked").click();
  };
  const dialog = page.getByRole("dialog");
  await crankOutOfTurn();
  await dialog.getByRole("button", { name: "Cranking now" }).click();
  await page.reload();
  await crankOutOfTurn();
  await dialog.getByRole("button", { name: "Stopped" }).click();
  await expect(dialog.getByText(/^Cranked [1-9]\d* s of 30 s since it last ran$/)).toBeVisible();
  await dialog.getByText("under way", { exact: true }).click();
  await expect(dialog.getByText("The boat first, then the engine")).toBeVisible();
  await dialog.getByRole("button", { name: "The boat is safe for now" }).click();
  await expect(dialog).toBeHidden();
});

test("the phone's own back leads to the answer given last, and a change of it leads on to the step", async ({ page }) => {
  await slowStart(page);
  await noneOfThese(page);
  const first = await question(page).innerText();
  await page.getByRole("button", { name: /^Can.t tell/ }).click();
  await expect(question(page)).not.toHaveText(first);
  await page.goBack();
  await expect(question(page)).toHaveText(first);
  await expect(page.getByText("Said before: Can\u2019t tell")).toBeVisible();
  await page.getByRole("group").getByRole("button").first().click();
  await expect(question(page)).not.toHaveText(first);
  await page.getByRole("link", { name: "1 answer given" }).click();
  await expect(page.getByText("Can\u2019t tell, or can\u2019t get to it")).toBeHidden();
});

test("all dangers are answered with one button that says how many, and each can be looked at and changed after", async ({ page }) => {
  await slowStart(page);
  const asked = await page.getByRole("button", { name: "No", exact: true }).count();
  await page
    .getByRole("group", { name: /fire, smoke/ })
    .getByRole("button", { name: "No" })
    .click();
  await page.getByRole("button", { name: /^None of the other (two|three|four|five|six|seven|eight|nine|ten|eleven): go on$/ }).click();
  await page.getByRole("button", { name: "Look at them" }).click();
  await expect(page.getByRole("heading", { name: "Anything dangerous?" })).toBeVisible();
  await expect(page.locator("main").getByRole("button", { name: "No", exact: true, pressed: true })).toHaveCount(asked);
  await page
    .getByRole("group", { name: /fire, smoke/ })
    .getByRole("button", { name: "Yes" })
    .click();
  await expect(page.getByText("Fire, or a mist of fuel").first()).toBeVisible();
});

test("a figure half typed outlives a reload", async ({ page }) => {
  const fleet = await Fleet.of(page.request);
  await slowStart(page);
  await noneOfThese(page);
  const { document: tree } = await fleet.tree();
  const check = tree.checks.find(({ key }) => key === "cranking-volts") ?? tree.checks.find(({ reading }) => reading)!;
  const d = new URL(page.url()).searchParams.get("d");
  await page.goto(`/diagnose?d=${d}&at=looked&which=${check.key}`);
  await page.getByLabel("Reading", { exact: true }).fill("9,");
  await page.reload();
  await expect(page.getByLabel("Reading", { exact: true })).toHaveValue("9,");
});

test("an outcome that lacks something brings the field that lacks it to the eye", async ({ page }) => {
  await slowStart(page);
  await noneOfThese(page);
  const d = new URL(page.url()).searchParams.get("d");
  await page.goto(`/diagnose?d=${d}&at=outcome`);
  await page.getByRole("radio", { name: /^Cured/ }).check();
  await page.getByRole("button", { name: "Log it" }).click();
  await expect(page.getByRole("textbox", { name: "What was it?" })).toBeFocused();
  await expect(page.getByRole("textbox", { name: "What was it?" })).toBeInViewport();
});
