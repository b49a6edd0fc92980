import jstat from "jstat";
import { describe, expect, test } from "vitest";
import { betaBelow, betaQuantile } from "@/lib/core/statistics/beta";
import { chiSquareAbove, chiSquareQuantile } from "@/lib/core/statistics/chi-square";
import { gammaBelow, gammaQuantile } from "@/lib/core/statistics/gamma";
import { gammaPoissonAtLeast, gammaPoissonAtMost } from "@/lib/core/statistics/gamma-poisson";
import { normalAbove, normalQuantile } from "@/lib/core/statistics/normal";
import { poissonAtLeast, poissonAtMost, poissonMeanLimits } from "@/lib/core/statistics/poisson";
import { sumOfUniformsAtLeast } from "@/lib/core/statistics/sum-of-uniforms";

const { jStat } = jstat;

/** jstat itself is good to 9 figures or so. */
const agree = (ours: number, theirs: number) => expect(Math.abs(ours - theirs)).toBeLessThanOrEqual(2e-8 * Math.abs(theirs) + 1e-12);
const SHAPES = [0.5, 1, 2, 3.5, 7, 20, 70];
const SHARES = [0.005, 0.05, 0.1, 0.5, 0.9, 0.95, 0.995];

describe("against a general-purpose statistics library", () => {
  test.each(SHAPES)("gamma and chi-square, shape %d", (shape) => {
    for (const p of SHARES) {
      agree(gammaQuantile(p, shape), jStat.gamma.inv(p, shape, 1));
      agree(chiSquareQuantile(p, 2 * shape), jStat.chisquare.inv(p, 2 * shape));
      agree(gammaBelow(shape * 2 * p, shape), jStat.gamma.cdf(shape * 2 * p, shape, 1));
      agree(1 - chiSquareAbove(3 * p * shape, 2 * shape), jStat.chisquare.cdf(3 * p * shape, 2 * shape));
    }
  });
  test.each(SHAPES)("beta, first shape %d", (shape) => {
    for (const p of SHARES) {
      agree(betaBelow(p, shape, 3), jStat.beta.cdf(p, shape, 3));
      agree(betaQuantile(p, shape, 3), jStat.beta.inv(p, shape, 3));
    }
  });
  test("normal", () => {
    for (const p of SHARES) agree(normalQuantile(p), jStat.normal.inv(p, 0, 1));
    for (const x of [-3, -1, 0, 0.5, 2, 4]) agree(1 - normalAbove(x), jStat.normal.cdf(x, 0, 1));
  });
  test("Poisson and negative binomial, summed term by term", () => {
    const upTo = (n: number, term: (k: number) => number) => Array.from({ length: n + 1 }, (_, k) => term(k)).reduce((a, b) => a + b, 0);
    for (const n of [0, 1, 3, 8]) {
      for (const mean of [0.2, 1, 4])
        agree(
          poissonAtMost(n, mean),
          upTo(n, (k) => jStat.poisson.pdf(k, mean)),
        );
      // 2 events in 300 h as the fleet's rate, 150 h ahead: each trial ends with 300 / 450.
      agree(
        gammaPoissonAtMost(n, { events: 2, exposure: 300 }, 150),
        upTo(n, (k) => jStat.negbin.pdf(k, 2, 300 / 450)),
      );
    }
  });
});

describe("against each other and by hand", () => {
  test("at least and at most leave nothing between them", () => {
    for (const n of [1, 2, 5, 30]) {
      expect(poissonAtLeast(n, 3) + poissonAtMost(n - 1, 3)).toBeCloseTo(1, 13);
      expect(
        gammaPoissonAtLeast(n, { events: 1.7, exposure: 90 }, 200) + gammaPoissonAtMost(n - 1, { events: 1.7, exposure: 90 }, 200),
      ).toBeCloseTo(1, 13);
    }
  });
  test("a rate known for certain is Poisson", () => {
    expect(gammaPoissonAtLeast(4, { events: 1e8, exposure: 1e10 }, 100)).toBeCloseTo(poissonAtLeast(4, 1), 7);
    expect(gammaPoissonAtLeast(4, { events: 1e12, exposure: 1e14 }, 100)).toBe(poissonAtLeast(4, 1));
  });
  test("Garwood 1936: three events, 95 %: .6187 to 8.7673", () => {
    expect(poissonMeanLimits(3, 0.95).map((limit) => limit.toFixed(4))).toEqual(["0.6187", "8.7673"]);
    expect(poissonMeanLimits(0, 0.95)[0]).toBe(0);
  });
  test("the sum of uniforms: triangle, cube, symmetry, and its passage to the normal", () => {
    expect(sumOfUniformsAtLeast(1.5, 2)).toBeCloseTo(0.125, 15);
    expect(sumOfUniformsAtLeast(2.5, 3)).toBeCloseTo(1 / 48, 15);
    for (const n of [1, 4, 9, 20, 40]) expect(sumOfUniformsAtLeast(n / 2, n)).toBeCloseTo(0.5, 10);
    const sd = Math.sqrt(20 / 12);
    expect(sumOfUniformsAtLeast(10 + 2 * sd, 20)).toBeCloseTo(normalAbove(2), 3);
    // NIST's ten repairs add up to 5683 of 1500 h each: .0937 exactly, .0923 by the normal distribution.
    expect((1 - sumOfUniformsAtLeast(5683 / 1500, 10)).toFixed(4)).toBe("0.0937");
  });
});
