import { describe, expect, it } from "vitest";
import { applyEdit } from "@/lib/core/tree/edits/apply-edit";
import { editBetween, undoOf } from "@/lib/core/tree/edits/edit";
import { copyNodes, pasteNodes } from "@/lib/core/tree/edits/paste-nodes";
import { duplicateNode, newKey, putNode } from "@/lib/core/tree/edits/put-node";
import { removeNode } from "@/lib/core/tree/edits/remove-node";
import { linkStrength, setLink } from "@/lib/core/tree/edits/set-link";
import { referencesOf } from "@/lib/core/tree/references";
import type { FaultTree } from "@/lib/core/tree/schema";
import { FaultTree as FaultTreeShape } from "@/lib/core/tree/schema";
import { findFlaws } from "@/lib/core/tree/soundness";
import { smallTree } from "../../support/small-tree";

const tree = smallTree();
const cause = tree.causes[0]!;
const check = tree.checks[0]!;

const made = (before: FaultTree, after: FaultTree): FaultTree => {
  const applied = applyEdit(before, editBetween(before, after, "test"));
  if ("refused" in applied) throw new Error(applied.refused);
  return applied.tree;
};
const dangling = (of: FaultTree): string[] => findFlaws(of).flatMap(({ rule, says }) => (rule === "unknown-key" ? [says] : []));

describe("an edit", () => {
  it("leads from one tree to the other, and its undo back, a removed node to its old place", () => {
    const removed = removeNode(tree, "checks", check.key);
    if ("refused" in removed) throw new Error(removed.refused);
    const edit = editBetween(tree, removed.tree, "Taken out");
    expect(applyEdit(tree, edit)).toEqual({ tree: removed.tree });
    expect(applyEdit(removed.tree, undoOf(edit))).toEqual({ tree });
  });

  it("is undone without touching what somebody else changed in the same node since", () => {
    const edit = editBetween(tree, putNode(tree, "causes", { ...cause, title: "Mine" }), "Renamed");
    const since = putNode(tree, "causes", { ...cause, title: "Mine", base: "rare" });
    expect(applyEdit(since, undoOf(edit))).toEqual({ tree: putNode(tree, "causes", { ...cause, base: "rare" }) });
  });

  it("is refused in words where the same field has been changed since, and then changes nothing", () => {
    const edit = editBetween(tree, putNode(tree, "causes", { ...cause, title: "Mine" }), "Renamed");
    const since = putNode(tree, "causes", { ...cause, title: "Theirs" });
    expect(applyEdit(since, undoOf(edit))).toEqual({ refused: expect.stringContaining("title is not what it was") });
  });

  it("is refused where the node has gone", () => {
    const edit = editBetween(tree, putNode(tree, "causes", { ...cause, title: "Mine" }), "Renamed");
    const gone = { ...tree, causes: tree.causes.filter(({ key }) => key !== cause.key) };
    expect(applyEdit(gone, edit)).toEqual({ refused: expect.stringContaining("no longer there") });
  });

  it("may change the tree's own title", () => {
    expect(made(tree, { ...tree, title: "Another tree" }).title).toBe("Another tree");
  });
});

describe("a link", () => {
  it("is set, read and taken out, and an emptied row goes with its last link", () => {
    const link = { gives: check.key, finding: check.findings[0]!.key };
    const bare = { ...tree, causes: tree.causes.map((one) => (one.key === cause.key ? { ...one, gives: {} } : one)) };
    const linked = setLink(bare, cause.key, link, "x20");
    expect(linkStrength(linked.causes[0]!, link)).toBe("x20");
    expect(setLink(linked, cause.key, link, null)).toEqual(bare);
  });

  it.each([{ shows: tree.symptoms[1]!.key }, { curedBy: tree.remedies[0]!.key }, { broughtOnBy: "somewhere" }])(
    "of every kind can be set: %o",
    (link) => {
      expect(linkStrength(setLink(tree, cause.key, link, "often").causes[0]!, link)).toBe("often");
    },
  );
});

describe("taking out a node", () => {
  it.each(["symptoms", "checks", "causes", "remedies"] as const)("takes out every link to it: %s", (list) => {
    for (const { key } of tree[list]) {
      const removed = removeNode(tree, list, key);
      if ("refused" in removed) throw new Error(removed.refused);
      const kinds = { symptoms: "symptom", checks: "check", causes: "cause", remedies: "remedy" };
      expect(referencesOf(removed.tree).filter((reference) => reference.to === kinds[list] && reference.key === key)).toEqual([]);
      expect(removed.tree[list].map((node) => node.key)).not.toContain(key);
    }
  });

  it("takes the cause off the upkeep that guards it, and upkeep that guards nothing else with it", () => {
    const upkeep = { everyHours: 200, guards: ["filter-blocked"], sources: ["judgement"] };
    const kept = { ...tree, remedies: tree.remedies.map((one) => (one.key === "change-filter" ? { ...one, upkeep } : one)) };
    const removed = removeNode(kept, "causes", "filter-blocked");
    if ("refused" in removed) throw new Error(removed.refused);
    expect(removed.tree.remedies.every((one) => one.upkeep === undefined)).toBe(true);
  });

  it("is refused for a system in use, and says who uses it", () => {
    expect(removeNode(tree, "systems", "fuel")).toEqual({ refused: expect.stringContaining("symptom") });
  });
});

describe("copies", () => {
  it("get keys made from their titles that nobody has", () => {
    expect(newKey(tree, "Ölfilter’s “new” seal")).toBe("olfilters-new-seal");
    expect(newKey(tree, check.title, new Set([newKey(tree, check.title, new Set())]))).toMatch(/-2$/);
    expect(newKey(tree, "???")).toBe("new");
  });

  it("of one node keep its own links and leave the original alone", () => {
    const copy = duplicateNode(tree, "causes", cause.key)!;
    expect(copy.tree.causes.find(({ key }) => key === copy.key)).toEqual({ ...cause, key: copy.key, title: `${cause.title} (copy)` });
    expect(copy.tree.causes[0]).toEqual(cause);
  });

  it("of several are linked among themselves, the rest to what this tree has, and nothing leads nowhere", () => {
    const keys = new Set([cause.key, ...Object.keys(cause.gives), ...Object.keys(cause.curedBy)]);
    const pasted = pasteNodes(tree, copyNodes(tree, keys));
    const copy = pasted.tree.causes.at(-1)!;
    for (const key of [...Object.keys(copy.gives), ...Object.keys(copy.curedBy)]) expect(pasted.keys).toContain(key);
    expect(Object.keys(copy.shows)).toEqual(Object.keys(cause.shows));
    expect(FaultTreeShape.safeParse(pasted.tree).success).toBe(true);
    expect(dangling(pasted.tree)).toEqual([]);
    expect(dangling(setLink(tree, cause.key, { shows: "nowhere" }, "often"))).toHaveLength(1);
    const strange = pasteNodes({ ...tree, remedies: [], checks: [] }, { ...copyNodes(tree, keys), checks: [], remedies: [] });
    expect(strange.tree.causes.at(-1)).toMatchObject({ gives: {}, curedBy: {} });
  });
});
