import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { believe } from "../../../lib/core/diagnosis/believe";
import { compile } from "../../../lib/core/diagnosis/compile";
import { NO_EVIDENCE, type Evidence } from "../../../lib/core/diagnosis/evidence";
import { pairShare } from "../../../lib/core/diagnosis/pair-finding";
import { pairCure } from "../../../lib/core/diagnosis/pair-remedy";
import { likeliestPairs, pairAt, pairCount } from "../../../lib/core/diagnosis/pairs";
import { view } from "../../../lib/core/diagnosis/show";
import type { FaultTree } from "../../../lib/core/tree/schema";
import { Device } from "./logs";
import { anyCase, anyPartCure, setting } from "./random-trees";
import { cause, check, remedy, symptom, tree } from "./small-trees";

/** A choked filter makes it weak, a worn nozzle makes it smoke, and each has its look and its cure. */
const two = tree({
  symptoms: [symptom("weak"), symptom("smoky")],
  checks: [check("bowl", ["bright", "slime"]), check("spray", ["fine", "drips"]), check("hours", ["few", "many"])],
  remedies: [remedy("element"), remedy("nozzle"), remedy("oil")],
  causes: [
    cause("filter", { shows: { weak: "usually" }, gives: { bowl: { slime: "x60" } }, curedBy: { element: "nearly always" } }),
    cause("injector", { shows: { smoky: "usually" }, gives: { spray: { drips: "x60" } }, curedBy: { nozzle: "nearly always" } }),
    cause("worn", { shows: { weak: "often", smoky: "often" }, gives: { hours: { many: "usually" } }, curedBy: {} }),
    ...Array.from({ length: 12 }, (_, index) => cause(`other-${index}`, { shows: { weak: "sometimes" }, curedBy: { oil: "usually" } })),
  ],
});
const at = (key: string) => two.causes.findIndex((one) => one.key === key);
const told = (evidence: Partial<Evidence>, of: FaultTree = two) => believe(compile(of, setting), { ...NO_EVIDENCE, ...evidence });
const symptoms = ["weak", "smoky"].map((key) => ({ symptom: key, present: true }));
const found = [
  { check: "bowl", finding: "slime" },
  { check: "spray", finding: "drips" },
];

describe("two faults", () => {
  it("[P1] pairs, single causes and the unknown sum to 1; marginals count a pair for both", () => {
    fc.assert(
      fc.property(fc.oneof(anyCase, anyPartCure), ({ tree: of, evidence }) => {
        const { alone, pairs, marginals, shares, two: any, putRight } = believe(compile(of, setting), evidence);
        const sum = (all: Float64Array) => all.reduce((so, one) => so + one, 0);
        for (const all of [alone, pairs, marginals, shares]) expect([...all].every((one) => one >= 0 && one <= 1 + 1e-12)).toBe(true);
        expect(sum(shares)).toBeCloseTo(1, 12);
        if (putRight) return;
        expect(sum(alone) + sum(pairs)).toBeCloseTo(1, 12);
        expect(any).toBeCloseTo(sum(pairs), 12);
        expect(sum(marginals)).toBeCloseTo(1 + any, 12);
      }),
      { seed: 7, numRuns: 300 },
    );
  });

  it("[P2] the order of telling changes no bit of them", () => {
    fc.assert(
      fc.property(anyPartCure, ({ tree: of, evidence }) => {
        const model = compile(of, setting);
        const turned = {
          ...evidence,
          symptoms: [...evidence.symptoms].reverse(),
          findings: [...evidence.findings].reverse(),
          remedies: [...evidence.remedies].reverse(),
        };
        expect(believe(model, turned)).toEqual(believe(model, evidence));
      }),
      { seed: 8, numRuns: 200 },
    );
  });

  it("[P4] a stronger link never makes its finding speak less for the cause, alone or beside another", () => {
    const withLink = (strength: number) =>
      told(
        { symptoms, findings: [{ check: "bowl", finding: "slime" }] },
        {
          ...two,
          causes: two.causes.map((one) => (one.key === "filter" ? { ...one, gives: { bowl: { slime: strength } } } : one)),
        },
      ).marginals[at("filter")]!;
    fc.assert(
      fc.property(fc.double({ min: 0.06, max: 0.97, noNaN: true }), fc.double({ min: 0.001, max: 0.02, noNaN: true }), (one, more) => {
        expect(withLink(one + more)).toBeGreaterThan(withLink(one));
      }),
      { seed: 9, numRuns: 100 },
    );
  });

  it("[P2] pairs are the same under other names and in another order of the tree's lists", () => {
    fc.assert(
      fc.property(anyCase, ({ tree: of, evidence }) => {
        const turned = { ...of, causes: [...of.causes].reverse() };
        const [one, other] = [believe(compile(of, setting), evidence), believe(compile(turned, setting), evidence)];
        const count = of.causes.length;
        for (let a = 0; a < count; a++)
          for (let b = a + 1; b < count; b++)
            expect(one.pairs[pairAt(a, b, count)]).toBeCloseTo(other.pairs[pairAt(count - 1 - a, count - 1 - b, count)]!, 12);
      }),
      { seed: 10, numRuns: 200 },
    );
  });

  it("each pair has a place of its own", () => {
    const places = new Set(
      Array.from({ length: 9 }, (_, a) => Array.from({ length: 9 }, (_, b) => (a === b ? 0 : pairAt(a, b, 9)))).flat(),
    );
    expect([...places].sort((a, b) => a - b)).toEqual(Array.from({ length: pairCount(9) }, (_, index) => index));
  });

  it("[B4] has one in ten at first, and none that no engine can have", () => {
    expect(told({}).two).toBeCloseTo(0.1, 12);
    const kinds = tree({
      features: [{ key: "pump", title: "Pump", ask: "?", options: ["in-line", "rail", "rotary"].map((key) => ({ key, title: key })) }],
      causes: [
        cause("plunger", { appliesTo: { features: { pump: ["in-line", "rotary"] } } }),
        cause("solenoid", { appliesTo: { features: { pump: ["rail"] } } }),
        cause("governor", { appliesTo: { features: { pump: ["in-line"] } } }),
        cause("dirt"),
      ],
    });
    const { pairs } = told({}, kinds);
    expect(pairs[pairAt(0, 1, 4)]).toBe(0);
    // A third of engines has both, not two ninths.
    expect(pairs[pairAt(0, 2, 4)]! / pairs[pairAt(2, 3, 4)]!).toBeCloseTo(1, 12);
  });

  it("[L7] an engine with both shows the usual finding least, and each odd finding in proportion to both", () => {
    const model = compile(two, setting);
    const bowl = model.checks[0]!;
    const usual = bowl.rows[0]!;
    expect(pairShare(bowl, 0, at("filter"), at("injector"))).toBeCloseTo(usual[at("filter")]!, 12);
    const both = compile(tree({ ...two, causes: two.causes.map((one) => ({ ...one, gives: { bowl: { slime: 0.6 } } })) }), setting)
      .checks[0]!;
    expect(pairShare(both, 0, 0, 1)).toBeCloseTo((0.4 * 0.4) / 0.95, 12);
    expect(pairShare(both, 0, 0, 1) + pairShare(both, 1, 0, 1)).toBeCloseTo(1, 12);
    const usualer = compile(tree({ ...two, causes: two.causes.map((one) => ({ ...one, gives: { bowl: { slime: 0.001 } } })) }), setting)
      .checks[0]!;
    expect(pairShare(usualer, 1, 0, 1)).toBeCloseTo(0.001, 12);
  });

  it("[M3] is cured when both are, and better when just one is", () => {
    const element = compile(two, setting).remedies[0]!;
    const { cured, better, noChange } = pairCure(element, at("filter"), at("injector"));
    expect(cured).toBeCloseTo(0.93 * 0.01, 12);
    expect(better).toBeCloseTo(0.93 * 0.99 + 0.07 * 0.01, 12);
    expect(cured + better + noChange).toBeCloseTo(1, 12);
    const remedies = [{ remedy: "element", result: "better" as const }];
    expect(told({ symptoms, findings: found, remedies }).two).toBeGreaterThan(told({ symptoms, findings: found }).two);
  });

  it("[M4] what is left once one was put right is the other, and what is told since speaks of that one", () => {
    const better = { remedies: [{ remedy: "element", result: "better" as const }], curedOne: "element" };
    const after = told({ symptoms, findings: found, ...better });
    expect(after.shares[at("injector")]).toBeGreaterThan(0.85);
    expect(after.shares[at("filter")]).toBeLessThan(0.05);
    expect(after.putRight?.[at("filter")]).toBeGreaterThan(0.85);
    const bright = { check: "bowl", finding: "bright" };
    const since = told({ symptoms, findings: [{ ...bright, left: true }, found[1]!], ...better }).shares[at("injector")]!;
    const before = told({ symptoms, findings: [bright, found[1]!], ...better }).shares[at("injector")]!;
    expect(since).toBeGreaterThan(before);
    const usual = {
      symptoms,
      findings: [
        { ...bright, left: true as const },
        { check: "spray", finding: "fine", left: true as const },
      ],
      ...better,
    };
    expect(told(usual).shares.at(-1)).toBeGreaterThan(told({ symptoms, findings: [], ...better }).shares.at(-1)!);
  });

  it("[M4] a symptom that went with the cure speaks for the one that is still there being of the other fault", () => {
    const better = { remedies: [{ remedy: "element", result: "better" as const }], curedOne: "element" };
    const gone = told({ symptoms: [{ symptom: "weak", present: false, left: { before: true } }, symptoms[1]!], ...better });
    const unsaid = told({ symptoms, ...better });
    const onlyFilter = told({ symptoms: [symptoms[0]!, { symptom: "smoky", present: false, left: { before: true } }], ...better });
    expect(gone.shares[at("injector")]).toBeGreaterThan(unsaid.shares[at("injector")]!);
    expect(onlyFilter.shares[at("injector")]).toBeLessThan(unsaid.shares[at("injector")]!);
  });
});

describe("what a screen shows of two faults", () => {
  const phone = () => new Device(1);
  const begin = (device: Device) => device.begin({ symptoms: ["weak", "smoky"] });

  it("[X8] says that there are perhaps two, and which, only when the numbers do", () => {
    const device = phone();
    const begun = begin(device);
    const first = view(two, [begun]).possible.two;
    const log = [begun, device.answer("bowl", "slime"), device.answer("spray", "drips")];
    const { two: said, causes, others, unknown } = view(two, log).possible;
    expect(said?.share).toBeGreaterThan(0.85);
    expect(said?.likeliest.map(({ key }) => key)).toEqual(["filter", "injector"]);
    expect(causes.reduce((sum, one) => sum + one.of100, others.of100 + unknown.of100)).toBe(100);
    expect(causes[0]!.inAll).toBeGreaterThan(causes[0]!.of100);
    expect(first === null || first.share > 0.3).toBe(true);
    expect(view(two, [device.begin({ symptoms: ["weak"] })]).possible.two).toBeNull();
  });

  it("[F8] [X9] goes on with what is left after a remedy that left a symptom, and says what was put right", () => {
    const device = phone();
    const log = [begin(device), device.answer("bowl", "slime"), device.answer("spray", "drips"), device.tried("element", "better")];
    const better = view(two, log);
    expect(better.putRight).toMatchObject({ remedy: { key: "element" }, cause: { key: "filter" }, gone: [], still: ["weak", "smoky"] });
    expect(better.possible.causes[0]?.key).toBe("injector");
    expect(better.possible.two).toBeNull();
    expect(better.step).toMatchObject({ kind: "remedy", key: "nozzle" });
    const gone = view(two, [...log, device.tell("symptom-told", { symptom: "weak", present: false })]);
    expect(gone.putRight).toMatchObject({ gone: ["weak"], still: ["smoky"] });
    const done = view(two, [...log, device.tried("nozzle", "cured")]);
    expect(done).toMatchObject({ step: null, curedCause: { cause: "injector", remedy: "nozzle" } });
  });

  it("[F8] [X7] a cure with a symptom told after it goes on; without one it is the end", () => {
    const device = phone();
    const log = [begin(device), device.answer("bowl", "slime"), device.tried("element", "cured")];
    expect(view(two, log)).toMatchObject({ step: null, putRight: null, curedCause: { cause: "filter" } });
    const still = view(two, [...log, device.tell("symptom-told", { symptom: "smoky", present: true })]);
    expect(still.curedCause).toBeNull();
    expect(still.step).not.toBeNull();
    expect(still.putRight).toMatchObject({ cause: { key: "filter" } });
    expect(still.possible.causes[0]?.key).toBe("injector");
  });

  it("names the likeliest pairs first", () => {
    const { pairs } = told({ symptoms, findings: found });
    const [first, second] = likeliestPairs(pairs, two.causes.length, 0.001, 2);
    expect([first?.a, first?.b]).toEqual([at("filter"), at("injector")]);
    expect(first!.share).toBeGreaterThanOrEqual(second?.share ?? 0);
  });
});
