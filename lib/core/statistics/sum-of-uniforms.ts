import { normalAbove } from "./normal";

/** Above this many the alternating sum loses figures, and the normal distribution has them. */
const MOST_EXACT = 20;

/**
 * P(U1 + ... + Un >= total) of numbers spread evenly between 0 and 1: the exact
 * form of Laplace's test (Irwin-Hall distribution). Up to 20 exact, above by the normal distribution.
 */
export function sumOfUniformsAtLeast(total: number, n: number): number {
  if (total <= 0) return 1;
  if (total >= n) return 0;
  if (n > MOST_EXACT) return normalAbove((total - n / 2) / Math.sqrt(n / 12));
  // The shorter side has the fewer terms to cancel.
  return total >= n / 2 ? below(n - total, n) : 1 - below(total, n);
}

function below(x: number, n: number): number {
  let sum = 0;
  let choose = 1;
  for (let k = 0; k < x; k++) {
    let term = choose;
    for (let i = 1; i <= n; i++) term *= (x - k) / i;
    sum += k % 2 === 0 ? term : -term;
    choose *= (n - k) / (k + 1);
  }
  return Math.min(1, Math.max(0, sum));
}
