import { uuidv7 } from "uuidv7";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import type { Database } from "@/db/client";
import type { Publication } from "@/lib/core/contract/draft";
import { editBetween } from "@/lib/core/tree/edits/edit";
import { putNode } from "@/lib/core/tree/edits/put-node";
import { removeNode } from "@/lib/core/tree/edits/remove-node";
import type { FaultTree } from "@/lib/core/tree/schema";
import { prove, withScope, type FleetScope } from "@/lib/server/auth/scope";
import { beginDraft, changeDraft, discardDraft } from "@/lib/server/trees/draft/commands";
import { publishDraft } from "@/lib/server/trees/draft/publish";
import { findDraft, getDraft } from "@/lib/server/trees/draft/queries";
import { getCurrentTreeVersion, getTreeVersion, listTreeVersions } from "@/lib/server/trees/queries";
import { afloat, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";
import { addMember, addPerson } from "../support/people";
import { smallTree } from "../support/small-tree";

let owner: Database;
let shippedId: string;
let mats: Afloat;

beforeAll(async () => {
  ({ owner } = await testDatabase());
  shippedId = await shipTree(owner);
});
beforeEach(async () => {
  mats = await afloat("Mats");
});

const asMechanic = <T>(run: (scope: FleetScope<"tree:write">) => Promise<T>): Promise<T> =>
  withScope(mats.person, mats.fleetId, "tree:write", run);
const begin = (versionId = shippedId) => asMechanic((scope) => beginDraft(scope, { id: uuidv7(), versionId }));
const change = (version: number, to: (tree: FaultTree) => FaultTree, from: FaultTree = smallTree()) =>
  asMechanic(async (scope) => {
    const { id } = await getDraft(scope);
    return changeDraft(scope, { draft: id, ...editBetween(from, to(from), "Changed") }, version);
  });
const renamed = (title: string) => (tree: FaultTree) => putNode(tree, "causes", { ...tree.causes[0]!, title });
const publish = async (version: number, said: Partial<Publication> = {}) => {
  const { id } = await asMechanic(getDraft);
  const pass = await prove(mats.person, mats.fleetId, "tree:write");
  return publishDraft(pass, { draft: id, note: "Because", failing: [], accept: [], ...said }, version);
};

describe("a draft", () => {
  test("begins as the version it is begun from, once: who comes second joins it", async () => {
    const first = await begin();
    expect(first.document).toEqual(smallTree());
    expect(first).toMatchObject({ version: 1, begunFrom: shippedId, takenUp: shippedId, by: "Mats" });
    expect(await begin()).toEqual(first);
  });

  test("takes an edit, and only what the edit changes", async () => {
    await begin();
    const saved = await change(1, renamed("Another title"));
    expect(saved.version).toBe(2);
    expect(saved.document).toEqual(renamed("Another title")(smallTree()));
  });

  test("saved meanwhile by somebody else is shown as it is now, and nothing is written over", async () => {
    const anna = await addPerson({ name: "Anna" });
    await addMember(mats.fleetId, anna, ["mechanic"]);
    const { id } = await begin();
    await change(1, renamed("Mats' title"));
    const late = withScope(anna, mats.fleetId, "tree:write", (scope) =>
      changeDraft(scope, { draft: id, ...editBetween(smallTree(), renamed("Anna's title")(smallTree()), "Renamed") }, 1),
    );
    await expect(late).rejects.toMatchObject({ status: 412, extras: { current: { version: 2, by: "Mats" } } });
    expect((await asMechanic(getDraft)).document.causes[0]?.title).toBe("Mats' title");
  });

  test("refuses an edit that does not fit, and one that makes it no tree, each in words", async () => {
    await begin();
    await change(1, renamed("Another title"));
    await expect(change(2, renamed("A third"))).rejects.toMatchObject({ status: 409, detail: expect.stringContaining("changed since") });
    const spoilt = (tree: FaultTree) => putNode(tree, "symptoms", { ...tree.symptoms[0]!, phrases: [] });
    await expect(change(2, spoilt)).rejects.toMatchObject({
      status: 422,
      extras: { errors: [{ path: `symptom ${smallTree().symptoms[0]!.key}`, says: expect.stringContaining("phrases") }] },
    });
  });

  test("given up is gone, but not from under somebody who has just saved it", async () => {
    const { id } = await begin();
    await change(1, renamed("Another title"));
    await expect(asMechanic((scope) => discardDraft(scope, id, 1))).rejects.toMatchObject({ status: 412 });
    await asMechanic((scope) => discardDraft(scope, id, 2));
    expect(await asMechanic(findDraft)).toBeNull();
  });

  test("is not taken for the next one, which may have been saved as often", async () => {
    const { id } = await begin();
    await asMechanic((scope) => discardDraft(scope, id, 1));
    const next = await begin();
    const isOther = { status: 412, extras: { current: { id: next.id, version: 1 } } };
    const edit = { draft: id, ...editBetween(smallTree(), renamed("Late")(smallTree()), "Renamed") };
    await expect(asMechanic((scope) => changeDraft(scope, edit, 1))).rejects.toMatchObject(isOther);
    await expect(publish(1, { draft: id })).rejects.toMatchObject(isOther);
    await expect(asMechanic((scope) => discardDraft(scope, id, 1))).rejects.toMatchObject(isOther);
    expect(await asMechanic(getDraft)).toEqual(next);
  });

  test("of one fleet is nothing to another", async () => {
    await begin();
    const other = await afloat("Ines");
    expect(await withScope(other.person, other.fleetId, "tree:read", (scope) => findDraft(scope))).toBeNull();
  });
});

describe("publishing", () => {
  test("makes the draft the version that new diagnoses use, numbered, with note and differences, and never to be changed", async () => {
    await begin();
    await change(1, renamed("Another title"));
    const one = await publish(2, { note: "A better name" });
    expect(one).toMatchObject({ number: 1, from: "own" });
    expect(await asMechanic(getCurrentTreeVersion)).toMatchObject({ id: one.id });
    expect(await asMechanic((scope) => getTreeVersion(scope, one.id))).toMatchObject({
      note: "A better name",
      differences: [expect.stringContaining("Another title")],
    });
    const again = await begin(one.id);
    expect(again).toMatchObject({ version: 1, begunFrom: one.id, takenUp: shippedId });
    await change(1, renamed("A third title"), again.document);
    expect(await publish(2)).toMatchObject({ number: 2 });
    expect((await asMechanic(listTreeVersions)).filter(({ from }) => from === "own").map(({ number }) => number)).toEqual([2, 1]);
  });

  test("is refused while the tree is unsound, and says which node and why", async () => {
    await begin();
    const without = (tree: FaultTree): FaultTree => {
      const removed = removeNode(tree, "remedies", tree.remedies[0]!.key);
      if ("refused" in removed) throw new Error(removed.refused);
      return removed.tree;
    };
    await change(1, without);
    await expect(publish(2)).rejects.toMatchObject({
      status: 422,
      extras: { errors: expect.arrayContaining([expect.objectContaining({ path: expect.stringContaining("cause ") })]) },
    });
    expect(await asMechanic(findDraft)).toMatchObject({ version: 2 });
  });

  test("is refused while a known case is said to fail, unless it is accepted by name", async () => {
    await begin();
    await change(1, (tree) => ({ ...renamed("Another title")(tree), knownCases: [{ ...knownCase, causes: [tree.causes[0]!.key] }] }));
    const publishing = (accept: string[]) => publish(2, { note: "Seen", failing: ["not-so"], accept });
    await expect(publishing([])).rejects.toMatchObject({ status: 422, extras: { errors: [{ path: "known case not-so" }] } });
    expect(await publishing(["not-so"])).toMatchObject({ number: 1 });
  });

  test("is refused when nothing was changed, and when somebody saved in between", async () => {
    await begin();
    await expect(publish(1)).rejects.toMatchObject({ status: 422 });
    await change(1, renamed("Another title"));
    await expect(publish(1)).rejects.toMatchObject({ status: 412 });
  });
});

const knownCase: FaultTree["knownCases"][number] = {
  key: "not-so",
  title: "Told otherwise",
  features: {},
  figures: {},
  situation: "alongside",
  symptoms: [smallTree().symptoms[0]!.key],
  findings: [],
  causes: [],
  alsoAccept: [],
  source: "Logged diagnosis",
};
