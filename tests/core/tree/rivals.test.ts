import { describe, expect, test } from "vitest";
import { engineKinds } from "@/lib/core/tree/engine-kinds";
import { likelyRivals } from "@/lib/core/tree/rivals";
import { tellingApart } from "@/lib/core/tree/telling-apart";
import type { FaultTree } from "@/lib/core/tree/schema";
import { smallTree } from "../../support/small-tree";

/** The small tree, with a tank that acts by itself and not through the filter. */
function rivalTree(): FaultTree {
  const tree = smallTree();
  tree.causes[0]!.broughtOnBy = {};
  return tree;
}

const kindsOf = (tree: FaultTree) => engineKinds(tree.features).map(({ features }) => features);
const pairsOf = (tree: FaultTree) => [...new Set(likelyRivals(tree).map(({ a, b, symptom }) => `${symptom.key}: ${a.key}, ${b.key}`))];

describe("the common kinds of engine", () => {
  test("are the commonest in everything, and that one with one feature changed", () => {
    expect(kindsOf(smallTree())).toEqual([
      { injection: "in-line-pump", voltage: "v12" },
      { injection: "common-rail", voltage: "v12" },
      { injection: "in-line-pump", voltage: "v24" },
    ]);
  });

  test("leave out an option that fewer than 1 engine in 10 has", () => {
    const tree = smallTree();
    tree.features[0]!.options[0]!.share = 0.91;
    tree.features[0]!.options[1]!.share = 0.09;
    expect(kindsOf(tree)).toEqual([
      { injection: "in-line-pump", voltage: "v12" },
      { injection: "in-line-pump", voltage: "v24" },
    ]);
  });

  test("are one, where the tree has no features", () => {
    expect(kindsOf({ ...smallTree(), features: [] })).toEqual([{}]);
  });
});

describe("likely rivals", () => {
  test("share a symptom", () => {
    expect(pairsOf(rivalTree())).toEqual(["lost-rpm: filter-blocked, tank-dirty"]);
  });

  test("both hold at least 2 % after it", () => {
    const tree = rivalTree();
    // 8 : 0.33 x base: at 0.5 it holds 2.02 %, at 0.49 it holds 1.98 %.
    tree.causes[1]!.base = 0.5;
    expect(pairsOf(tree)).toHaveLength(1);
    tree.causes[1]!.base = 0.49;
    expect(pairsOf(tree)).toEqual([]);
  });

  test("can be found on one engine", () => {
    const tree = rivalTree();
    tree.causes[0]!.appliesTo = { features: { injection: ["common-rail"] } };
    expect(likelyRivals(tree).map(({ kind }) => kind.differsBy)).toEqual([{ feature: "injection", option: "common-rail" }]);
    tree.causes[1]!.appliesTo = { features: { injection: ["in-line-pump"] } };
    expect(pairsOf(tree)).toEqual([]);
  });

  test("are no root and the nearer cause through which alone it acts", () => {
    expect(pairsOf(smallTree())).toEqual([]);
  });
});

test("a finding tells one cause from another at 4 times as often, not under", () => {
  const tells = (share: number) => {
    const tree = rivalTree();
    tree.causes[0]!.gives = {};
    tree.causes[1]!.gives = { "bowl-look": { slime: share } };
    tree.checks[1]!.findings[1]!.sound = 0.1;
    return tellingApart(tree)(tree.causes[1]!, tree.causes[0]!, likelyRivals(rivalTree())[0]!);
  };
  expect(tells(0.41)).toBe(true);
  expect(tells(0.39)).toBe(false);
});
