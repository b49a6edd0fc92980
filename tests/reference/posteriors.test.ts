import { addNode, infer } from "bayesjs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { believe } from "../../lib/core/diagnosis/believe";
import { compile } from "../../lib/core/diagnosis/compile";
import type { CheckModel, Model } from "../../lib/core/diagnosis/model";
import { pairShare } from "../../lib/core/diagnosis/pair-finding";
import { shownByEither } from "../../lib/core/diagnosis/pair-symptom";
import { pairAt } from "../../lib/core/diagnosis/pairs";
import type { FaultTree } from "../../lib/core/tree/schema";
import { anyCase, anyPartCure, setting } from "../core/diagnosis/random-trees";
import { cause, check, finding, tree } from "../core/diagnosis/small-trees";
import { enumerate } from "./enumerate";

/** Shares among single causes, pairs and "something not in this tree" left out: each joint state of a published network is a cause by itself. */
function amongCauses(of: FaultTree, findings: Record<string, string>): (pick: (key: string) => boolean) => number {
  const model = compile(of, { ...setting, faults: "one" });
  const told = Object.entries(findings).map(([key, value]) => ({ check: key, finding: value }));
  const { shares } = believe(model, { symptoms: [], findings: told, remedies: [] });
  const known = 1 - (shares[model.unknownAt] ?? 0);
  return (pick) => model.causes.reduce((sum, one, index) => sum + (pick(one.key) ? (shares[index] ?? 0) / known : 0), 0);
}

/** A hypothesis as a state of one node of a network: its prior, what it shows at a check, its share of a belief. */
type State = {
  prior: number;
  shares: (check: string) => Record<string, number>;
  share: (alone: Float64Array, pairs: Float64Array) => number;
};

/** Each cause, the unknown, and each pair. */
function statesOf(model: Model): Record<string, State> {
  const row = (key: string, of: (check: CheckModel, finding: number) => number) => {
    const check = model.checks.find((one) => one.key === key)!;
    return Object.fromEntries(check.check.findings.map((one, finding) => [one.key, of(check, finding)]));
  };
  const states: Record<string, State> = {};
  [...model.causes.map(({ key }) => key), "unknown"].forEach((name, index) => {
    states[name] = {
      prior: Math.exp(model.logPrior[index]!),
      shares: (check) => row(check, (of, finding) => of.rows[finding]![index]!),
      share: (alone) => alone[index]!,
    };
  });
  const count = model.causes.length;
  const { each, at, more } = model.pairs!.prior;
  for (let a = 0; a < count; a++)
    for (let b = a + 1; b < count; b++)
      states[`${a}+${b}`] = {
        prior: Math.exp(each[a]! + each[b]! + (more[at.indexOf(pairAt(a, b, count))] ?? 0)),
        shares: (check) => row(check, (of, finding) => pairShare(of, finding, a, b)),
        share: (_, pairs) => pairs[pairAt(a, b, count)]!,
      };
  return states;
}

const entries = <T>(states: Record<string, State>, of: (state: State) => T): [string, T][] =>
  Object.entries(states).map(([name, state]) => [name, of(state)]);

const yesNo = (key: string) => check(key, [finding("no", { usual: true }), finding("yes")]);
const says = (yes: number) => ({ no: 1 - yes, yes });

describe("posteriors", () => {
  it.each([
    { what: "random trees", cases: anyCase, seed: 1, numRuns: 1000 },
    { what: "random trees of which one of two faults was put right", cases: anyPartCure, seed: 3, numRuns: 500 },
  ])("of single causes, of pairs and of the unknown equal brute-force enumeration to 1e-12 on $what", ({ cases, seed, numRuns }) => {
    fc.assert(
      fc.property(cases, ({ tree, evidence }) => {
        const model = compile(tree, setting);
        const { shares, marginals, two } = believe(model, evidence);
        const wanted = enumerate(tree, evidence);
        const near = (one: number | undefined, other: number | undefined) =>
          expect(Math.abs((one ?? NaN) - (other ?? NaN))).toBeLessThan(1e-12);
        [...model.causes.map(({ key }) => key), "?"].forEach((key, index) => {
          near(shares[index], wanted.shares.get(key));
          near(marginals[index], wanted.marginals.get(key));
        });
        near(two, wanted.two);
      }),
      { seed, numRuns },
    );
  });

  it("equal those of a general Bayesian-network library on the same network, pairs of causes included", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const model = compile(tree, setting);
        const states = statesOf(model);
        let network = addNode(
          {},
          { id: "fault", states: Object.keys(states), parents: [], cpt: Object.fromEntries(entries(states, ({ prior }) => prior)) },
        );
        for (const { key, check } of model.checks)
          network = addNode(network, {
            id: key,
            states: check.findings.map((one) => one.key),
            parents: ["fault"],
            cpt: entries(states, ({ shares }) => shares(key)).map(([name, shares]) => ({ when: { fault: name }, then: shares })),
          });
        const given = Object.fromEntries(evidence.findings.flatMap(({ check, finding }) => (finding === null ? [] : [[check, finding]])));
        const { alone, pairs } = believe(model, { symptoms: [], findings: evidence.findings, remedies: [] });
        for (const [name, { share }] of Object.entries(states))
          expect(infer(network, { fault: name }, given)).toBeCloseTo(share(alone, pairs), 9);
      }),
      { seed: 2, numRuns: 40 },
    );
  });

  // Russell and Norvig, Artificial Intelligence: fever, of which cold gives 0.4, flu 0.8 and malaria 0.9, each by itself.
  it("of pairs see a symptom as often as the published noisy-or does", () => {
    expect(shownByEither(0.9, 0.8)).toBeCloseTo(0.98, 12);
    expect(shownByEither(0.4, 0.9)).toBeCloseTo(0.94, 12);
    expect(shownByEither(0.4, 0.8)).toBeCloseTo(0.88, 12);
  });

  // Eddy 1982; Casscells, Schoenberger and Graboys 1978.
  it("give the published answers to the base-rate problems", () => {
    const test = (rate: number, sick: number, well: number) =>
      amongCauses(
        tree({
          checks: [yesNo("test")],
          causes: [
            cause("ill", { base: rate, gives: { test: says(sick) } }),
            cause("well", { base: 1 - rate, gives: { test: says(well) } }),
          ],
        }),
        { test: "yes" },
      )((key) => key === "ill");
    expect(test(0.01, 0.792, 0.096)).toBeCloseTo(0.07692307692307693, 12);
    expect(test(0.01, 0.8, 0.096)).toBeCloseTo(0.07763975155279504, 12);
    // Certain sensitivity stands at 0.999 here: nothing is impossible [L6].
    expect(test(0.001, 0.999, 0.05)).toBeCloseTo(0.0196, 4);
  });

  // Russell and Norvig, Artificial Intelligence: the alarm network. Each joint state of (burglary, earthquake, alarm) is a cause.
  it("give the published answers on the alarm network", () => {
    const alarm: Record<string, number> = { "y-y": 0.95, "y-n": 0.94, "n-y": 0.29, "n-n": 0.001 };
    const causes = ["y", "n"].flatMap((b) =>
      ["y", "n"].flatMap((e) =>
        ["y", "n"].map((a) => {
          const rings = alarm[`${b}-${e}`]!;
          const weight = (b === "y" ? 0.001 : 0.999) * (e === "y" ? 0.002 : 0.998) * (a === "y" ? rings : 1 - rings);
          return cause(`${b}-${e}-${a}`, {
            base: weight,
            gives: { john: says(a === "y" ? 0.9 : 0.05), mary: says(a === "y" ? 0.7 : 0.01) },
          });
        }),
      ),
    );
    const both = amongCauses(tree({ checks: [yesNo("john"), yesNo("mary")], causes }), { john: "yes", mary: "yes" });
    expect(both((key) => key.startsWith("y"))).toBeCloseTo(0.28417183536439294, 12);
    expect(both((key) => key[2] === "y")).toBeCloseTo(0.17606683840507925, 12);
    expect(both((key) => key[4] === "y")).toBeCloseTo(0.7606920388631079, 12);
    const john = amongCauses(tree({ checks: [yesNo("john"), yesNo("mary")], causes }), { john: "yes" });
    expect(john((key) => key.startsWith("y"))).toBeCloseTo(0.016283729946769934, 12);
  });

  // Lauritzen and Spiegelhalter 1988, the chest clinic. Each joint state of (tuberculosis, lung cancer, bronchitis, smoker) is a cause.
  it.each([
    { asia: 0.01, given: { dysp: "yes" }, wanted: { tub: 0.0188453075, lung: 0.1027592228, bronc: 0.8339673363 } },
    { asia: 1, given: { dysp: "yes" }, wanted: { tub: 0.087750965, lung: 0.0995251451, bronc: 0.8114020716 } },
    { asia: 1, given: { dysp: "yes", xray: "yes" }, wanted: { tub: 0.39171172, lung: 0.4442705078, bronc: 0.628821776 } },
  ])("give the published answers on the chest clinic network, $given with Asia at $asia", ({ asia, given, wanted }) => {
    const tuberculosis = asia * 0.05 + (1 - asia) * 0.01;
    const states = ["y", "n"];
    const causes = states.flatMap((t) =>
      states.flatMap((l) =>
        states.flatMap((b) =>
          states.map((s) => {
            const yes = (state: string, share: number) => (state === "y" ? share : 1 - share);
            const weight = yes(t, tuberculosis) * 0.5 * yes(l, s === "y" ? 0.1 : 0.01) * yes(b, s === "y" ? 0.6 : 0.3);
            const either = t === "y" || l === "y";
            const dysp = either ? (b === "y" ? 0.9 : 0.7) : b === "y" ? 0.8 : 0.1;
            return cause(`${t}-${l}-${b}-${s}`, { base: weight, gives: { xray: says(either ? 0.98 : 0.05), dysp: says(dysp) } });
          }),
        ),
      ),
    );
    const share = amongCauses(tree({ checks: [yesNo("xray"), yesNo("dysp")], causes }), given as Record<string, string>);
    expect(share((key) => key[0] === "y")).toBeCloseTo(wanted.tub, 9);
    expect(share((key) => key[2] === "y")).toBeCloseTo(wanted.lung, 9);
    expect(share((key) => key[4] === "y")).toBeCloseTo(wanted.bronc, 9);
  });
});
