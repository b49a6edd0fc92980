import gammaln from "@stdlib/math-base-special-gammaln";

/** The natural logarithm of the gamma function; of (n - 1)! for a whole n above 0. */
export const logGamma = (x: number): number => gammaln(x);
