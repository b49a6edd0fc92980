import { expect, test } from "vitest";
import { compareTrees } from "@/lib/core/tree/differences";
import type { FaultTree } from "@/lib/core/tree/schema";
import { smallTree } from "../../support/small-tree";

function says(change: (tree: FaultTree) => void): string[] {
  const after = smallTree();
  change(after);
  return compareTrees(smallTree(), after).map((difference) => difference.says);
}

test("a tree does not differ from itself, in whatever order it is written", () => {
  expect(says(() => {})).toEqual([]);
  expect(says((t) => void t.causes.reverse())).toEqual([]);
});

test("a changed strength reads as words", () => {
  expect(says((t) => (t.causes[0]!.shows["lost-rpm"] = "often"))).toEqual([
    "Primary filter blocked: shows Will not reach full revs, 'usually' became 'often'.",
  ]);
});

test("a changed link names check and finding by what people call them", () => {
  expect(says((t) => (t.causes[1]!.gives["bowl-look"] = { slime: "x20" }))).toEqual([
    "Dirt in the tank: gives Look into the bowl slime, 'usually' became 'x20'.",
  ]);
});

test("a new link and a dropped one", () => {
  expect(says((t) => (t.causes[2]!.curedBy["clean-tank"] = "never"))).toEqual([
    "Start battery flat: cured by Clean the tank, new: 'never'.",
  ]);
  expect(says((t) => (t.causes[0]!.broughtOnBy = {}))).toEqual([
    "Primary filter blocked: brought on by Dirt in the tank, 'often' taken out.",
  ]);
});

test("a changed finding is named by its title", () => {
  expect(says((t) => (t.checks[0]!.findings[2]!.sound = 0.2))).toEqual([
    "Read the filter's vacuum: findings High on a sound engine, 0.12 became 0.2.",
  ]);
});

test("new nodes, and nodes taken out", () => {
  const changes = (t: FaultTree) => {
    t.remedies.push({ ...t.remedies[0]!, key: "wash-filter", title: "Wash the filter" });
    t.symptoms.pop();
  };
  expect(says(changes)).toEqual(["Does not crank: symptom taken out.", "Wash the filter: new remedy."]);
});

test("findings put in another order are said, for people see them in order", () => {
  expect(says((t) => void t.checks[1]!.findings.reverse())).toEqual(["Look into the bowl: findings, put in another order."]);
});

test("pairs that no check tells apart are named by their causes, in either order", () => {
  const listed = (because: string, turned = false): FaultTree => ({
    ...smallTree(),
    inseparable: [{ causes: turned ? ["tank-dirty", "filter-blocked"] : ["filter-blocked", "tank-dirty"], because }],
  });
  const between = (before: FaultTree, after: FaultTree) => compareTrees(before, after).map((difference) => difference.says);
  expect(between(smallTree(), listed("Same dirt."))).toEqual(["not told apart: Primary filter blocked and Dirt in the tank: listed."]);
  expect(between(listed("Same dirt."), listed("Same cure.", true))).toEqual([
    "not told apart: Primary filter blocked and Dirt in the tank: the reason, 'Same dirt.' became 'Same cure.'.",
  ]);
  expect(between(listed("Same dirt."), listed("Same dirt.", true))).toEqual([]);
  expect(between(listed("Same dirt."), smallTree())).toEqual([
    "not told apart: Primary filter blocked and Dirt in the tank: taken out of the list.",
  ]);
});

test("steps are compared as a whole, and long texts are cut", () => {
  const [said] = says((t) => (t.checks[1]!.steps = ["Look ".repeat(40)]));
  expect(said).toMatch(/^Look into the bowl: steps, 'Look with a torch\.' became 'Look .*\.\.\.'\.$/);
});
