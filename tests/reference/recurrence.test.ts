import { describe, expect, test } from "vitest";
import { mtbfLimits, oftenerByChance, rateRatioLimits, seldomerByChance } from "@/lib/core/recurrence/constant-rate";
import { laplace, lewisRobinson, pooledLaplace } from "@/lib/core/recurrence/laplace";
import { milHdbk189, pooledMilHdbk189 } from "@/lib/core/recurrence/mil-hdbk-189";
import { approximateMtbfNowLimits, growthCoefficients, mtbfNowLimits } from "@/lib/core/recurrence/mtbf-now-limits";
import { betaLimits, fitOfPowerLaw, powerLaw } from "@/lib/core/recurrence/power-law";
import { reverseArrangements } from "@/lib/core/recurrence/reverse-arrangements";
import { normalQuantile } from "@/lib/core/statistics/normal";
import { CROW_23, HALFBEAK, MIL_27, NIST_TEN } from "./recurrence-data";

/** Equal to the digits as they are printed. */
const printed = (value: number | null | undefined, text: string) => {
  const digits = text.split(".")[1]?.length ?? 0;
  expect(value, text).not.toBeNull();
  expect((value ?? NaN).toFixed(digits)).toBe(text);
};

describe("NIST/SEMATECH e-Handbook: ten repairs in 1500 h", () => {
  test("8.2.3.4: 33 reversals of 45, significant at 95 %", () => {
    const found = reverseArrangements(NIST_TEN.times);
    expect(found).toMatchObject({ reversals: 33, pairs: 45 });
    // Of all orders of ten gaps, 3761 in 103 680 have so many.
    expect(found?.improving).toBeCloseTo(3761 / 103680, 14);
  });
  test("8.2.3.4: Laplace -1.33, improving at 91 %", () => {
    const found = laplace(NIST_TEN);
    printed(found?.u, "-1.33");
    printed(1 - (found?.worsening ?? 0), "0.09");
  });
  test("8.2.3.4: MIL-HDBK-189 37.23 on 20 degrees, improving at 98.9 %", () => {
    const found = milHdbk189(NIST_TEN);
    printed(found?.x, "37.23");
    expect(found?.degrees).toBe(20);
    printed(100 * (1 - (found?.improving ?? 0)), "98.9");
  });
  test("8.4.5.2: unbiased beta 0.483506, growth slope 0.516494, 310.234 h between faults at 1500 h", () => {
    const fit = powerLaw(NIST_TEN);
    printed(fit?.betaUnbiased, "0.483506");
    printed(1 - (fit?.betaUnbiased ?? 0), "0.516494");
    printed(fit?.mtbfNowUnbiased, "310.234");
    printed(10 / 1500 ** (fit?.betaUnbiased ?? 0), "0.2913003");
  });
  test("8.4.5.2: 80 % limits 157.7138 and 548.5566 h by its own short form; the exact ones lie around the likeliest value", () => {
    const [low, high] = approximateMtbfNowLimits(10, powerLaw(NIST_TEN)?.mtbfNowUnbiased ?? 0, normalQuantile(0.9));
    printed(low, "157.7138");
    printed(high, "548.5566");
    const [exactLow, exactHigh] = mtbfNowLimits(NIST_TEN, 0.8) ?? [];
    expect(exactLow).toBeCloseTo(153.31574567471753, 8);
    expect(exactHigh).toBeCloseTo(596.2737821704021, 8);
  });
  test("8.4.5.1: two failures in 800 h: 90 % limits 127.0690 and 2251.229 h", () => {
    const [low, high] = mtbfLimits(2, 800, "time", 0.9);
    printed(low, "127.0690");
    printed(high, "2251.229");
  });
  test.each([
    [1, 0.6, "0.3340", "4.4814"],
    [1, 0.95, "0.1795", "39.4979"],
    [2, 0.8, "0.3758", "3.7607"],
    [3, 0.9, "0.3869", "3.6689"],
    [5, 0.95, "0.4285", "3.0798"],
    [10, 0.9, "0.5895", "1.8432"],
  ])("8.4.5.1: factors for %i failures at %d", (faults, confidence, low, high) => {
    const [from, to] = mtbfLimits(faults, faults, "time", confidence);
    printed(from, low);
    printed(to, high);
  });
  test.each([
    [0.6, "1.0914"],
    [0.8, "0.62133"],
    [0.9, "0.43429"],
    [0.95, "0.33381"],
  ])("8.4.5.1: no failure yet, the lower limit at %d", (confidence, low) => {
    const [from, to] = mtbfLimits(0, 1, "time", confidence);
    printed(from, low);
    expect(to).toBe(Infinity);
  });
});

describe("MIL-HDBK-189 (1981), appendix C: 27 failures in 300 h", () => {
  test("beta .7163392624, lambda .4538418614, failure intensity .0644705336, 15.5109620 h", () => {
    const fit = powerLaw(MIL_27);
    printed(fit?.beta, "0.7163392624");
    printed(fit?.lambda, "0.4538418614");
    printed(1 / (fit?.mtbfNow ?? 0), "0.0644705336");
    printed(fit?.mtbfNow, "15.5109620");
  });
  test("distance .0910611: the power law fits", () => {
    const found = fitOfPowerLaw(MIL_27);
    printed(found?.distance, "0.0910611");
    expect(found?.fits).toBe(true);
  });
  test("90 % limits by the printed coefficients .6361 and 1.682", () => {
    const [low, high] = growthCoefficients(27, "time", 0.9);
    printed(low, "0.6361");
    printed(high, "1.682");
    expect(mtbfNowLimits(MIL_27, 0.9)?.map((limit) => limit.toFixed(4))).toEqual(["9.8672", "26.0861"]);
  });
  test("chi-square 75.383 on 54 degrees", () =>
    expect(milHdbk189(MIL_27)).toMatchObject({ degrees: 54, x: expect.closeTo(75.3832755469, 9) }));
});

describe("Crow's coefficients for the hours between faults", () => {
  test.each([
    [23, "time", 0.8, ".6762", "1.5744"],
    [2, "time", 0.9, ".1996", "38.66"],
    [3, "failure", 0.8, ".6840", "8.927"],
    [5, "failure", 0.8, ".6568", "4.000"],
    [5, "failure", 0.9, ".5290", "5.424"],
  ] as const)("%i faults, %s-ended, %d", (n, ended, confidence, low, high) => {
    const [from, to] = growthCoefficients(n, ended, confidence);
    printed(from, `0${low}`);
    printed(to, high);
  });
  test("23 failures in 500 h: beta .4127, 52.67 h between faults", () => {
    printed(powerLaw(CROW_23)?.beta, "0.4127");
    printed(powerLaw(CROW_23)?.mtbfNow, "52.67");
  });
});

describe("A marine diesel: USS Halfbeak No. 4, ended at its 71st fault", () => {
  test("beta 2.76, eta 5.45 thousand hours", () => {
    const fit = powerLaw(HALFBEAK);
    printed(fit?.beta, "2.76");
    printed((fit?.lambda ?? 0) ** (-1 / (fit?.beta ?? 1)) / 1000, "5.45");
    expect(fit?.betaUnbiased).toBeCloseTo(2.682584, 6);
  });
  test("chi-square 51 on 140 degrees: far worse than by chance", () => {
    const found = milHdbk189(HALFBEAK);
    printed(found?.x, "51");
    expect(found?.degrees).toBe(140);
    expect(found?.worsening).toBeLessThan(1e-12);
  });
  test("Laplace 7.44, and still over 4 when clustering is allowed for", () => {
    printed(laplace(HALFBEAK)?.u, "7.44");
    printed(lewisRobinson(HALFBEAK), "4.61");
  });
  test("an abrupt change near 19 000 h: strong worsening, and yet no power law", () => {
    const found = fitOfPowerLaw(HALFBEAK);
    printed(found?.distance, "0.7578");
    expect(found?.fits).toBe(false);
  });
  test("limits of beta lie well above 1", () => expect(betaLimits(HALFBEAK, 0.95)?.[0]).toBeGreaterThan(2));
});

describe("Two rates", () => {
  test("Przyborowski & Wilenski 1940, dodder seeds: 0 in 100 against 3 in 100 is .25 on two sides", () => {
    expect(2 * seldomerByChance({ faults: 0, time: 100 }, { faults: 3, time: 100 })).toBeCloseTo(0.25, 14);
  });
  test("7 faults in 410 h against 2 in 380 h: ratio 3.24, 90 % limits .7594 to 21.666, .21998 on two sides", () => {
    const first = { faults: 7, time: 410 };
    const second = { faults: 2, time: 380 };
    const [low, high] = rateRatioLimits(first, second, 0.9);
    printed(low, "0.7594");
    printed(high, "21.666");
    printed(2 * oftenerByChance(first, second), "0.21998");
  });
});

describe("Several engines under one question", () => {
  test("one engine twice over doubles the chi-square and raises Laplace by the root of two", () => {
    const one = milHdbk189(NIST_TEN);
    expect(pooledMilHdbk189([NIST_TEN, NIST_TEN])).toMatchObject({ x: expect.closeTo(2 * (one?.x ?? 0), 11), degrees: 40 });
    expect(pooledLaplace([NIST_TEN, NIST_TEN])).toBeCloseTo(Math.SQRT2 * (laplace(NIST_TEN)?.u ?? 0), 12);
  });
});
