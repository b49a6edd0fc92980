import { expect, type Page } from "@playwright/test";
import type { Check, FaultTree } from "../../../lib/core/tree/schema";
import { causeRow, probabilityOf } from "../../../lib/core/diagnosis/cause-row";
import { soundRow } from "../../../lib/core/diagnosis/sound-row";

/**
 * Someone at an engine that has this cause: answers each check with what such an engine most often shows, does each
 * repair that is asked for, and says truly whether it cured. Ends on the outcome form; returns the steps taken.
 */
export async function playAt(page: Page, tree: FaultTree, cause: string, mostSteps = 30): Promise<string[]> {
  const truth = tree.causes.find((c) => c.key === cause);
  if (!truth) throw new Error(`No such cause: ${cause}`);
  const taken: string[] = [];
  for (;;) {
    const heading = page.locator("main h1").first();
    await expect(heading).toBeVisible();
    const title = (await heading.innerText()).trim();
    if (title === "How did it end?") return taken;
    taken.push(title);
    if (taken.length > mostSteps) throw new Error(`No cure after ${mostSteps} steps: ${taken.join(" | ")}`);
    const check = tree.checks.find((c) => c.title === title);
    const remedy = tree.remedies.find((r) => r.title === title);
    if (check) await page.getByRole("button", { name: mostLikely(check, truth.gives[check.key]), exact: true }).click();
    else if (remedy && probabilityOf(truth.curedBy[remedy.key] ?? "never") > 0.5) {
      await page.getByRole("button", { name: "Cured", exact: true }).click();
      // A second tap within 400 ms is taken for the same one.
      await page.waitForTimeout(500);
      await page.getByRole("button", { name: "Done, and it held" }).click();
    } else if (remedy) await page.getByRole("button", { name: "No change", exact: true }).click();
    else throw new Error(`Stands at "${title}" after ${taken.join(" | ")}`);
    await expect(heading).not.toHaveText(title);
  }
}

function mostLikely(check: Check, links: Parameters<typeof causeRow>[1] | undefined): string {
  const sound = soundRow(check);
  const row = links === undefined ? sound : causeRow(check, links, sound);
  return check.findings[row.indexOf(Math.max(...row))]!.title;
}
