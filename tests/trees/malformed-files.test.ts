import { mkdir, mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { stringify } from "yaml";
import { parseTree } from "@/lib/core/tree/parse-tree";
import { readTreeFolder } from "@/lib/server/trees/read-tree-folder";
import { smallDocument } from "../support/small-tree";
import { typographicAll } from "@/lib/core/tree/typographic";

let folder: string;
beforeEach(async () => void (folder = await mkdtemp(path.join(tmpdir(), "tree-"))));
afterEach(() => rm(folder, { recursive: true }));

async function write(files: Record<string, string>) {
  for (const [file, text] of Object.entries(files)) {
    await mkdir(path.dirname(path.join(folder, file)), { recursive: true });
    await writeFile(path.join(folder, file), text);
  }
  return readTreeFolder(folder);
}

async function faultsOf(files: Record<string, string>) {
  const read = await write(files);
  return "faults" in read ? read.faults : [];
}

test("files are joined in the order of their paths", async () => {
  const { causes, checks, ...rest } = smallDocument();
  const read = await write({
    "tree.yaml": stringify(rest),
    "systems/b/causes.yaml": stringify({ causes: causes.slice(1) }),
    "systems/a/causes.yaml": stringify({ causes: causes.slice(0, 1) }),
    "checks.yml": stringify({ checks }),
    "notes.txt": "not read",
  });
  expect("document" in read && read.document).toEqual(typographicAll(smallDocument()));
});

test("pairs that no check tells apart are joined too, and a tree may do without them", async () => {
  const inseparable = [{ causes: ["filter-blocked", "tank-dirty"], because: "Same dirt." }];
  const read = await write({ "tree.yaml": stringify(smallDocument()), "inseparable.yaml": stringify({ inseparable }) });
  expect("document" in read && read.document).toEqual(typographicAll({ ...smallDocument(), inseparable }));
});

test("an empty file, one with comments only and an empty list are no faults", async () => {
  expect(await faultsOf({ "a.yaml": "", "b.yaml": "# later\n", "c.yaml": "causes:\n" })).toEqual([]);
});

describe("a fault names file and line, and says what to do", () => {
  const faults: { fault: string; files: Record<string, string>; at: string; says: RegExp; mend: RegExp }[] = [
    {
      fault: "a bracket left open",
      files: { "a.yaml": "key: small\ncauses:\n  - { key: a, title: b\n" },
      at: "a.yaml:4",
      says: /not valid YAML/,
      mend: /brackets/,
    },
    { fault: "a tab for indent", files: { "a.yaml": "causes:\n\t- key: a\n" }, at: "a.yaml:2", says: /not valid YAML/, mend: /spaces/ },
    {
      fault: "a key twice in a map",
      files: { "a.yaml": "causes:\n  - key: a\n    base: rare\n    base: common\n" },
      at: "a.yaml:4",
      says: /unique/,
      mend: /Keep one/,
    },
    {
      fault: "a colon in bare text",
      files: { "a.yaml": "causes:\n  - key: a\n    is: Dirt: holds fuel\n" },
      at: "a.yaml:3",
      says: /not valid YAML/,
      mend: /quotes/,
    },
    {
      fault: "a list where a map belongs",
      files: { "a.yaml": "- key: a\n" },
      at: "a.yaml:1",
      says: /has to be a map/,
      mend: /Begin it with/,
    },
    {
      fault: "a part no tree has",
      files: { "a.yaml": "key: small\ncuases:\n  - key: a\n" },
      at: "a.yaml:2",
      says: /"cuases" is not a part of a tree/,
      mend: /Did you mean "causes"/,
    },
    {
      fault: "a map where a list belongs",
      files: { "a.yaml": "causes:\n  key: a\n" },
      at: "a.yaml:1",
      says: /"causes" has to be a list/,
      mend: /"- "/,
    },
    {
      fault: "a single value in two files",
      files: { "a.yaml": "title: One\n", "b.yaml": "about: x\ntitle: Two\n" },
      at: "b.yaml:2",
      says: /stands in a\.yaml already/,
      mend: /Keep one/,
    },
    { fault: "no files at all", files: {}, at: ".:1", says: /no YAML files/, mend: /tree\.yaml/ },
  ];

  test.each(faults)("$fault", async ({ files, at, says, mend }) => {
    const [fault, ...others] = await faultsOf(files);
    expect(others).toEqual([]);
    expect(`${fault?.file}:${fault?.line}`).toBe(at);
    expect(fault?.says).toMatch(says);
    expect(fault?.mend).toMatch(mend);
  });

  test("a folder that is not there", async () => {
    const read = await readTreeFolder(path.join(folder, "nowhere"));
    expect("faults" in read && read.faults[0]?.says).toMatch(/nowhere/);
  });

  test("faults of several files come together", async () => {
    const faults = await faultsOf({ "a.yaml": "causes: 1\n", "b.yaml": "chekcs: []\n" });
    expect(faults.map(({ file }) => file)).toEqual(["a.yaml", "b.yaml"]);
  });
});

test("a fault of shape is found again in the file it was written in", async () => {
  const { causes, ...rest } = smallDocument();
  const wrong =
    "causes:\n  - key: late\n    title: Late\n    system: fuel\n    is: Late.\n    base: often\n    onset: either\n    shows: {}\n    curedBy: {}\n    sources: [judgement]\n";
  const read = await write({ "tree.yaml": stringify(rest), "systems/a.yaml": stringify({ causes }), "systems/z.yaml": wrong });
  if ("faults" in read) throw new Error("the files are at fault");
  const parsed = parseTree(read.document);
  const [flaw] = "flaws" in parsed ? parsed.flaws : [];
  expect(flaw).toMatchObject({ node: { kind: "cause", key: "late" }, path: ["causes", 3, "base"] });
  expect(read.placeOf(flaw?.path ?? [])).toEqual({ file: "systems/z.yaml", line: 6 });
  // A field that is missing is shown where its node begins.
  expect(read.placeOf(["causes", 3, "note"])).toEqual({ file: "systems/z.yaml", line: 2 });
});
