import { cp, mkdtemp, readFile, writeFile } from "node:fs/promises";
import os from "node:os";
import path from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import type { Database } from "@/db/client";
import { shippedTreeVersions } from "@/db/schema/trees";
import { withScope } from "@/lib/server/auth/scope";
import { loadShippedTree, SHIPPED_TREE_FOLDER } from "@/lib/server/trees/load-shipped-tree";
import { getCurrentTreeVersion, getTreeVersion, listTreeVersions } from "@/lib/server/trees/queries";
import { contentHash } from "@/lib/server/trees/content-hash";
import { afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

let owner: Database;
let ownerUrl: string;
beforeAll(async () => {
  ({ owner, ownerUrl } = await testDatabase());
});

/** A copy of the shipped tree, to change. */
async function copied(): Promise<string> {
  const folder = await mkdtemp(path.join(os.tmpdir(), "gudgeon-tree-"));
  await cp(SHIPPED_TREE_FOLDER, folder, { recursive: true });
  return folder;
}
const change = async (folder: string, from: RegExp, to: string) => {
  const file = path.join(folder, "tree.yaml");
  const before = await readFile(file, "utf8");
  expect(before).toMatch(from);
  await writeFile(file, before.replace(from, to));
};

describe("loading the shipped tree", { timeout: 60_000 }, () => {
  test("makes a version once, in two starts at once as well", async () => {
    const [a, b] = await Promise.all([loadShippedTree(ownerUrl), loadShippedTree(ownerUrl)]);
    expect([a.number, b.number, a.id === b.id]).toEqual([1, 1, true]);
    expect(await loadShippedTree(ownerUrl)).toEqual({ ...a, isNew: false });
    expect(await owner.select().from(shippedTreeVersions)).toHaveLength(1);
  });

  test("numbers what changed, and goes back to old words under a new number", async () => {
    const folder = await copied();
    await change(folder, /^title: .*$/m, "title: Another title");
    const second = await loadShippedTree(ownerUrl, folder);
    expect(second).toMatchObject({ number: 2, isNew: true });
    const third = await loadShippedTree(ownerUrl);
    expect(third).toMatchObject({ number: 3, isNew: true });

    const ines = await afloat("Ines");
    const read = <T>(run: Parameters<typeof withScope<"tree:read", T>>[3]) => withScope(ines.person, ines.fleetId, "tree:read", run);
    expect((await read(listTreeVersions)).map((version) => [version.number, version.from])).toEqual([
      [3, "shipped"],
      [2, "shipped"],
      [1, "shipped"],
    ]);
    expect(await read(getCurrentTreeVersion)).toMatchObject({ id: third.id });
    const old = await read((scope) => getTreeVersion(scope, second.id));
    expect(old.document.title).toBe("Another title");
    expect(contentHash(old.document)).toBe(old.hash);
  });

  test("refuses a tree that is not sound, naming what is wrong, and keeps what is there", async () => {
    const folder = await copied();
    await change(folder, /^format: 1$/m, "format: 7");
    await expect(loadShippedTree(ownerUrl, folder)).rejects.toThrow(/not sound/);
    await writeFile(path.join(folder, "broken.yaml"), "checks: [");
    await expect(loadShippedTree(ownerUrl, folder)).rejects.toThrow(/broken\.yaml:1/);
    expect(await owner.select().from(shippedTreeVersions)).toHaveLength(3);
  });
});
