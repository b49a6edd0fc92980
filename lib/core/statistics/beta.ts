import betainc from "@stdlib/math-base-special-betainc";
import kernelBetaincinv from "@stdlib/math-base-special-kernel-betaincinv";

/** P(B <= x) of a beta variable; the share of `a` among `a` and `b`. */
export function betaBelow(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  return x >= 1 ? 1 : betainc(x, a, b, true, false);
}

/** P(B > x) of a beta variable. */
export function betaAbove(x: number, a: number, b: number): number {
  if (x <= 0) return 1;
  return x >= 1 ? 0 : betainc(x, a, b, true, true);
}

/** The share that a beta variable stays below with probability `p`. */
export function betaQuantile(p: number, a: number, b: number): number {
  if (p <= 0) return 0;
  if (p >= 1) return 1;
  return kernelBetaincinv(a, b, p, 1 - p)[0] ?? NaN;
}
