import { uuidv7 } from "uuidv7";
import { beforeAll, describe, expect, test } from "vitest";
import { recordEvents } from "@/lib/server/diagnoses/commands";
import type { FaultTree } from "@/lib/core/tree/schema";
import { typographicAll } from "@/lib/core/tree/typographic";
import { withScope } from "@/lib/server/auth/scope";
import { listLoggedCases } from "@/lib/server/trees/logged-cases";
import { readTreeText } from "@/lib/server/trees/read-tree-text";
import { treeFile } from "@/lib/server/trees/tree-file";
import { afloat, phoneOf, shipTree, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";
import { shippedTree } from "../support/shipped-tree";
import { smallTree } from "../support/small-tree";

describe("a tree taken along", () => {
  test.each(["yaml", "json"] as const)(
    "and brought back is the identical document, and so is its file: %s",
    async (format) => {
      for (const tree of [typographicAll(smallTree()) as FaultTree, await shippedTree()]) {
        const file = treeFile(tree, format);
        const read = readTreeText(file);
        expect(read).toEqual(tree);
        expect(treeFile(read, format)).toBe(file);
      }
      // The whole shipped tree is read twice, which takes its time where much else runs.
    },
    60_000,
  );

  test("with a fault in it is refused with line and node", () => {
    const file = treeFile(smallTree(), "yaml").replace(/minutes: \d+/, "minutes: soon");
    const line = file.slice(0, file.indexOf("minutes: soon")).split("\n").length;
    expect(() => readTreeText(file)).toThrowError(
      expect.objectContaining({
        status: 422,
        extras: { errors: [{ path: `line ${line}, check ${smallTree().checks[0]!.key}`, says: expect.stringContaining("minutes") }] },
      }),
    );
  });

  test("that is no YAML at all is refused with its line", () => {
    expect(() => readTreeText("format: 1\n  key: [")).toThrowError(
      expect.objectContaining({
        status: 422,
        extras: { errors: expect.arrayContaining([expect.objectContaining({ path: expect.stringMatching(/^line \d/) })]) },
      }),
    );
  });

  test.each([
    ["nested too deep", `about: ${"[".repeat(20_000)}${"]".repeat(20_000)}`],
    [
      "unfolding without end",
      `systems: &a [x, x]\n${[..."bcdefghijklmno"].map((name, at) => `${name}: &${name} [${`*${"abcdefghijklmno"[at]}, `.repeat(9)}]`).join("\n")}`,
    ],
  ])("is refused in words where it is made to choke on: %s", (_how, file) => {
    expect(() => readTreeText(file)).toThrowError(expect.objectContaining({ status: 422 }));
  });

  test("of nothing but faults tells the first hundred", () => {
    const file = Array.from({ length: 300 }, (_, at) => `wrong-${at}: 1`).join("\n");
    const refused = expect.objectContaining({
      status: 422,
      extras: { errors: expect.toSatisfy((errors: unknown[]) => errors.length === 100) },
    });
    expect(() => readTreeText(file)).toThrowError(refused);
  });
});

describe("logged cases", () => {
  let mats: Afloat;
  let versionId: string;
  beforeAll(async () => {
    const { owner } = await testDatabase();
    versionId = await shipTree(owner);
    mats = await afloat("Mats");
  });

  test("are the proved cures among the diagnoses, and nothing of another fleet", async () => {
    const cause = smallTree().causes[0]!.key;
    const log = async (proof?: string) => {
      const diagnosisId = uuidv7();
      const phone = phoneOf(diagnosisId);
      const events = [phone.begin(mats.engineId, versionId), phone.write("ended", { outcome: "cured", cause, proof, parts: [] })];
      await withScope(mats.person, mats.fleetId, "diagnosis:write", (scope) => recordEvents(scope, diagnosisId, events));
      return diagnosisId;
    };
    const proved = await log("Ran an hour at full load");
    await log();
    const listed = await withScope(mats.person, mats.fleetId, "tree:write", (scope) => listLoggedCases(scope, 10));
    expect(listed).toMatchObject([{ diagnosisId: proved, known: { causes: [cause], symptoms: ["lost-rpm"] } }]);
    const ines = await afloat("Ines");
    expect(await withScope(ines.person, ines.fleetId, "tree:write", (scope) => listLoggedCases(scope, 10))).toEqual([]);
  });
});
