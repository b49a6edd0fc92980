import { describe, expect, it } from "vitest";
import { caseOfLog } from "@/lib/core/diagnosis/case-of-log";
import { learn } from "@/lib/core/diagnosis/learn";
import { learnBaseRates } from "@/lib/core/diagnosis/learn-base-rates";
import { logOf } from "@/lib/core/diagnosis/log-of";
import { readAnswer } from "@/lib/core/diagnosis/read-answer";
import type { KnownCase } from "@/lib/core/tree/schema";
import { smallTree } from "../../support/small-tree";

const tree = smallTree();
const cause = tree.causes[0]!;
const check = tree.checks.find(({ key }) => cause.gives[key] !== undefined)!;
const [first, second] = check.findings;

const known = (finding: string, over: Partial<KnownCase> = {}): KnownCase => ({
  key: "one",
  title: "One",
  features: {},
  figures: {},
  situation: "alongside",
  symptoms: [tree.symptoms[0]!.key],
  findings: [{ check: check.key, finding, when: "after" }],
  causes: [cause.key],
  alsoAccept: [],
  source: "Logged",
  ...over,
});

describe("what the log says of a link [V5]", () => {
  it("is the tree's share with the cases added as counts, ten for a word of judgement", () => {
    const cases = [...Array.from({ length: 3 }, () => known(first!.key)), known(second!.key)];
    const said = learn(tree, cases).find(({ finding }) => finding === first!.key)!;
    expect(said).toMatchObject({ cause: cause.key, check: check.key, cases: 4, times: 3 });
    expect(said.withLog).toBeCloseTo((said.tree * 10 + 3) / 14, 12);
  });

  it("is surprising as the exact binomial has it", () => {
    const cases = Array.from({ length: 5 }, () => known(first!.key));
    const said = learn(tree, cases).find(({ finding }) => finding === first!.key)!;
    // All five of five is the least likely outcome on its side: no other is as unlikely, for a share under a half.
    expect(said.tree).toBeLessThan(0.5);
    expect(said.chance).toBeCloseTo(said.tree ** 5, 12);
  });

  it("is not said from fewer than three cases, nor from checks that were not answered", () => {
    expect(learn(tree, [known(first!.key), known(first!.key)])).toEqual([]);
    expect(
      learn(
        tree,
        Array.from({ length: 5 }, () => known(first!.key, { findings: [] })),
      ),
    ).toEqual([]);
  });
});

describe("what the log says of base rates [V6]", () => {
  it("expects in all as many cases as there are, the unknown's share aside, and finds the one that is always it", () => {
    const cases = Array.from({ length: 20 }, () => known(first!.key));
    const said = learnBaseRates({ ...tree, causes: [...tree.causes, { ...cause, key: "rival" }] }, cases);
    const expected = said.reduce((sum, one) => sum + one.expected, 0);
    expect(expected).toBeGreaterThan(17);
    expect(expected).toBeLessThanOrEqual(20);
    const [found, rival] = [cause.key, "rival"].map((key) => said.find((one) => one.cause === key)!);
    expect(found).toMatchObject({ times: 20 });
    expect(found!.factor).toBeCloseTo(30 / (10 + found!.expected), 12);
    // Half of twenty or so were expected of each: P(20 or more | Poisson 9.5) is 0.002, P(none) less still.
    expect(found!.chance).toBeLessThan(0.01);
    expect(rival).toMatchObject({ times: 0, expected: found!.expected });
    expect(said[0]).toBe(rival);
  });
});

describe("a logged diagnosis as a known case [V4]", () => {
  const begun = {
    kind: "begun" as const,
    payload: {
      engineId: "00000000-0000-7000-8000-000000000001",
      treeVersionId: "00000000-0000-7000-8000-000000000002",
      profile: { features: { voltage: "v12" }, figures: {}, healthy: {} },
      situation: "at-anchor" as const,
      person: "skipper-at-sea" as const,
      symptoms: [tree.symptoms[0]!.key],
      multipliers: [],
      coreVersion: 1,
    },
  };
  const answered = { kind: "answered" as const, payload: { check: check.key, answer: { finding: first!.key }, photos: [] } };
  const ended = (payload: object) => ({
    kind: "ended" as const,
    payload: { outcome: "cured", cause: cause.key, proof: "Ran an hour", parts: [], ...payload } as never,
  });

  it("tells what was told and the cause that was proved", () => {
    expect(caseOfLog(logOf([begun, answered, ended({})]), tree)).toMatchObject({
      features: { voltage: "v12" },
      situation: "at-anchor",
      symptoms: [tree.symptoms[0]!.key],
      findings: [{ check: check.key, finding: first!.key }],
      causes: [cause.key],
    });
  });

  it("tells what was tried and did not cure, and not what cured", () => {
    const tried = (remedy: string, result: "no-change" | "cured") => ({
      kind: "remedy-tried" as const,
      payload: { remedy, result, photos: [] },
    });
    const [one, two] = ["clean", "renew"];
    const log = logOf([begun, tried(one!, "no-change"), tried(two!, "cured"), ended({})]);
    expect(caseOfLog(log, tree)?.tried).toEqual([{ remedy: one, result: "no-change", when: "after" }]);
  });

  it("is none where one of two faults was put right on the way: which finding was whose is not known", () => {
    const better = { kind: "remedy-tried" as const, payload: { remedy: "clean", result: "better" as const, photos: [] } };
    expect(caseOfLog(logOf([begun, answered, better, ended({})]), tree)).toBeNull();
  });

  it("keeps a value as it was typed", () => {
    const reading = tree.checks.find((one) => one.reading !== undefined)!;
    const answer = { value: 0.1, unit: reading.reading!.unit };
    const log = logOf([begun, { kind: "answered", payload: { check: reading.key, answer, photos: [] } }, ended({})]);
    expect(caseOfLog(log, tree)?.findings).toEqual([{ check: reading.key, ...answer, when: "after" }]);
    expect(readAnswer(reading, answer, { features: {}, figures: {}, healthy: {} }, tree.features)).not.toBeNull();
  });

  it.each([{ proof: undefined }, { outcome: "held" }, { cause: undefined, causeInWords: "a mouse" }])(
    "is none where nothing was proved: %o",
    (payload) => {
      expect(caseOfLog(logOf([begun, answered, ended(payload)]), tree)).toBeNull();
    },
  );

  it("is none while it is open", () => {
    expect(caseOfLog(logOf([begun, answered]), tree)).toBeNull();
  });
});
