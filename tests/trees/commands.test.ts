import { mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { stringify } from "yaml";
import { barred } from "@/scripts/tree/bars";
import { check } from "@/scripts/tree/check";
import { prove } from "@/scripts/tree/prove";
import { readCases } from "@/scripts/tree/read-cases";
import { Refusal } from "@/scripts/tree/read-tree";
import { show } from "@/scripts/tree/show";
import { smallDocument, smallTree } from "../support/small-tree";

let folder: string;
let said: string[];

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), "tree-"));
  said = [];
  vi.spyOn(console, "log").mockImplementation((line: string) => void said.push(line));
});
afterEach(async () => {
  vi.restoreAllMocks();
  await rm(folder, { recursive: true });
});

const write = (document: object) => writeFile(path.join(folder, "tree.yaml"), stringify(document));

describe("tree -- check", () => {
  test("ends with 0 and the counts on a sound tree", async () => {
    await write(smallDocument());
    expect(await check([folder])).toBe(0);
    expect(said).toEqual([
      "2 symptoms, 3 causes, 4 checks, 2 readings, 3 remedies, 1 cautions, 2 stopRules, 1 knownCases, 1 drawings",
      "The tree is sound.",
    ]);
  });

  test("ends with 1 on an error, and names file, line, rule, node and mend", async () => {
    const document = smallDocument();
    Object.assign(document.causes[2]!, { curedBy: {} });
    await write(document);
    expect(await check([folder])).toBe(1);
    const text = said.join("\n");
    expect(text).toMatch(/tree\.yaml:\d+ {2}error \(cause-without-remedy\)\n {2}cause battery-flat: no remedy cures it\.\n {2}Name one/);
    expect(said.at(-1)).toBe("2 errors.");
  });

  test("prints a figure a line for a machine", async () => {
    await write(smallDocument());
    await check([folder, "--json"]);
    const figures = said.map((line) => JSON.parse(line) as { figure: string; value: number });
    expect(figures.map(({ figure }) => figure)).toEqual([
      "symptoms",
      "causes",
      "checks",
      "readings",
      "remedies",
      "cautions",
      "stopRules",
      "knownCases",
      "drawings",
      "errors",
    ]);
    expect(figures[0]).toEqual({ figure: "symptoms", value: 2 });
    expect(figures.at(-1)).toEqual({ figure: "errors", value: 0, bar: 0, holds: true });
  });

  test("holds the shipped tree to the size it has reached, and every tree to no errors", () => {
    const shipped = { key: "small-marine-diesel" };
    expect(barred("causes", 201, shipped)).toEqual({ figure: "causes", value: 201, bar: 201, holds: true });
    expect(barred("causes", 200, shipped)).toMatchObject({ holds: false });
    expect(barred("readings", 20, shipped)).toMatchObject({ holds: false });
    expect(barred("stopRules", 23, shipped)).toEqual({ figure: "stopRules", value: 23, bar: 23, holds: true });
    expect(barred("readings", 3, { key: "own" })).toEqual({ figure: "readings", value: 3 });
    expect(barred("errors", 1, { key: "own" })).toEqual({ figure: "errors", value: 1, bar: 0, holds: false });
  });

  test("shows how far each link speaks", async () => {
    await write(smallDocument());
    await check([folder, "--links"]);
    expect(said.join("\n")).toMatch(
      /Dirt in the tank \(tank-dirty\)\n {4}bowl-look: bright 0\.20 against 0\.95, x0\.21; slime 0\.80 against 0\.05, x16/,
    );
  });
});

describe("tree -- show", () => {
  test("prints the questions in order, indented under the answers that lead to them", async () => {
    await write(smallDocument());
    expect(await show([folder, "--symptom", "lost-rpm", "--depth", "2"])).toBe(0);
    const lines = said.join("\n").split("\n");
    expect(lines[0]).toBe("Will not reach full revs");
    expect(lines).toContain("Asked before all: Is the alarm on? No.");
    // Pinned first for this symptom.
    const first = lines.findIndex((line) => line.startsWith("Look into the bowl ("));
    expect(first).toBeGreaterThan(0);
    expect(lines[first + 1]).toMatch(/^ {4}\S.* \(\d+ of 100\):$/);
    expect(lines[first + 2]).toMatch(/^ {8}\S/);
  });

  test("shares of the answers to a question add up to 100, give or take the rounding", async () => {
    await write(smallDocument());
    await show([folder, "--symptom", "no-crank", "--depth", "1", "--chance", "0.01"]);
    const shares = said
      .join("\n")
      .split("\n")
      .filter((line) => line.startsWith("    "))
      .map((line) => Number(/\((\d+) of 100\)/.exec(line)?.[1] ?? 0));
    expect(shares.length).toBeGreaterThan(1);
    expect(Math.abs(shares.reduce((sum, share) => sum + share, 0) - 100)).toBeLessThanOrEqual(shares.length);
  });

  test.each([
    [["--symptom", "lost-rmp"], /Did you mean "lost-rpm"\?/],
    [[], /--symptom KEY/],
    [["--symptom", "lost-rpm", "--feature", "voltage=v48"], /no option of voltage "v48"/],
    [["--symptom", "lost-rpm", "--situation", "aground"], /alongside, at-anchor, under-way/],
    [["--symptom", "lost-rpm", "--depth", "0"], /from 1 to 8/],
  ])("refuses %j and says what would do", async (args, says) => {
    await write(smallDocument());
    await expect(show([folder, ...args])).rejects.toThrow(says);
    await expect(show([folder, ...args])).rejects.toBeInstanceOf(Refusal);
  });

  test("refuses to reason with a tree that has errors", async () => {
    await write({ ...smallDocument(), remedies: [] });
    await expect(show([folder, "--symptom", "lost-rpm"])).rejects.toThrow(/errors: see npm run tree -- check/);
  });
});

describe("tree -- prove", () => {
  const figures = () => Object.fromEntries(said.map((line) => JSON.parse(line) as Figure).map((figure) => [figure.figure, figure]));
  type Figure = { figure: string; value: number; bar?: number; holds?: boolean };

  test("prints a figure a line for a machine, with its bar and whether that holds", async () => {
    await write(smallDocument());
    // The commonest cause is at fault, so the base-rate order goes straight to it: no bar to hold against that here.
    expect(await prove([folder, "--json", "--bar", "top1.butConfirming=1", "--bar", "minutes.ratioToBaseRate=10"])).toBe(0);
    expect(Object.keys(figures())).toEqual([
      "cases",
      "top1.start",
      "top3.start",
      "top1.butConfirming",
      "top3.butConfirming",
      "top1.all",
      "top3.all",
      "twoCauses",
      "twoCauses.bothInFirstThree",
      "twoCauses.likeliestPair",
      "cured",
      "held",
      "called",
      "minutes.mean",
      "minutes.baseRate",
      "minutes.ratioToBaseRate",
    ]);
    // High vacuum with lost revs: the filter, which its remedy cures.
    expect(figures()["top1.butConfirming"]).toEqual({ figure: "top1.butConfirming", value: 1, bar: 1, holds: true });
    expect(figures()).toMatchObject({ cases: { value: 1 }, cured: { value: 1 }, called: { value: 0 } });
    expect(figures()["minutes.ratioToBaseRate"]).toMatchObject({ bar: 10, holds: true });
  });

  test("ends with 1 where a bar is missed", async () => {
    const document = smallDocument();
    Object.assign(document.knownCases[0]!, { causes: ["battery-flat"] });
    await write(document);
    expect(await prove([folder, "--json", "--bar", "top1.all=0.5"])).toBe(1);
    expect(figures()["top1.all"]).toEqual({ figure: "top1.all", value: 0, bar: 0.5, holds: false });
  });

  test("tells each case in words: place of the right cause, the end, and the way there", async () => {
    await write(smallDocument());
    await prove([folder]);
    expect(said.join("\n")).toMatch(
      /^case-1 Slow home: right cause number 1; cured in \d+ min \(base-rate order \d+\)\n {4}.*\[change-filter\]/,
    );
  });

  test.each([
    [["--cases", "/nowhere.yaml"], /no file/],
    [["--person", "captain"], /no person/],
    [["--bar", "top1.start"], /reads like/],
    [["--bar", "top9=1"], /no figure "top9"/],
  ])("refuses %j and says what would do", async (args, says) => {
    await write(smallDocument());
    await expect(prove([folder, ...args])).rejects.toThrow(says);
  });
});

describe("cases from a file", () => {
  const one = smallDocument().knownCases[0]!;
  const read = async (name: string, text: string) => {
    await writeFile(path.join(folder, name), text);
    return readCases(path.join(folder, name), smallTree());
  };

  test("are read from JSON lines, a YAML list and a YAML map alike", async () => {
    const [cases] = [await read("a.jsonl", `${JSON.stringify(one)}\n\n`)];
    expect(cases).toEqual(smallTree().knownCases);
    expect(await read("b.yaml", stringify([one]))).toEqual(cases);
    expect(await read("c.yaml", stringify({ knownCases: [one] }))).toEqual(cases);
  });

  test.each([
    ["a.jsonl", "{", /a\.jsonl:1 is not JSON/],
    ["a.yaml", "title: [", /not valid YAML/],
    ["a.yaml", "title: x", /has to be a list/],
    ["a.yaml", "[]", /no cases/],
    ["a.jsonl", JSON.stringify({ ...one, causes: [] }), /case case-1: causes/],
    ["a.jsonl", JSON.stringify({ ...one, causes: ["filter-blockd"] }), /case case-1: .*Did you mean "filter-blocked"/],
  ])("%s with %j is refused with the place named", async (name, text, says) => {
    await expect(read(name, text)).rejects.toThrow(says);
  });
});
