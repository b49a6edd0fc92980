import { describe, expect, it } from "vitest";
import { negEntropyOf } from "@/lib/core/diagnosis/compile-check";
import type { Model } from "@/lib/core/diagnosis/model";
import { nextStep } from "@/lib/core/diagnosis/next-step";
import { informationOf } from "@/lib/core/diagnosis/outcomes";
import { modelOf } from "../support/plain-model";
import { leastTests, type SureTest } from "./least-tests";
import { leastMinutes } from "./oracle";
import { plannedMinutes, type Choose } from "./planned-minutes";

/** So dear is mending, and so much dearer calling, that it pays to know first. */
const MEND = 10_000;
const CALL = 1_000_000;

/** To know the state means to mend the right thing at once: every state has a remedy of its own, and a wrong one costs more than all tests. */
function identifying(weights: readonly number[], tests: readonly SureTest[]): Model {
  return modelOf({
    prior: [...weights, 0],
    checks: tests.map(({ answers, cost }) => ({
      minutes: cost,
      rows: [...new Set(answers)].map((answer) => Float64Array.from([...answers, -1], (one) => (one === answer ? 1 : 0))),
    })),
    remedies: weights.map((_, state) => ({ minutes: MEND, cures: [[state, 1]] })),
    callMinutes: CALL,
  });
}

const testsOfPlanner = (weights: readonly number[], tests: readonly SureTest[], choose: Choose = nextStep): number =>
  plannedMinutes(identifying(weights, tests), choose) - MEND;

/** What tells most for its cost, until it is known. */
const greedy: Choose = (model, evidence) => {
  const { shares } = nextStep(model, evidence);
  const open = model.checks.filter(({ key }) => !evidence.findings.some(({ check }) => check === key));
  const rate = (check: (typeof open)[number]): number =>
    informationOf({ predict: check.rows, weigh: check.rows, negEntropy: check.negEntropy }, shares) / check.minutes;
  const best = open.reduce((most, one) => (rate(one) > rate(most) + 1e-12 ? one : most), open[0]!);
  return Math.max(...shares) > 1 - 1e-9 ? nextStep(model, evidence) : { kind: "check", key: best.key };
};

const binary = (...rows: string[]): SureTest[] =>
  Array.from(rows[0]!, (_, test) => ({ answers: rows.map((row) => Number(row[test])), cost: 1 }));
const splits = (states: number): SureTest[] =>
  Array.from({ length: 2 ** (states - 1) - 1 }, (_, at) => ({
    answers: Array.from({ length: states }, (_, state) => ((at + 1) >> state) & 1),
    cost: 1,
  }));

describe("published plans", () => {
  // Pattipati and Alexandridis 1990: five tests, five faults and none.
  const fiveTests = binary("00000", "01001", "00110", "10011", "11000", "11110");
  const fiveFaults = [0.7, 0.01, 0.02, 0.1, 0.05, 0.12];

  it("five tests: 2.18 at best, where the most telling test each time gives 2.86; the planner finds the best", () => {
    expect(leastTests(fiveFaults, fiveTests)).toBeCloseTo(2.18, 12);
    expect(leastMinutes(identifying(fiveFaults, fiveTests)) - MEND).toBeCloseTo(2.18, 6);
    expect(testsOfPlanner(fiveFaults, fiveTests, greedy)).toBeCloseTo(2.86, 6);
    expect(testsOfPlanner(fiveFaults, fiveTests)).toBeCloseTo(2.18, 6);
  });

  it("overlapping repairs: 1.45 at best, where the likeliest first gives 1.50; the planner finds the best", () => {
    const overlapping = modelOf({
      prior: [0.2, 0.25, 0.4, 0.15, 0],
      checks: [],
      remedies: [0, 1, 2].map((first) => ({
        minutes: 1,
        cures: [
          [first, 1],
          [first + 1, 1],
        ],
      })),
      callMinutes: 1000,
    });
    const inOrder =
      (...order: number[]): Choose =>
      (model, { remedies }) => ({ kind: "remedy", key: model.remedies[order[remedies.length]!]!.key });
    expect(leastMinutes(overlapping)).toBeCloseTo(1.45, 12);
    const orders = [
      [[0, 1, 2], 1.7],
      [[0, 2, 1], 1.55],
      [[1, 0, 2], 1.5],
      [[1, 2, 0], 1.55],
      [[2, 0, 1], 1.45],
      [[2, 1, 0], 1.65],
    ] as const;
    for (const [order, cost] of orders) expect(plannedMinutes(overlapping, inOrder(...order))).toBeCloseTo(cost, 12);
    expect(plannedMinutes(overlapping, nextStep)).toBeCloseTo(1.45, 9);
  });

  it("an optimal search tree: 2.75; the planner finds it", () => {
    // Cormen, Leiserson, Rivest and Stein: five keys and six gaps; a comparison says less, equal or greater, and a gap costs one more.
    const keys = [0.15, 0.1, 0.05, 0.1, 0.2];
    const gaps = [0.05, 0.1, 0.05, 0.05, 0.05, 0.1];
    const weights = gaps.flatMap((gap, place) => (place < keys.length ? [gap, keys[place]!] : [gap]));
    const compare = keys.map((_, key) => ({ answers: weights.map((_, state) => Math.sign(state - (2 * key + 1)) + 1), cost: 1 }));
    const gapsTogether = gaps.reduce((sum, gap) => sum + gap, 0);
    expect(leastTests(weights, compare) + gapsTogether).toBeCloseTo(2.75, 12);
    expect(testsOfPlanner(weights, compare) + gapsTogether).toBeCloseTo(2.75, 6);
  });

  it.each([
    [2, 1],
    [4, 2],
    [5, 2.4],
    [8, 3],
    [10, 3.4],
  ])("a chain of %i equal parts, cut anywhere: %f; the planner finds it", (parts, tests) => {
    const weights = Array.from({ length: parts }, () => 1 / parts);
    const cuts = Array.from({ length: parts - 1 }, (_, cut) => ({ answers: weights.map((_, part) => (part <= cut ? 0 : 1)), cost: 1 }));
    expect(leastTests(weights, cuts)).toBeCloseTo(tests, 12);
    expect(testsOfPlanner(weights, cuts)).toBeCloseTo(tests, 6);
  });

  it("yes and no on any part of six letters is a prefix code: 2.24; the planner takes 2.39, since it looks only at the checks that tell most", () => {
    // Cormen, Leiserson, Rivest and Stein, after Huffman 1952.
    const letters = [45, 13, 12, 16, 9, 5].map((weight) => weight / 100);
    expect(leastTests(letters, splits(6))).toBeCloseTo(2.24, 12);
    expect(testsOfPlanner(letters, splits(6))).toBeLessThan(2.395);
  });

  it("thirteen messages, Huffman 1952: 3.42", () => {
    const messages = [0.2, 0.18, 0.1, 0.1, 0.1, 0.06, 0.06, 0.04, 0.04, 0.04, 0.04, 0.03, 0.01];
    let codes = [...messages];
    let length = 0;
    while (codes.length > 1) {
      codes.sort((a, b) => a - b);
      length += codes[0]! + codes[1]!;
      codes = [codes[0]! + codes[1]!, ...codes.slice(2)];
    }
    expect(length).toBeCloseTo(3.42, 12);
    expect(leastTests(messages, splits(13))).toBeCloseTo(3.42, 12);
  }, 60_000);

  it("tells what fourteen days of weather tell, Quinlan 1986", () => {
    const gain = (...counts: [play: number, stay: number][]): number => {
      const rows = counts.map(([play, stay]) => Float64Array.from([play / 9, stay / 5]));
      return informationOf({ predict: rows, weigh: rows, negEntropy: negEntropyOf(rows) }, Float64Array.from([9 / 14, 5 / 14])) / Math.LN2;
    };
    expect(gain([2, 3], [4, 0], [3, 2])).toBeCloseTo(0.24674981977443933, 12);
    expect(gain([3, 4], [6, 1])).toBeCloseTo(0.15183550136234164, 12);
    expect(gain([6, 2], [3, 3])).toBeCloseTo(0.04812703040826949, 12);
    expect(gain([2, 2], [4, 2], [3, 1])).toBeCloseTo(0.02922256565895487, 12);
  });
});
