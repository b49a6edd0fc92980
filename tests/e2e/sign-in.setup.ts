import { expect, test as setup } from "@playwright/test";
import { demo, stateOf } from "./support/demo";

// Signs in each demo person once, through the form; the tests start with the cookie.
for (const place of [0, 1, 2, 3]) {
  setup(`demo person ${place + 1} signs in with e-mail and password`, async ({ page }) => {
    const { people, password } = demo();
    const person = people[place]!;
    await page.goto("/sign-in");
    await page.getByLabel("E-mail").first().fill(person.email);
    await page.getByLabel("Password", { exact: true }).fill(password);
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    await expect(page).toHaveURL(/\/f\/[0-9a-f-]+$/);
    await page.context().storageState({ path: stateOf(person.email) });
  });
}
