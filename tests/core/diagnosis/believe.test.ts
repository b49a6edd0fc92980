import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { believe } from "../../../lib/core/diagnosis/believe";
import { compile } from "../../../lib/core/diagnosis/compile";
import { NO_EVIDENCE, type Evidence } from "../../../lib/core/diagnosis/evidence";
import { likeliestPairs, pairAt } from "../../../lib/core/diagnosis/pairs";
import type { FaultTree } from "../../../lib/core/tree/schema";
import { anyCase, anyTree, setting } from "./random-trees";
import { cause, check, finding, remedy, symptom, tree } from "./small-trees";

const runs = { seed: 20_25, numRuns: 300 };
const shares = (of: FaultTree, evidence: Partial<Evidence>) => believe(compile(of, setting), { ...NO_EVIDENCE, ...evidence }).shares;
const share = (of: FaultTree, evidence: Partial<Evidence>, key: string): number => {
  const model = compile(of, setting);
  return believe(model, { ...NO_EVIDENCE, ...evidence }).shares[model.causeAt.get(key) ?? model.unknownAt] ?? NaN;
};

describe("belief", () => {
  it("[P1] is a set of shares that sum to 1, whatever is told", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const all = shares(tree, evidence);
        expect([...all].every((one) => one >= 0 && one <= 1)).toBe(true);
        expect(all.reduce((sum, one) => sum + one, 0)).toBeCloseTo(1, 12);
      }),
      runs,
    );
  });

  it("[P2] is the same to the last bit in whatever order things are told", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const turned = {
          symptoms: [...evidence.symptoms].reverse(),
          findings: [...evidence.findings].reverse(),
          remedies: [...evidence.remedies].reverse(),
        };
        expect([...shares(tree, turned)]).toEqual([...shares(tree, evidence)]);
      }),
      runs,
    );
  });

  it("[P3] can't tell, and could not do it, change nothing", () => {
    fc.assert(
      fc.property(anyTree, (tree) => {
        const findings = tree.checks.map((one) => ({ check: one.key, finding: null }));
        const remedies = tree.remedies.map((one) => ({ remedy: one.key, result: "could-not" as const }));
        expect([...shares(tree, { findings, remedies })]).toEqual([...shares(tree, {})]);
      }),
      runs,
    );
  });

  it("[P4] a stronger link never makes its finding speak less for the cause", () => {
    const at = (strength: number) =>
      share(
        tree({ checks: [check("look", ["fine", "odd"])], causes: [cause("a", { gives: { look: { odd: strength } } }), cause("b")] }),
        { findings: [{ check: "look", finding: "odd" }] },
        "a",
      );
    fc.assert(
      fc.property(fc.double({ min: 0.02, max: 0.97, noNaN: true }), fc.double({ min: 0.001, max: 0.02, noNaN: true }), (one, more) => {
        expect(at(one + more)).toBeGreaterThan(at(one));
      }),
      runs,
    );
  });

  it("does not mind what things are called or in which order the tree lists them", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const turned = { ...tree, causes: [...tree.causes].reverse(), checks: [...tree.checks].reverse() };
        for (const { key } of tree.causes) expect(share(turned, evidence, key)).toBeCloseTo(share(tree, evidence, key), 12);
      }),
      runs,
    );
  });
});

describe("something not in this tree", () => {
  const two = tree({
    symptoms: [symptom("weak"), symptom("smoke")],
    checks: [check("look", ["fine", "odd"])],
    causes: [
      cause("a", { shows: { weak: "usually" }, gives: { look: { odd: "x20" } } }),
      cause("b", { shows: { weak: "often", smoke: "usually" } }),
    ],
  });

  it("[K2] keeps its 5 % whatever symptoms are told or denied", () => {
    for (const symptoms of [
      [{ symptom: "weak", present: true }],
      [
        { symptom: "weak", present: true },
        { symptom: "smoke", present: true },
      ],
      [
        { symptom: "weak", present: true },
        { symptom: "smoke", present: false },
      ],
    ])
      expect(share(two, { symptoms }, "?")).toBeCloseTo(0.05, 12);
  });

  it("[K3] grows on a usual finding", () => {
    expect(share(two, { findings: [{ check: "look", finding: "fine" }] }, "?")).toBeGreaterThan(0.05);
  });

  it("[M2] grows when remedies fail, and is never cured", () => {
    const mended = tree({ remedies: [remedy("mend")], causes: [cause("a", { curedBy: { mend: "nearly always" } })] });
    expect(share(mended, { remedies: [{ remedy: "mend", result: "no-change" }] }, "?")).toBeGreaterThan(0.4);
    expect(share(mended, { remedies: [{ remedy: "mend", result: "cured" }] }, "?")).toBe(0);
  });
});

describe("symptoms", () => {
  it("[S2] hold down all causes without a link together to 5 %, and all pairs without one", () => {
    const many = tree({
      causes: [
        cause("linked", { base: "rare", shows: { weak: "seldom" } }),
        ...Array.from({ length: 150 }, (_, index) => cause(`other-${index}`, { base: "common" })),
      ],
    });
    const symptoms = [{ symptom: "weak", present: true }];
    const model = compile(many, setting);
    const { alone, pairs, two } = believe(model, { ...NO_EVIDENCE, symptoms });
    expect(alone[0]! / (0.95 - two)).toBeCloseTo(0.95, 6);
    const withLinked = Array.from({ length: 150 }, (_, index) => pairs[pairAt(0, index + 1, 151)]!).reduce((sum, one) => sum + one, 0);
    expect(1 - withLinked / two).toBeLessThanOrEqual(0.05);
  });

  it("[S4] are shown by a pair unless neither cause shows them", () => {
    const shown = tree({
      symptoms: [symptom("weak"), symptom("smoke")],
      causes: [
        cause("a", { shows: { weak: "always" } }),
        cause("b", { shows: { smoke: "always" } }),
        cause("c", { shows: { weak: "usually" } }),
      ],
    });
    const told = (...keys: string[]) =>
      believe(compile(shown, setting), { ...NO_EVIDENCE, symptoms: keys.map((key) => ({ symptom: key, present: true })) });
    expect(told("weak").two).toBeLessThan(0.2);
    const { two, pairs } = told("weak", "smoke");
    expect(two).toBeGreaterThan(0.9);
    expect(likeliestPairs(pairs, 3, 0)[0]).toMatchObject({ a: 0, b: 1 });
  });

  it("[R1] a root that runs through a nearer cause stands behind it, and beside it [B4] five times as often as chance would have it", () => {
    const base = { base: "common" as const, shows: { weak: "usually" as const }, curedBy: { mend: "always" as const } };
    const causes = (root: Partial<ReturnType<typeof cause>>) =>
      tree({ remedies: [remedy("mend")], causes: [cause("filter", { ...base, ...root }), cause("growth", base)] });
    const symptoms = [{ symptom: "weak", present: true }];
    const ofAlone = (over: Parameters<typeof causes>[0]) => {
      const { alone } = believe(compile(causes(over), setting), { ...NO_EVIDENCE, symptoms });
      return alone[1]! / (alone[0]! + alone[1]!);
    };
    expect(ofAlone({})).toBeCloseTo(0.5, 12);
    expect(ofAlone({ broughtOnBy: { growth: 0.66 } })).toBeCloseTo(0.34 / 1.34, 12);
    const third = (over: Parameters<typeof causes>[0]) => {
      const { pairs } = believe(
        compile(tree({ ...causes(over), causes: [...causes(over).causes, cause("other", { base: "common" })] }), setting),
        NO_EVIDENCE,
      );
      return pairs[pairAt(0, 1, 3)]! / pairs[pairAt(0, 2, 3)]!;
    };
    expect(third({})).toBeCloseTo(1, 12);
    expect(third({ broughtOnBy: { growth: 0.66 } })).toBeCloseTo(5, 12);
  });
});

describe("findings", () => {
  it("[E3] of checks that see the same thing only the louder counts", () => {
    const twice = tree({
      checks: [check("gauge", ["fine", "odd"], { sameSight: "heat" }), check("hand", ["fine", "odd"], { sameSight: "heat" })],
      causes: [cause("a", { gives: { gauge: { odd: "x60" }, hand: { odd: "x5" } } }), cause("b")],
    });
    const gauge = { check: "gauge", finding: "odd" };
    const hand = { check: "hand", finding: "odd" };
    expect(share(twice, { findings: [gauge, hand] }, "a")).toBe(share(twice, { findings: [gauge] }, "a"));
    expect(share(twice, { findings: [hand] }, "a")).toBeLessThan(share(twice, { findings: [gauge] }, "a"));
  });

  it("[E4] a finding that restates a reported symptom weighs nothing; among several that do, the choice counts", () => {
    const restated = tree({
      symptoms: [symptom("smoke")],
      checks: [
        check("colour", [finding("clear", { usual: true }), finding("black", { restates: "smoke" })]),
        check("when", [
          finding("clear", { usual: true }),
          finding("at-full", { restates: "smoke" }),
          finding("always", { restates: "smoke" }),
        ]),
      ],
      causes: [
        cause("a", { shows: { smoke: "usually" }, gives: { colour: { black: "usually" }, when: { always: "usually" } } }),
        cause("b", { shows: { smoke: "usually" } }),
      ],
    });
    const symptoms = [{ symptom: "smoke", present: true }];
    const before = share(restated, { symptoms }, "a");
    expect(share(restated, { symptoms, findings: [{ check: "colour", finding: "black" }] }, "a")).toBe(before);
    expect(share(restated, { findings: [{ check: "colour", finding: "black" }] }, "a")).toBeGreaterThan(before);
    expect(share(restated, { symptoms, findings: [{ check: "when", finding: "always" }] }, "a")).toBeGreaterThan(before);
  });
});
