import { gammaPoissonAtLeast, type GammaRate } from "../statistics/gamma-poisson";
import { logGamma } from "../statistics/log-gamma";
import type { Watched } from "./constant-rate";

/** How unlike engines are before any is known: the middle of the shapes weighed, and how wide they are held (in logarithms). */
const USUAL_SHAPE = 1;
const SPREAD = 1;
const SHAPES = Array.from({ length: 25 }, (_, i) => 10 ** (-1 + i / 8));

/** Rates of one more engine, each a gamma distribution with how much is believed of it; the weights add up to 1. */
export type FleetRate = { readonly mean: number; readonly likely: readonly { readonly weight: number; readonly rate: GammaRate }[] };

/**
 * The rate of a fault among the other engines of a fleet, as one more engine's rate would be drawn from it (rule F1). The mean is all
 * faults over all hours of the others (half a fault added: none seen is not none to come). How much engines differ is weighed over a range of shapes by
 * what the counts of all say, this one's too (gamma-Poisson likelihood; left out, the very engine that shows how unlike they are would never count), and a weak belief
 * that they differ much. The mean's own uncertainty widens each.
 *
 * @returns null where no other engine has been watched
 */
export function fleetRate(others: readonly Watched[], self: Watched): FleetRate | null {
  const watched = others.filter(({ time }) => time > 0);
  const time = watched.reduce((sum, one) => sum + one.time, 0);
  if (time <= 0) return null;
  const faults = watched.reduce((sum, one) => sum + one.faults, 0) + 0.5;
  const mean = faults / time;
  const all = [...watched, self];
  const meanOfAll = (faults + self.faults) / (time + self.time);
  const logs = SHAPES.map((shape) => logLikelihood(all, shape, meanOfAll) - (Math.log(shape / USUAL_SHAPE) / SPREAD) ** 2 / 2);
  const top = Math.max(...logs);
  const weights = logs.map((log) => Math.exp(log - top));
  const sum = weights.reduce((sum, weight) => sum + weight, 0);
  const likely = SHAPES.map((shape, i) => {
    // Squared coefficients of variation: of engines about the mean, of the mean itself, of their product.
    const events = 1 / (1 / shape + 1 / faults + 1 / (shape * faults));
    return { weight: (weights[i] ?? 0) / sum, rate: { events, exposure: events / mean } };
  });
  return { mean, likely: likely.filter(({ weight }) => weight > 1e-9) };
}

/** P(so many or more) on one more engine of the fleet in so much time. */
export const atLeastInFleet = (n: number, fleet: FleetRate, time: number): number =>
  fleet.likely.reduce((sum, { weight, rate }) => sum + weight * gammaPoissonAtLeast(n, rate, time), 0);

function logLikelihood(watched: readonly Watched[], shape: number, mean: number): number {
  const exposure = shape / mean;
  const ofShape = logGamma(shape);
  return watched.reduce((sum, { faults, time }) => {
    const none = shape * Math.log(exposure / (exposure + time));
    if (faults === 0) return sum + none;
    return sum + none + logGamma(shape + faults) - ofShape - logGamma(faults + 1) + faults * Math.log(time / (exposure + time));
  }, 0);
}
