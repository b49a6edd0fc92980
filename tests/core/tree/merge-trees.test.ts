import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mergeTrees, settle } from "@/lib/core/tree/merge-trees";
import type { FaultTree } from "@/lib/core/tree/schema";
import { sameValue } from "@/lib/core/tree/same-value";
import { smallTree } from "../../support/small-tree";

const base = smallTree();
const firstCause = base.causes[0]!;

function withCause(tree: FaultTree, key: string, change: Partial<FaultTree["causes"][number]>): FaultTree {
  return { ...tree, causes: tree.causes.map((cause) => (cause.key === key ? { ...cause, ...change } : cause)) };
}

describe("joining two people's changes", () => {
  it("takes both where they changed different fields of one node", () => {
    const mine = withCause(base, firstCause.key, { title: "Another title" });
    const theirs = withCause(base, firstCause.key, { base: "rare" });
    const { tree, collisions } = mergeTrees(base, mine, theirs);
    expect(collisions).toEqual([]);
    expect(tree.causes[0]).toMatchObject({ title: "Another title", base: "rare" });
  });

  it("takes both strengths where they linked one cause to two symptoms", () => {
    const mine = withCause(base, firstCause.key, { shows: { ...firstCause.shows, "no-crank": "seldom" } });
    const theirs = withCause(base, firstCause.key, { shows: { ...firstCause.shows, "lost-rpm": "always" } });
    expect(mergeTrees(base, mine, theirs).tree.causes[0]?.shows).toEqual({
      ...firstCause.shows,
      "no-crank": "seldom",
      "lost-rpm": "always",
    });
  });

  it("lists what both changed differently, keeps theirs, and takes the choice", () => {
    const mine = withCause(base, firstCause.key, { title: "Mine" });
    const theirs = withCause(base, firstCause.key, { title: "Theirs" });
    const { tree, collisions } = mergeTrees(base, mine, theirs);
    expect(collisions).toMatchObject([
      { node: { kind: "cause", key: firstCause.key }, field: ["title"], base: firstCause.title, mine: "Mine", theirs: "Theirs" },
    ]);
    expect(tree.causes[0]?.title).toBe("Theirs");
    expect(settle(tree, collisions[0]!, "Mine").causes[0]?.title).toBe("Mine");
  });

  it("keeps the changed node where the other side took it out, and asks", () => {
    const mine = withCause(base, firstCause.key, { title: "Mine" });
    const theirs = { ...base, causes: base.causes.filter(({ key }) => key !== firstCause.key) };
    for (const [left, right] of [
      [mine, theirs],
      [theirs, mine],
    ] as const) {
      const { tree, collisions } = mergeTrees(base, left, right);
      expect(collisions).toHaveLength(1);
      expect(collisions[0]?.field).toEqual([]);
      expect(tree.causes.find(({ key }) => key === firstCause.key)?.title).toBe("Mine");
      expect(settle(tree, collisions[0]!, undefined).causes.map(({ key }) => key)).not.toContain(firstCause.key);
    }
  });

  it("keeps nodes that both added, each behind the neighbour it was put behind", () => {
    const added = (key: string): FaultTree => ({ ...base, causes: [firstCause, { ...firstCause, key }, ...base.causes.slice(1)] });
    const { tree, collisions } = mergeTrees(base, added("mine-new"), added("theirs-new"));
    expect(collisions).toEqual([]);
    expect(
      tree.causes
        .map(({ key }) => key)
        .slice(0, 3)
        .sort(),
    ).toEqual([firstCause.key, "mine-new", "theirs-new"].sort());
    expect(tree.causes).toHaveLength(base.causes.length + 2);
  });

  it("keeps the order that one side gave its list", () => {
    const turned = { ...base, checks: [...base.checks].reverse() };
    expect(mergeTrees(base, turned, base).tree.checks).toEqual(turned.checks);
    expect(mergeTrees(base, base, turned).tree.checks).toEqual(turned.checks);
  });

  it("is the one side where the other changed nothing, and either where both did the same, whatever was changed", () => {
    const words = ["hardly ever", "seldom", "sometimes", "often", "usually"] as const;
    const someTree = fc
      .array(
        fc.record({
          cause: fc.nat(base.causes.length - 1),
          symptom: fc.constantFrom("lost-rpm", "no-crank"),
          word: fc.constantFrom(...words),
          drop: fc.boolean(),
        }),
        { maxLength: 4 },
      )
      .map((steps) =>
        steps.reduce((tree, { cause, symptom, word, drop }) => {
          const key = base.causes[cause]!.key;
          const now = tree.causes.find((one) => one.key === key);
          if (drop) return { ...tree, causes: tree.causes.filter((one) => one.key !== key) };
          return now ? withCause(tree, key, { shows: { ...now.shows, [symptom]: word } }) : tree;
        }, base),
      );
    fc.assert(
      fc.property(someTree, someTree, (mine, theirs) => {
        expect(sameValue(mergeTrees(base, mine, base).tree, mine)).toBe(true);
        expect(sameValue(mergeTrees(base, base, theirs).tree, theirs)).toBe(true);
        expect(mergeTrees(base, mine, mine)).toEqual({ tree: mine, collisions: [] });
        const [there, back] = [mergeTrees(base, mine, theirs), mergeTrees(base, theirs, mine)];
        expect(there.collisions.length).toBe(back.collisions.length);
        if (there.collisions.length === 0)
          expect(new Set(there.tree.causes.map(({ key }) => key))).toEqual(new Set(back.tree.causes.map(({ key }) => key)));
      }),
    );
  });
});
