import { expect, test } from "@playwright/test";
import { stateOf } from "./support/demo";
import { Fleet } from "./support/fleet";

test.use({ storageState: stateOf("stranger@example.test") });

test("somebody of another fleet opens none of its pages, files or routes", async ({ page, playwright, baseURL }) => {
  const insider = await playwright.request.newContext({ baseURL: baseURL!, storageState: stateOf("owner@example.test") });
  const fleet = await Fleet.of(insider);
  const engine = await fleet.engine("Marrowfat");
  const diagnosis = (await fleet.log(engine.id)).find((e) => e.diagnosisId !== null)!;
  const tree = await fleet.tree();
  const home = `/f/${fleet.id}`;
  const pages = [
    home,
    `${home}/log`,
    `${home}/log/${diagnosis.diagnosisId}`,
    `${home}/engines/${engine.id}`,
    `${home}/engines/${engine.id}/edit`,
    `${home}/boats/${engine.boatId}`,
    `${home}/people`,
    `${home}/trees`,
    `${home}/trees/${tree.id}`,
  ];
  for (const path of pages) {
    for (const headers of [{}, { RSC: "1" }, { RSC: "1", "Next-Router-Prefetch": "1" }] as Record<string, string>[]) {
      const response = await page.request.get(path, { headers });
      const text = await response.text();
      expect(text, `${path} ${JSON.stringify(headers)}`).not.toContain("Marrowfat");
      expect(text).not.toContain("Primary filter blocked");
    }
    await page.goto(path);
    await expect(page.getByText("Marrowfat")).toHaveCount(0);
  }
  const api = `/api/v1/fleets/${fleet.id}`;
  const routes = [
    "boats",
    "engines",
    `engines/${engine.id}`,
    `engines/${engine.id}/log`,
    "log",
    "repeats",
    "phone",
    "people",
    `diagnoses/${diagnosis.diagnosisId}`,
    `diagnoses/${diagnosis.diagnosisId}/events`,
    `diagnoses/${diagnosis.diagnosisId}/story`,
    `trees/versions/${tree.id}`,
  ];
  for (const route of routes) expect((await page.request.get(`${api}/${route}`)).status(), route).toBe(404);

  // Its own fleet's address with the other's things is no way round either.
  const own = await Fleet.of(page.request);
  for (const route of [`engines/${engine.id}`, `diagnoses/${diagnosis.diagnosisId}`, `diagnoses/${diagnosis.diagnosisId}/events`])
    expect((await page.request.get(`/api/v1/fleets/${own.id}/${route}`)).status(), route).toBe(404);
});

test("signed out, pages lead to sign in and the API says so", async ({ playwright, baseURL }) => {
  const nobody = await playwright.request.newContext({ baseURL: baseURL!, storageState: { cookies: [], origins: [] } });
  const page = await nobody.get("/account", { maxRedirects: 0 });
  expect(page.status()).toBe(307);
  expect(page.headers().location).toContain("/sign-in?next=%2Faccount");
  const api = await nobody.get("/api/v1/me");
  expect(api.status()).toBe(401);
  expect(api.headers()["content-type"]).toContain("application/problem+json");
});
