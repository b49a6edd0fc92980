import { describe, expect, it } from "vitest";
import { prove } from "../../../lib/core/diagnosis/prove";
import type { KnownCase } from "../../../lib/core/tree/schema";
import { cause, check, remedy, symptom, tree } from "./small-trees";

const known = (over: Partial<KnownCase>): KnownCase => ({
  key: "case",
  title: "A case",
  features: {},
  figures: {},
  situation: "alongside",
  symptoms: ["weak"],
  findings: [],
  causes: ["a"],
  alsoAccept: [],
  source: "made for this test",
  ...over,
});

const small = tree({
  symptoms: [symptom("weak")],
  checks: [check("look", ["fine", "odd"], { minutes: 2 }), check("settle", ["no", "yes"], { minutes: 30 })],
  remedies: [
    remedy("mend-a", { minutes: 50 }),
    remedy("mend-b", { minutes: 50 }),
    remedy("can", { minutes: 10, temporary: true, tryOut: { minutes: 0 } }),
  ],
  causes: [
    cause("a", {
      base: "occasional",
      shows: { weak: "usually" },
      gives: { look: { odd: "x60" }, settle: { yes: "x60" } },
      curedBy: { "mend-a": "nearly always" },
    }),
    cause("b", { base: "common", shows: { weak: "usually" }, curedBy: { "mend-b": "nearly always" } }),
    cause("c", { base: "rare", shows: { weak: "usually" }, curedBy: { can: "always" } }),
  ],
});
const findings: KnownCase["findings"] = [
  { check: "look", finding: "odd", when: "after" },
  { check: "settle", finding: "yes", when: "after", confirms: true },
];

describe("the proof of a tree by known cases", () => {
  it("[V1] places the right cause on what was known at the start, on all but the look that settled it, and on all", () => {
    const { cases, right } = prove(small, [known({ findings })]);
    expect(cases[0]?.place).toEqual({ start: 2, "but-confirming": 1, all: 1 });
    expect(right.start).toEqual({ first: 0, inFirstThree: 1 });
    expect(right["but-confirming"]).toEqual({ first: 1, inFirstThree: 1 });
  });

  it("[V1] counts a tie against the right cause, and an accepted cause for it", () => {
    const even = tree({ ...small, causes: small.causes.map((one) => ({ ...one, base: "common" as const })) });
    expect(prove(even, [known({})]).cases[0]?.place.start).toBe(3);
    const accepted = known({ alsoAccept: [{ cause: "b", reason: "the same part" }] });
    expect(prove(small, [accepted]).cases[0]?.place.start).toBe(1);
  });

  it("[V1] of two causes either counts as right, and whether both were found is told beside it", () => {
    const both = known({ symptoms: ["weak", "smoky"], causes: ["a", "d"], findings: findings.slice(0, 1) });
    const larger = tree({
      ...small,
      symptoms: [...small.symptoms, symptom("smoky")],
      causes: [...small.causes, cause("d", { shows: { smoky: "always" }, curedBy: { "mend-b": "always" } })],
    });
    const { cases, right, twoCauses } = prove(larger, [both, known({ findings })]);
    expect(cases[0]?.place["but-confirming"]).toBe(1);
    expect(right["but-confirming"].first).toBe(1);
    expect(cases.map((one) => one.both)).toEqual([{ inFirstThree: true, likeliestPair: true }, null]);
    expect(twoCauses).toEqual({ cases: 1, inFirstThree: 1, likeliestPair: 1 });
    // The first cure leaves the other fault, and the play goes on to the second.
    expect(cases[0]?.played.end).toBe("cured");
    expect(
      cases[0]?.played.steps
        .filter(({ kind }) => kind === "remedy")
        .map(({ key }) => key)
        .sort(),
    ).toEqual(["mend-a", "mend-b"]);
  });

  it("[V1] takes a remedy that was tried and did not cure as evidence, at the start where it had been tried before", () => {
    const tried = (when: "start" | "after"): KnownCase["tried"] => [{ remedy: "mend-b", result: "no-change", when }];
    expect(prove(small, [known({})]).cases[0]?.place).toMatchObject({ start: 2, "but-confirming": 2 });
    expect(prove(small, [known({ tried: tried("after") })]).cases[0]?.place).toMatchObject({ start: 2, "but-confirming": 1 });
    expect(prove(small, [known({ tried: tried("start") })]).cases[0]?.place).toMatchObject({ start: 1, "but-confirming": 1 });
  });

  it("[V2] does not try again what had been tried before", () => {
    const steps = prove(small, [known({ tried: [{ remedy: "mend-b", result: "no-change", when: "start" }] })]).cases[0]?.played.steps;
    expect(steps?.map(({ key }) => key)).not.toContain("mend-b");
  });

  it("[V1] says when the tree does not have the cause", () => {
    expect(prove(small, [known({ causes: ["elsewhere"] })]).cases[0]?.place.all).toBeNull();
  });

  it("[V2] plays the case through and counts every minute", () => {
    const [played] = prove(small, [known({ findings })]).cases;
    expect(played?.played.end).toBe("cured");
    expect(played?.played.steps.map(({ key }) => key)).toEqual(["look", "mend-a"]);
    expect(played?.played.minutes).toBe(2 + 50 + 10);
    // b is more common, so the base-rate order mends it first.
    expect(played?.baseRateMinutes).toBe(60 + 60);
  });

  it("[V2] a check that the case does not answer costs its minutes, a temporary remedy holds, a call ends it at its price", () => {
    const silent = prove(small, [known({})]).cases[0]?.played;
    expect(silent?.steps[0]).toMatchObject({ key: "look", minutes: 2 });
    const held = prove(small, [known({ causes: ["c"] })]).cases[0]?.played;
    expect(held?.end).toBe("held");
    const helpless = prove(small, [known({ causes: ["elsewhere"] })]).cases[0]?.played;
    expect(helpless?.end).toBe("called");
    expect(helpless?.steps.at(-1)).toEqual({ kind: "call", key: "call", minutes: 240 });
  });

  it("[V3] sums the minutes of both ways", () => {
    const proof = prove(small, [
      known({ findings }),
      known({ key: "other", causes: ["b"], findings: [{ check: "look", finding: "fine", when: "after" }] }),
    ]);
    expect(proof.ratio).toBeCloseTo(proof.meanMinutes / proof.meanBaseRateMinutes, 12);
    expect(proof.ends).toEqual({ cured: 2, held: 0, called: 0 });
  });
});
