import { gammaAbove, gammaBelow, gammaQuantile } from "./gamma";

/** P(chi-square <= x) with so many degrees of freedom. */
export const chiSquareBelow = (x: number, degrees: number): number => gammaBelow(x / 2, degrees / 2);

/** P(chi-square > x) with so many degrees of freedom. */
export const chiSquareAbove = (x: number, degrees: number): number => gammaAbove(x / 2, degrees / 2);

/** The value that a chi-square variable stays below with probability `p`. */
export const chiSquareQuantile = (p: number, degrees: number): number => 2 * gammaQuantile(p, degrees / 2);
