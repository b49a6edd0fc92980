import { describe, expect, test } from "vitest";
import { parseTree } from "@/lib/core/tree/parse-tree";
import { smallDocument } from "../../support/small-tree";

type Loose = Record<string, never> & { [key: string]: Loose[] & Loose };

/** The flaws of the small document after one change; none where it reads as a tree. */
function flawsAfter(change: (document: Loose) => unknown) {
  const document = smallDocument() as unknown as Loose;
  change(document);
  const parsed = parseTree(document);
  return "flaws" in parsed ? parsed.flaws : [];
}

test("a document of the right shape reads as a tree, with its defaults filled in", () => {
  const parsed = parseTree(smallDocument());
  expect("tree" in parsed && parsed.tree.checks[1]).toMatchObject({ key: "bowl-look", mess: "none", tools: [], flags: {} });
});

const set = (list: string, index: number, fields: object) => (document: Loose) => Object.assign(document[list]![index]!, fields);

const faults: {
  fault: string;
  change: (document: Loose) => unknown;
  node: string;
  path: (string | number)[];
  says: RegExp;
  mend: RegExp;
}[] = [
  {
    fault: "a field nobody knows",
    change: set("causes", 0, { curedby: {} }),
    node: "cause filter-blocked",
    path: ["causes", 0, "curedby"],
    says: /"curedby" is not something/,
    mend: /Did you mean "curedBy"/,
  },
  {
    fault: "a field missing",
    change: (d) => delete (d.causes![1] as { is?: string }).is,
    node: "cause tank-dirty",
    path: ["causes", 1, "is"],
    says: /"is" is missing/,
    mend: /Add "is" \(text\)/,
  },
  {
    fault: "a number for a text",
    change: set("symptoms", 0, { title: 12 }),
    node: "symptom lost-rpm",
    path: ["symptoms", 0, "title"],
    says: /"title" is 12; it has to be text/,
    mend: /quotes/,
  },
  {
    fault: "a text for a number",
    change: set("checks", 0, { minutes: "five" }),
    node: "check filter-vacuum",
    path: ["checks", 0, "minutes"],
    says: /"minutes" is "five"; it has to be a number/,
    mend: /Write a number/,
  },
  {
    fault: "a map for a list",
    change: set("checks", 0, { steps: { 1: "Look" } }),
    node: "check filter-vacuum",
    path: ["checks", 0, "steps"],
    says: /"steps" is a map; it has to be a list/,
    mend: /Write a list/,
  },
  {
    fault: "a word that is no choice",
    change: set("checks", 0, { engine: "idleing" }),
    node: "check filter-vacuum",
    path: ["checks", 0, "engine"],
    says: /"engine" is "idleing"; it has to be one of "any"/,
    mend: /Did you mean "idling"/,
  },
  {
    fault: "a strength that is no word of the scale",
    change: set("causes", 0, { shows: { "lost-rpm": "usualy" } }),
    node: "cause filter-blocked",
    path: ["causes", 0, "shows", "lost-rpm"],
    says: /"shows > lost-rpm" is "usualy"/,
    mend: /Did you mean "usually"/,
  },
  {
    fault: "a probability over 1",
    change: set("causes", 0, { curedBy: { "change-filter": 1.2 } }),
    node: "cause filter-blocked",
    path: ["causes", 0, "curedBy", "change-filter"],
    says: /is 1\.2; it has to be less than 1/,
    mend: /in that range/,
  },
  {
    fault: "a key in capitals",
    change: set("remedies", 0, { key: "Change Filter" }),
    node: "remedy Change Filter",
    path: ["remedies", 0, "key"],
    says: /lower-case words joined by hyphens/,
    mend: /that form/,
  },
  {
    fault: "a check with one finding",
    change: set("checks", 1, { findings: [{ key: "bright", title: "Bright", usual: true }] }),
    node: "check bowl-look",
    path: ["checks", 1, "findings"],
    says: /too short a list: 2 at least/,
    mend: /Add/,
  },
  {
    fault: "an empty title",
    change: set("checks", 1, { title: "  " }),
    node: "check bowl-look",
    path: ["checks", 1, "title"],
    says: /"title" is empty/,
    mend: /Add/,
  },
  {
    fault: "more minutes than a step may take",
    change: set("checks", 1, { minutes: 6000 }),
    node: "check bowl-look",
    path: ["checks", 1, "minutes"],
    says: /6000; it has to be 600 or less/,
    mend: /in that range/,
  },
  {
    fault: "a finding inside a check",
    change: (d) => Object.assign((d.checks![1]! as unknown as { findings: object[] }).findings[1]!, { usual: false }),
    node: "check bowl-look",
    path: ["checks", 1, "findings", 1, "usual"],
    says: /"findings 2 > usual" is false/,
    mend: /"true"/,
  },
  {
    fault: "a list that is no list of nodes",
    change: (d) => Object.assign(d, { causes: "none" }),
    node: "tree small",
    path: ["causes"],
    says: /"causes" is "none"; it has to be a list/,
    mend: /Write a list/,
  },
];

describe("a fault of shape names the node, the place and the mend", () => {
  test.each(faults)("$fault", ({ change, node, path, says, mend }) => {
    const flaws = flawsAfter(change);
    expect(flaws).toHaveLength(1);
    const [flaw] = flaws;
    expect(`${flaw?.node.kind} ${flaw?.node.key}`).toBe(node);
    expect(flaw?.path).toEqual(path);
    expect(flaw?.says).toMatch(says);
    expect(flaw?.mend).toMatch(mend);
    expect(flaw?.severity).toBe("error");
  });
});

test.each([null, undefined, 7, "tree", [], {}])("%j is no tree, and is told so without a crash", (input) => {
  const parsed = parseTree(input);
  expect("flaws" in parsed && parsed.flaws.length).toBeGreaterThan(0);
});
